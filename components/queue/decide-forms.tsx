"use client";

import { JobForm, type JobRef } from "@/components/queue/job-form";
import { NumberField } from "@/components/ui/number-field";
import { TextField } from "@/components/ui/text-field";
import { TextareaField } from "@/components/ui/textarea-field";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface DecideFormProps {
  job: JobRef & { dueOn: string | null; state: string };
  action: FormAction<void>;
}

/** Takes the entry on, or changes until when it is wanted. */
export function AcceptForm({ job, action }: DecideFormProps) {
  const form = useForm(action);
  const accepted = job.state === "accepted";
  return (
    <JobForm
      form={form}
      job={job}
      prefix="accept"
      submit={accepted ? "Change the date" : "Accept"}
      tone={accepted ? "secondary" : "primary"}
    >
      <input type="hidden" name="decision" value="accepted" readOnly />
      <TextField
        key={job.version}
        name="dueOn"
        id="accept-dueOn"
        type="date"
        label="Wanted by"
        defaultValue={job.dueOn ?? ""}
        error={form.errorOf("dueOn")}
        optional
      />
    </JobForm>
  );
}

export function TurnDownForm({ job, action }: DecideFormProps) {
  const form = useForm(action);
  return (
    <JobForm form={form} job={job} prefix="turn-down" submit="Turn down" tone="danger">
      <input type="hidden" name="decision" value="turned_down" readOnly />
      <TextareaField
        name="reason"
        id="turn-down-reason"
        label="Why it is turned down"
        hint="The reports behind it stay open until they are answered."
        error={form.errorOf("reason")}
        maxLength={1000}
      />
    </JobForm>
  );
}

interface MoveFormProps {
  job: JobRef & { movedPoints: number | null; movedReason: string | null };
  action: FormAction<void>;
}

/** Up or down by points. What was computed stays beside it. */
export function MoveForm({ job, action }: MoveFormProps) {
  const form = useForm(action);
  return (
    <JobForm form={form} job={job} prefix="move" submit="Move">
      <NumberField
        key={job.version}
        name="points"
        id="move-points"
        label="Move by"
        unit="points"
        className="[&_input]:pr-20"
        hint="Up is positive, down negative; 0 takes the move back."
        defaultValue={job.movedPoints ?? ""}
        error={form.errorOf("points")}
      />
      <TextField
        name="reason"
        id="move-reason"
        label="Why"
        defaultValue={job.movedReason ?? ""}
        error={form.errorOf("reason")}
        maxLength={500}
      />
    </JobForm>
  );
}
