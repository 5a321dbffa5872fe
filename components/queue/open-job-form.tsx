"use client";

import { useRouter } from "next/navigation";
import { Checkbox } from "@/components/ui/checkbox";
import { ErrorSummary } from "@/components/ui/error-summary";
import { FieldError } from "@/components/ui/field";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface OpenJobFormProps {
  action: FormAction<{ id: string }>;
  /** The entry knows its id before it is sent, so that sending twice makes one. */
  newId: string;
  anchorId: string;
  placements: readonly { id: string; label: string }[];
}

/** Proposes a rebolt by hand. */
export function OpenJobForm({ action, newId, anchorId, placements }: OpenJobFormProps) {
  const router = useRouter();
  const form = useForm(action, ({ id }) => router.push(`/queue/${id}`));
  const problem = form.errorOf("placementIds");
  return (
    <form {...form.formProps} className="grid gap-7">
      <ErrorSummary problems={form.problems} />
      <input type="hidden" name="id" value={newId} readOnly />
      <input type="hidden" name="anchorId" value={anchorId} readOnly />
      <TextField
        name="title"
        label="What is to be done"
        hint="Replace the plated studs"
        error={form.errorOf("title")}
        maxLength={160}
      />
      <fieldset id="placementIds" tabIndex={-1} className="grid">
        <legend className="pb-1 font-semibold">At which placements</legend>
        <FieldError inputId="placementIds" error={problem} />
        {placements.map(({ id, label }) => (
          <Checkbox key={id} name="placementIds[]" id={`placement-${id}`} value={id} label={label} />
        ))}
      </fieldset>
      <TextField name="dueOn" type="date" label="Wanted by" error={form.errorOf("dueOn")} optional />
      <SubmitButton pending={form.pending} pendingLabel="Opening…">
        Open it
      </SubmitButton>
    </form>
  );
}
