"use client";

import { JobForm, type JobRef } from "@/components/queue/job-form";
import { Checkbox } from "@/components/ui/checkbox";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface AssignFormProps {
  job: JobRef & { assignees: readonly { userId: string }[] };
  /** Bolters and stewards of the area. */
  workers: readonly { userId: string; name: string; role: string }[];
  action: FormAction<void>;
}

/** Gives the job to one or several people; each who is new gets a mail. */
export function AssignForm({ job, workers, action }: AssignFormProps) {
  const form = useForm(action);
  const has = (userId: string) => job.assignees.some((one) => one.userId === userId);
  return (
    <JobForm form={form} job={job} prefix="assign" submit="Give it to them">
      <fieldset key={job.version} id="assign-userIds" tabIndex={-1} className="grid">
        <legend className="pb-1 font-semibold">Who does it</legend>
        {workers.map(({ userId, name, role }) => (
          <Checkbox
            key={userId}
            name="userIds[]"
            id={`assign-${userId}`}
            value={userId}
            defaultChecked={has(userId)}
            label={name}
            hint={role}
          />
        ))}
      </fieldset>
    </JobForm>
  );
}
