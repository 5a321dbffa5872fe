import Link from "next/link";
import type { ReactNode } from "react";
import { SheetFrame } from "@/components/layout/sheet-frame";
import { SheetSection } from "@/components/layout/sheet-section";
import { MeasuredFacts } from "@/components/report/measured-facts";
import { PhotoStrip } from "@/components/report/photo-strip";
import { depthWord, toneOf } from "@/components/report/report-list";
import { Badge } from "@/components/ui/badge";
import { Moment } from "@/components/ui/date-text";
import { Notice } from "@/components/ui/notice";
import { JOB_STATE_LABELS, REPORT_KIND_LABELS, REPORT_STATE_LABELS, sentence } from "@/lib/domain/labels";
import { JOB_STATES } from "@/lib/domain/vocabulary";
import type { ReportView } from "@/lib/schemas/views/register";

interface ReportSheetProps {
  report: ReportView;
  actions?: ReactNode;
  /** How a steward answers it; left out for everybody else. */
  answer?: ReactNode;
}

/** What somebody saw, and what became of it. */
export function ReportSheet({ report, actions, answer }: ReportSheetProps) {
  return (
    <SheetFrame title={titleOf(report)} actions={actions}>
      <div className="grid gap-8">
        {report.tookOutOfUse ? (
          <Notice tone="stop" title="This report took the bolt and its anchor out of use">
            They come back only after every bolt that carried the event was checked by hand on site.
          </Notice>
        ) : null}
        {report.confirmed ? null : (
          <Notice tone="warn" title="Not confirmed yet">
            It came without an account. Until somebody confirms it, look before you use what it is about.
          </Notice>
        )}
        <div className="grid gap-x-10 gap-y-8 lg:grid-cols-2 print:grid-cols-2">
          <SheetSection title="What was seen" note={depthWord(report.depth)}>
            <div className="grid gap-3">
              {report.note ? (
                <p className="max-w-prose whitespace-pre-line">{report.note}</p>
              ) : (
                <p className="text-muted">No words were written.</p>
              )}
              {report.foundSound ? <p className="font-semibold text-calm">Found sound by hand.</p> : null}
              <MeasuredFacts report={report} />
            </div>
          </SheetSection>
          <SheetSection title="What became of it">
            <Outcome report={report} />
          </SheetSection>
        </div>
        {report.photos.length > 0 ? (
          <SheetSection title="Photos" note={`${report.photos.length}`}>
            <PhotoStrip photos={report.photos} about={REPORT_KIND_LABELS[report.kind]} />
          </SheetSection>
        ) : null}
        {answer ? (
          <SheetSection id="answer" title="Answer it" className="no-print">
            {answer}
          </SheetSection>
        ) : null}
      </div>
    </SheetFrame>
  );
}

function Outcome({ report }: { report: ReportView }) {
  return (
    <div className="grid gap-3">
      {report.handledAt ? (
        <p className="max-w-prose">
          {report.handledHow ?? "Answered."}{" "}
          <span className="text-sm text-muted">
            (<Moment at={report.handledAt} timeZone={zoneOf(report)} />)
          </span>
        </p>
      ) : (
        <p className="max-w-prose">
          Still open. It counts against {report.anchorCode ? "the anchor" : "the place"} until it is answered,
          also when a newer report says that all looks fine.
        </p>
      )}
      {report.jobs.length > 0 ? (
        <ul className="divide-y divide-line border-y border-line">
          {report.jobs.map((job) => (
            <li key={job.id} className="flex flex-wrap items-baseline justify-between gap-x-4 py-1">
              <Link href={`/queue/${job.id}`} className="inline-block py-1.5 text-link">
                {job.title}
              </Link>
              <span className="text-sm text-muted">rebolt {jobWord(job.state)}</span>
            </li>
          ))}
        </ul>
      ) : null}
    </div>
  );
}

function titleOf(report: ReportView) {
  return {
    name: sentence(REPORT_KIND_LABELS[report.kind]),
    kind: "Report",
    condition: (
      <Badge tone={toneOf(report)}>
        {report.state === "open" && !report.confirmed ? "not confirmed" : REPORT_STATE_LABELS[report.state]}
      </Badge>
    ),
    revision: `${report.version}`,
    cells: [
      { name: "About", value: <Subject report={report} /> },
      {
        name: "Site",
        value: report.siteSlug ? (
          <Link href={`/sites/${report.siteSlug}`} className="text-link">
            {report.siteName}
          </Link>
        ) : (
          "no site yet"
        ),
      },
      { name: "Seen", value: <Moment at={report.observedAt} timeZone={zoneOf(report)} /> },
      { name: "Received", value: <Moment at={report.receivedAt} timeZone={zoneOf(report)} /> },
      { name: "By", value: report.reporterName ?? "a member" },
    ],
  };
}

function Subject({ report }: { report: ReportView }) {
  if (report.anchorCode === null) {
    if (report.point === null) return "a spot that is not in the register";
    const [lon, lat] = report.point.coordinates;
    return (
      <>
        a spot at{" "}
        <span className="type-code">
          {lat.toFixed(5)}, {lon.toFixed(5)}
        </span>
      </>
    );
  }
  return (
    <>
      <Link href={`/anchors/${report.anchorCode}`} className="text-link">
        {report.anchorCode} {report.anchorLabel}
      </Link>
      {report.placementNumber === null ? null : (
        <>
          ,{" "}
          {report.boltId ? (
            <Link href={`/bolts/${report.boltId}`} className="text-link">
              bolt {report.placementNumber}
            </Link>
          ) : (
            `placement ${report.placementNumber}`
          )}
        </>
      )}
    </>
  );
}

/** The clock of the place; of the world where it lies in no area. */
function zoneOf({ timeZone }: ReportView): string {
  return timeZone ?? "UTC";
}

function jobWord(state: string): string {
  const known = JOB_STATES.find((one) => one === state);
  return known ? JOB_STATE_LABELS[known] : state;
}
