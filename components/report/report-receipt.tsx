import { Notice } from "@/components/ui/notice";
import type { ReportView } from "@/lib/schemas/views/register";

/** What sending it has done. */
export function ReportReceipt({ report }: { report: ReportView }) {
  if (report.tookOutOfUse) {
    return (
      <Notice tone="stop" role="status" title="Stored. The bolt and its anchor are out of use.">
        The stewards and everybody who follows the anchor are told by mail, and an entry is open in the rebolt
        queue. It stays out of use until every bolt was checked by hand on site.
      </Notice>
    );
  }
  return (
    <Notice tone="calm" role="status" title="Stored. Thank you.">
      The stewards are told. You get a mail when somebody has answered it.
    </Notice>
  );
}
