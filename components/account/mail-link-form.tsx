"use client";

import type { ReactNode } from "react";
import { ErrorSummary } from "@/components/ui/error-summary";
import { Notice } from "@/components/ui/notice";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface MailLinkFormProps {
  action: FormAction<{ email: string }>;
  /** Two forms may share a page. */
  fieldId: string;
  submitLabel: string;
  /** How long the link works. */
  worksFor: string;
  children?: ReactNode;
}

/** Asks for a mailed link. The answer does not say whether the address has an account. */
export function MailLinkForm({ action, fieldId, submitLabel, worksFor, children }: MailLinkFormProps) {
  const form = useForm(action);
  const problems = form.problems.map((problem) => ({
    ...problem,
    path: problem.path === "" ? "" : fieldId,
  }));
  return (
    <form {...form.formProps} className="grid gap-5">
      {children}
      <ErrorSummary problems={problems} title="No mail was sent" />
      {form.state.state === "done" ? (
        <Notice tone="calm" role="status" title="Look into your mail">
          If {form.state.result.email} has an account here, a link is on its way. It works once, for{" "}
          {worksFor}.
        </Notice>
      ) : null}
      <TextField
        name="email"
        id={fieldId}
        label="E-mail"
        type="email"
        inputMode="email"
        autoComplete="email"
        autoCapitalize="none"
        error={form.errorOf("email")}
      />
      <div>
        <SubmitButton tone="secondary" pending={form.pending}>
          {submitLabel}
        </SubmitButton>
      </div>
    </form>
  );
}
