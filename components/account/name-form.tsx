"use client";

import { ErrorSummary } from "@/components/ui/error-summary";
import { Notice } from "@/components/ui/notice";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

export function NameForm({ action, name }: { action: FormAction<void>; name: string }) {
  const form = useForm(action);
  return (
    <form {...form.formProps} className="grid gap-5">
      <ErrorSummary problems={form.problems} />
      {form.state.state === "done" ? (
        <Notice tone="calm" role="status">
          Saved.
        </Notice>
      ) : null}
      <TextField
        name="name"
        label="Name"
        hint="What you recorded earlier keeps the name it was recorded under."
        autoComplete="name"
        defaultValue={name}
        error={form.errorOf("name")}
      />
      <div>
        <SubmitButton tone="secondary" pending={form.pending} pendingLabel="Saving…">
          Save the name
        </SubmitButton>
      </div>
    </form>
  );
}
