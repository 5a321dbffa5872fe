import Link from "next/link";
import { ConditionMark } from "@/components/finding/condition-mark";
import { JOB_STATE_TONES, placementsOf, waitingDays } from "@/components/queue/job-words";
import { PriorityBars, PriorityStrip } from "@/components/queue/priority-bars";
import { Badge } from "@/components/ui/badge";
import { PastDate } from "@/components/ui/date-text";
import { Disclosure } from "@/components/ui/disclosure";
import { StackCell, StackRow, StackTable } from "@/components/ui/stack-table";
import { JOB_OUTCOME_LABELS, JOB_STATE_LABELS } from "@/lib/domain/labels";
import type { QueueEntry } from "@/lib/schemas/views/steward";
import { formatList, formatNumber } from "@/lib/shared/format";

const HEAD = [
  { name: "Rank" },
  { name: "What and where" },
  { name: "Why this rank" },
  { name: "Reasons" },
  { name: "Waiting" },
  { name: "Who, until when" },
];

/** The queue, first come who needs it most. On a phone each entry is a block of its own. */
export function QueueTable({ entries, now }: { entries: readonly QueueEntry[]; now: string }) {
  return (
    <StackTable caption="Rebolt queue" head={HEAD}>
      {entries.map((entry, index) => (
        <QueueRow key={entry.id} entry={entry} place={index + 1} now={now} />
      ))}
    </StackTable>
  );
}

function QueueRow({ entry, place, now }: { entry: QueueEntry; place: number; now: string }) {
  const { anchorCode, anchorLabel, siteName, title } = entry;
  return (
    <StackRow>
      <StackCell className="max-lg:hidden lg:w-20 print:table-cell">
        <span className="type-figure text-2xl leading-none">{place}</span>
        {entry.movedPoints === null ? null : (
          <span className="block text-sm text-muted">computed {entry.computedRank}</span>
        )}
      </StackCell>
      <StackCell head wide className="order-first lg:w-72">
        <span className="type-figure text-lg lg:hidden print:hidden">{place} </span>
        <Link href={`/queue/${entry.id}`} className="inline-block py-1 font-semibold text-link">
          {title}
        </Link>
        <span className="block text-sm">
          <span className="type-code">{anchorCode}</span> {anchorLabel}, {siteName},{" "}
          {placementsOf(entry.placementNumbers)}
        </span>
        <span className="flex flex-wrap items-center gap-x-3 gap-y-1 pt-1">
          <ConditionMark condition={entry.anchorCondition} />
          <Badge tone={JOB_STATE_TONES[entry.state]}>{JOB_STATE_LABELS[entry.state]}</Badge>
        </span>
      </StackCell>
      <StackCell label="Why this rank" wide className="order-last lg:w-80">
        <Points entry={entry} />
      </StackCell>
      <StackCell label="Reasons" wide>
        <ReasonWords reasons={entry.reasons} />
      </StackCell>
      <StackCell label="Waiting" className="lg:whitespace-nowrap">
        <span className="type-figure">{waitingDays(entry.waitingSince, now)}</span>
        <span className="block text-sm text-muted">
          from <PastDate on={entry.waitingSince.slice(0, 10)} />
        </span>
      </StackCell>
      <StackCell label="Who, until when">
        <Who entry={entry} now={now} />
      </StackCell>
    </StackRow>
  );
}

function Points({ entry }: { entry: QueueEntry }) {
  const moved = entry.movedPoints;
  return (
    <div className="grid gap-1">
      <p className="flex items-baseline gap-2">
        <span className="type-figure text-lg">{formatNumber(entry.priority, { digits: 1 })}</span>
        <span className="text-sm text-muted">of 100 points</span>
      </p>
      <PriorityStrip parts={entry.parts} />
      {moved === null ? null : (
        <p className="text-sm">
          Moved by <span className="type-figure">{formatNumber(moved, { signed: true })}</span>:{" "}
          {entry.movedReason}
        </p>
      )}
      <Disclosure summary="The parts" className="border-0">
        <PriorityBars parts={entry.parts} />
      </Disclosure>
    </div>
  );
}

function ReasonWords({ reasons }: { reasons: QueueEntry["reasons"] }) {
  if (reasons.length === 0) return <span className="text-muted">No rule speaks against it.</span>;
  return (
    <ul className="grid gap-1 text-sm">
      {reasons.slice(0, 3).map((reason) => (
        <li key={reason.title}>{reason.title}</li>
      ))}
      {reasons.length > 3 ? <li className="text-muted">and {reasons.length - 3} more</li> : null}
    </ul>
  );
}

function Who({ entry, now }: { entry: QueueEntry; now: string }) {
  if (entry.outcome !== null) return <span>{JOB_OUTCOME_LABELS[entry.outcome]}</span>;
  if (entry.state === "turned_down") return <span>{entry.decidedReason}</span>;
  const late = entry.dueOn !== null && entry.dueOn < now.slice(0, 10);
  return (
    <>
      {entry.assignees.length > 0 ? (
        <span>{formatList(entry.assignees.map(({ name }) => name))}</span>
      ) : (
        <span className="text-muted">nobody yet</span>
      )}
      {entry.dueOn ? (
        <span className={late ? "block font-semibold text-stop" : "block text-sm text-muted"}>
          {late ? "was due " : "until "}
          <PastDate on={entry.dueOn} />
        </span>
      ) : null}
    </>
  );
}
