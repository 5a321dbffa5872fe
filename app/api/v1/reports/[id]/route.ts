import { versionTag } from "@/lib/http/request";
import { route } from "@/lib/http/route";
import { getReport } from "@/lib/queries/reports";
import { idParam } from "@/lib/schemas/query";

export const GET = route({ params: idParam }, async ({ actor, params }) => {
  const report = await getReport(actor, params.id);
  return { body: report, headers: { etag: versionTag(report.version) } };
});
