"use client";

import { Disclosure } from "@/components/ui/disclosure";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface EndFormProps {
  action: FormAction<void>;
  record: { id: string; version: number };
  /** "Close it", "Lift it". */
  label: string;
  /** What it is, for those who have the list read out. */
  about: string;
  hint: string;
}

/** Ends something that holds, with a reason. It stays in history. */
export function EndForm({ action, record, label, about, hint }: EndFormProps) {
  const form = useForm(action);
  const fieldId = `reason-${record.id}`;
  const problems = form.problems.map((problem) =>
    problem.path === "reason" ? { ...problem, path: fieldId } : problem,
  );
  return (
    <Disclosure
      summary={
        <span>
          {label}
          <span className="sr-only">: {about}</span>
        </span>
      }
      className="border-y-0"
    >
      <form {...form.formProps} className="grid max-w-xl gap-4">
        <ErrorSummary problems={problems} title="Nothing was changed" />
        <input type="hidden" name="id" value={record.id} readOnly />
        <input type="hidden" name="version" value={record.version} readOnly />
        <TextField
          name="reason"
          id={fieldId}
          label="Why"
          hint={hint}
          error={form.errorOf("reason")}
          maxLength={500}
        />
        <SubmitButton tone="secondary" pending={form.pending} pendingLabel="Saving…">
          {label}
        </SubmitButton>
      </form>
    </Disclosure>
  );
}
