"use client";

import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import type { Condition } from "@/lib/domain/vocabulary";
import type { FormAction } from "@/lib/shared/action-state";

interface ReturnFormProps {
  anchorId: string;
  action: FormAction<{ condition: Condition }>;
}

/** Puts the anchor back. What is still missing is named, each with a link to its bolt. */
export function ReturnForm({ anchorId, action }: ReturnFormProps) {
  const form = useForm(action);
  const problems = form.problems.map(({ path, message }) => ({
    path: path === "reason" ? "return-reason" : path,
    message,
  }));
  return (
    <form {...form.formProps} className="grid gap-4">
      <ErrorSummary problems={problems} title="It stays out of use" />
      <input type="hidden" name="anchorId" value={anchorId} readOnly />
      <TextField
        name="reason"
        id="return-reason"
        label="Why it may be used again"
        hint="Stands in the revision table and in the mail to everybody who follows the anchor."
        error={form.errorOf("reason")}
        maxLength={1000}
      />
      <SubmitButton pending={form.pending} pendingLabel="Looking at every bolt…">
        Put it back
      </SubmitButton>
    </form>
  );
}
