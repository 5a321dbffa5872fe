import Link from "next/link";
import { ConditionMark } from "@/components/finding/condition-mark";
import { HandCheckForm } from "@/components/queue/hand-check-form";
import { Badge } from "@/components/ui/badge";
import { Moment } from "@/components/ui/date-text";
import { Disclosure } from "@/components/ui/disclosure";
import type { JobView } from "@/lib/schemas/views/steward";
import type { FormAction } from "@/lib/shared/action-state";

interface JobBoltsProps {
  job: JobView;
  timeZone: string;
  now: string;
  /** One id for the check of each bolt, by bolt id. */
  newIds: Readonly<Record<string, string>>;
  /** Null: this reader does not check here. */
  check: FormAction<{ id: string }> | null;
}

/** Every bolt of the anchor, and what stands between it and being used again. */
export function JobBolts({ job, timeZone, now, newIds, check }: JobBoltsProps) {
  if (job.bolts.length === 0) return <p className="text-muted">No bolt stands here now.</p>;
  return (
    <ul className="divide-y divide-line border-y border-line">
      {job.bolts.map((bolt) => (
        <li
          key={bolt.boltId}
          id={`placements.${bolt.placementNumber}`}
          tabIndex={-1}
          className="grid scroll-mt-4 gap-1 py-3"
        >
          <div className="flex flex-wrap items-baseline gap-x-3 gap-y-1">
            <span className="type-figure text-lg">{bolt.placementNumber}</span>
            <Link href={`/bolts/${bolt.boltId}`} className="inline-block py-1 font-semibold text-link">
              {bolt.typeName ?? "type not known"}
            </Link>
            <ConditionMark condition={bolt.condition} verdict={bolt.verdict} />
            {bolt.inJob ? <Badge tone="info">in this job</Badge> : null}
          </div>
          <CheckState bolt={bolt} timeZone={timeZone} />
          {check && needsCheck(bolt) ? (
            <Disclosure summary={`Check placement ${bolt.placementNumber} by hand`} className="mt-1">
              <HandCheckForm
                anchorId={job.anchorId}
                placementId={bolt.placementId}
                placementNumber={bolt.placementNumber}
                newId={newIds[bolt.boltId] ?? ""}
                now={now}
                action={check}
              />
            </Disclosure>
          ) : null}
        </li>
      ))}
    </ul>
  );
}

type Bolt = JobView["bolts"][number];

export function needsCheck(bolt: Bolt): boolean {
  const done = bolt.handCheckedAt !== null && bolt.handCheckHasPhoto;
  return bolt.carriedEvent && bolt.condition !== "out_of_use" && !done;
}

function CheckState({ bolt, timeZone }: { bolt: Bolt; timeZone: string }) {
  if (bolt.handCheckedAt !== null) {
    return (
      <p className="text-sm">
        Checked by hand <Moment at={bolt.handCheckedAt} timeZone={timeZone} />
        {bolt.handCheckHasPhoto ? ", with a photo." : ". The photo of it is missing."}
      </p>
    );
  }
  if (!bolt.carriedEvent) return null;
  if (bolt.condition === "out_of_use") {
    return <p className="text-sm text-muted">Out of use itself: replaced or taken out, not checked.</p>;
  }
  return (
    <p className="text-sm font-semibold text-warn">Carried the same event, not checked by hand since.</p>
  );
}
