"use client";

import { ROLE_MEANS } from "@/components/account/role-words";
import { ErrorSummary } from "@/components/ui/error-summary";
import { Notice } from "@/components/ui/notice";
import { RadioCards } from "@/components/ui/radio-cards";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";
import { ROLES } from "@/lib/shared/actor";

interface InviteFormProps {
  action: FormAction<{ email: string }>;
  areaId: string;
  /** Minted by the page: pressed twice, it is one invitation. */
  newId: string;
}

/** Mails somebody a link that makes them a member. */
export function InviteForm({ action, areaId, newId }: InviteFormProps) {
  const form = useForm(action);
  const fieldId = `invite-email-${areaId}`;
  const problems = form.problems.map((problem) =>
    problem.path === "email" ? { ...problem, path: fieldId } : problem,
  );
  return (
    <form {...form.formProps} className="grid gap-5">
      <ErrorSummary problems={problems} title="Nobody was invited" />
      {form.state.state === "done" ? (
        <Notice tone="calm" role="status">
          A link is on its way to {form.state.result.email}. It works for 14 days.
        </Notice>
      ) : null}
      <input type="hidden" name="id" value={newId} />
      <input type="hidden" name="areaId" value={areaId} />
      <TextField
        name="email"
        id={fieldId}
        label="E-mail"
        type="email"
        inputMode="email"
        autoComplete="off"
        autoCapitalize="none"
        error={form.errorOf("email")}
      />
      <RadioCards
        name="role"
        legend="Role"
        cards={ROLES.map((role) => ({ value: role, label: role, detail: ROLE_MEANS[role] }))}
        defaultValue="rigger"
        error={form.errorOf("role")}
      />
      <div>
        <SubmitButton pending={form.pending}>Send the invitation</SubmitButton>
      </div>
    </form>
  );
}
