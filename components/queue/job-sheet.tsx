import Link from "next/link";
import type { ReactNode } from "react";
import { ConditionMark } from "@/components/finding/condition-mark";
import { Reasons } from "@/components/finding/reasons";
import { SheetFrame } from "@/components/layout/sheet-frame";
import { SheetSection } from "@/components/layout/sheet-section";
import { JobMaterials } from "@/components/queue/job-materials";
import { JobSteps } from "@/components/queue/job-steps";
import { JOB_STATE_TONES, placementsOf, waitingDays } from "@/components/queue/job-words";
import { PriorityBars } from "@/components/queue/priority-bars";
import { PhotoStrip } from "@/components/report/photo-strip";
import { Badge } from "@/components/ui/badge";
import { Moment, PastDate } from "@/components/ui/date-text";
import { Notice } from "@/components/ui/notice";
import { HOLE_FATE_LABELS, JOB_OUTCOME_LABELS, JOB_STATE_LABELS, sentence } from "@/lib/domain/labels";
import type { AnchorSheet } from "@/lib/schemas/views/anchor";
import type { JobView } from "@/lib/schemas/views/steward";
import { formatList, formatNumber } from "@/lib/shared/format";

export interface JobSheetProps {
  job: JobView;
  anchor: AnchorSheet;
  now: string;
  /** What this reader may decide; null: nothing. */
  decide: ReactNode;
  close: ReactNode;
  /** The bolts of the anchor with their checks. */
  bolts: ReactNode;
  putBack: ReactNode;
}

/** One entry of the queue: what, where, why so soon, what is there, and what is to be done. */
export function JobSheet({ job, anchor, now, decide, close, bolts, putBack }: JobSheetProps) {
  const own = anchor.placements.filter(({ number }) => job.placementNumbers.includes(number));
  return (
    <SheetFrame title={titleOf(job, anchor, now)}>
      <div className="grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,2fr)_minmax(0,1fr)]">
        <div className="grid content-start gap-8">
          <Outcome job={job} timeZone={anchor.area.timeZone} />
          <SheetSection title="Steps">
            <JobSteps job={job} reports={anchor.reports} />
          </SheetSection>
          <SheetSection title="What is there now" note={placementsOf(job.placementNumbers)}>
            <JobMaterials placements={own} />
          </SheetSection>
          {close ? (
            <SheetSection id="close" title="Close the job">
              {close}
            </SheetSection>
          ) : null}
          <SheetSection id="bolts" title="Bolts of this anchor">
            {bolts}
          </SheetSection>
          {putBack ? (
            <SheetSection id="put-back" title="Put it back in service">
              {putBack}
            </SheetSection>
          ) : null}
        </div>
        <div className="grid content-start gap-8">
          <SheetSection
            title="Why this rank"
            note={`${formatNumber(job.priority, { digits: 1 })} of 100 points`}
          >
            <PriorityBars parts={job.parts} />
            {job.movedPoints === null ? null : (
              <p className="pt-3">
                Moved by{" "}
                <span className="type-figure">{formatNumber(job.movedPoints, { signed: true })}</span> points:{" "}
                {job.movedReason}
              </p>
            )}
          </SheetSection>
          {decide ? <SheetSection title="Decide">{decide}</SheetSection> : null}
        </div>
        <SheetSection title="Reasons" note={`${job.anchorCode} now`} className="lg:col-span-2">
          <Reasons findings={job.findings} uses={anchor.uses} />
        </SheetSection>
      </div>
    </SheetFrame>
  );
}

function titleOf(job: JobView, anchor: AnchorSheet, now: string) {
  return {
    name: job.title,
    kind: "Rebolt job",
    condition: (
      <span className="flex flex-wrap items-center gap-x-3 gap-y-1">
        <ConditionMark condition={job.anchorCondition} />
        <Badge tone={JOB_STATE_TONES[job.state]}>{JOB_STATE_LABELS[job.state]}</Badge>
      </span>
    ),
    revision: `${job.version}`,
    cells: [
      {
        name: "Anchor",
        value: (
          <Link href={`/anchors/${job.anchorCode}`} className="text-link">
            {job.anchorCode} {job.anchorLabel}
          </Link>
        ),
      },
      {
        name: "Site",
        value: (
          <Link href={`/sites/${anchor.site.slug}`} className="text-link">
            {job.siteName}
          </Link>
        ),
      },
      {
        name: "Computed rank",
        value: job.computedRank === 0 ? "not in the queue now" : `${job.computedRank}`,
      },
      { name: "Waiting", value: waitingDays(job.waitingSince, job.doneAt ?? now) },
      { name: "Wanted by", value: <PastDate on={job.dueOn} unknown="no date" /> },
      { name: "Given to", value: formatList(job.assignees.map(({ name }) => name)) || "nobody yet" },
    ],
  };
}

function Outcome({ job, timeZone }: { job: JobView; timeZone: string }) {
  if (job.state === "turned_down") {
    return <Notice title="Turned down">{job.decidedReason}</Notice>;
  }
  if (job.outcome === null) return null;
  return (
    <Notice tone="calm" title={`Done: ${JOB_OUTCOME_LABELS[job.outcome]}`}>
      {job.doneAt ? <Moment at={job.doneAt} timeZone={timeZone} /> : null}
      {job.holeFate && job.holeFate !== "none" ? `. Old hole: ${HOLE_FATE_LABELS[job.holeFate]}` : ""}
      {job.outcomeNote ? `. ${sentence(job.outcomeNote)}` : ""}
      {job.outcomePhoto ? <PhotoStrip photos={[job.outcomePhoto]} about="finished work" /> : null}
    </Notice>
  );
}
