import Link from "next/link";
import { PhotoStrip } from "@/components/report/photo-strip";
import { Badge, type Tone } from "@/components/ui/badge";
import { Moment } from "@/components/ui/date-text";
import { DEPTH_LABELS, REPORT_KIND_LABELS, REPORT_STATE_LABELS, sentence } from "@/lib/domain/labels";
import { DEPTHS } from "@/lib/domain/vocabulary";
import type { SheetReport } from "@/lib/schemas/views/anchor";

/** What people saw, open ones first, with what became of each. */
export function ReportList({ reports, timeZone }: { reports: readonly SheetReport[]; timeZone: string }) {
  if (reports.length === 0) return <p className="text-muted">Nobody has reported anything here yet.</p>;
  const ordered = reports.toSorted((a, b) => Number(b.state === "open") - Number(a.state === "open"));
  return (
    <ul className="divide-y divide-line border-y border-line">
      {ordered.map((report) => (
        <li key={report.id} className="keep-together grid gap-1 py-3">
          <div className="flex flex-wrap items-baseline gap-x-3 gap-y-1">
            <Link href={`/reports/${report.id}`} className="font-semibold underline underline-offset-2">
              {sentence(REPORT_KIND_LABELS[report.kind])}
              {report.placementNumber === null ? "" : ` at placement ${report.placementNumber}`}
            </Link>
            <Badge tone={toneOf(report)}>
              {report.state === "open" && !report.confirmed
                ? "not confirmed"
                : REPORT_STATE_LABELS[report.state]}
            </Badge>
            {report.grade === null ? null : (
              <span className="type-label text-muted">grade {report.grade}</span>
            )}
            <span className="text-sm text-muted">
              <Moment at={report.observedAt} timeZone={timeZone} /> · {depthWord(report.depth)}
              {report.reporterName ? ` · ${report.reporterName}` : ""}
            </span>
          </div>
          {report.note ? <p className="max-w-prose">{report.note}</p> : null}
          {report.tookOutOfUse ? (
            <p className="text-sm text-stop">Took the bolt and the anchor out of use.</p>
          ) : null}
          {report.handledHow ? (
            <p className="max-w-prose text-sm text-muted">Answer: {report.handledHow}</p>
          ) : null}
          <PhotoStrip photos={report.photos} about={REPORT_KIND_LABELS[report.kind]} />
        </li>
      ))}
    </ul>
  );
}

export function toneOf(report: Pick<SheetReport, "state" | "tookOutOfUse">): Tone {
  if (report.state !== "open") return "plain";
  return report.tookOutOfUse ? "stop" : "warn";
}

export function depthWord(depth: string): string {
  const known = DEPTHS.find((one) => one === depth);
  return known ? DEPTH_LABELS[known] : depth;
}
