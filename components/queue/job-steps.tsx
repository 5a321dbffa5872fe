import Link from "next/link";
import type { ReactNode } from "react";
import { needsCheck } from "@/components/queue/job-bolts";
import { placementsOf } from "@/components/queue/job-words";
import { Badge } from "@/components/ui/badge";
import { REPORT_KIND_LABELS } from "@/lib/domain/labels";
import type { SheetReport } from "@/lib/schemas/views/anchor";
import type { JobView } from "@/lib/schemas/views/steward";

interface JobStepsProps {
  job: JobView;
  reports: readonly SheetReport[];
}

/** The way from an entry in the queue to an anchor that may be used again, and how far it has come. */
export function JobSteps({ job, reports }: JobStepsProps) {
  const open = reports.filter(({ state, kind }) => state === "open" && kind !== "routine_check");
  const unchecked = job.bolts.filter(needsCheck).map(({ placementNumber }) => placementNumber);
  const out = job.anchorOutOfUseSince !== null;
  return (
    <ol className="grid">
      <Step done={job.state !== "proposed"} name="A steward accepts it and gives it to somebody" />
      <Step
        done={job.state === "done"}
        name="The work is done and closed with its outcome and a photo"
        note="Maker’s instructions and the land owner’s permission come first."
      />
      <Step done={open.length === 0} name="Every report is answered">
        {open.map((report) => (
          <Link key={report.id} href={`/reports/${report.id}`} className="inline-block py-1 text-link">
            {REPORT_KIND_LABELS[report.kind]}
            {report.placementNumber === null ? ", whole anchor" : `, placement ${report.placementNumber}`}
          </Link>
        ))}
      </Step>
      <Step
        done={!out || unchecked.length === 0}
        name="Every bolt that carried the event is checked by hand, with a photo"
        note={[
          unchecked.length > 0 ? `Still missing: ${placementsOf(unchecked)}.` : "",
          job.secondPersonForReturn ? "By somebody else than the one who puts it back." : "",
        ]
          .join(" ")
          .trim()}
      />
      <Step done={!out} name="A steward puts the anchor back in service" />
    </ol>
  );
}

function Step({
  done,
  name,
  note,
  children,
}: {
  done: boolean;
  name: string;
  note?: string;
  children?: ReactNode;
}) {
  return (
    <li className="grid grid-cols-[6rem_1fr] gap-x-3 border-t border-line py-2 last:border-b">
      <span>{done ? <Badge tone="calm">done</Badge> : <Badge>to do</Badge>}</span>
      <span className="grid justify-items-start">
        <span>{name}</span>
        {note ? <span className="text-sm text-muted">{note}</span> : null}
        {children}
      </span>
    </li>
  );
}
