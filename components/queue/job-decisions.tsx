import { AssignForm } from "@/components/queue/assign-form";
import { AcceptForm, MoveForm, TurnDownForm } from "@/components/queue/decide-forms";
import { Disclosure } from "@/components/ui/disclosure";
import type { JobView } from "@/lib/schemas/views/steward";
import type { FormAction } from "@/lib/shared/action-state";

interface JobDecisionsProps {
  job: JobView;
  decide: FormAction<void>;
  assign: FormAction<void>;
  move: FormAction<void>;
}

/** What a steward decides about an entry that is not done. */
export function JobDecisions({ job, decide, assign, move }: JobDecisionsProps) {
  const workers = job.members.filter(({ role }) => role === "bolter" || role === "steward");
  const accepted = job.state === "accepted";
  return (
    <div className="grid gap-6">
      {accepted ? <AssignForm job={job} workers={workers} action={assign} /> : null}
      <AcceptForm job={job} action={decide} />
      <div>
        <Disclosure summary="Move it up or down">
          <MoveForm job={job} action={move} />
        </Disclosure>
        {job.state === "turned_down" ? null : (
          <Disclosure summary="Turn it down">
            <TurnDownForm job={job} action={decide} />
          </Disclosure>
        )}
      </div>
    </div>
  );
}
