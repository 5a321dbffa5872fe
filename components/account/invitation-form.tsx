"use client";

import { enterWithSecret } from "@/components/account/enter";
import { PasswordField } from "@/components/account/password-field";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface InvitationFormProps {
  action: FormAction<{ signInSecret: string }>;
  secret: string;
  areaName: string;
  /** The invited address has an account: there is nothing to fill in. */
  hasAccount: boolean;
}

/** Joins an area: with the account there is, or a new one. */
export function InvitationForm({ action, secret, areaName, hasAccount }: InvitationFormProps) {
  const form = useForm(action, ({ signInSecret }) => enterWithSecret(signInSecret, "/"));
  return (
    <form {...form.formProps} className="grid gap-5">
      <ErrorSummary problems={form.problems} title="Not joined yet" />
      <input type="hidden" name="secret" value={secret} />
      {hasAccount ? null : (
        <>
          <TextField
            name="name"
            label="Your name"
            why="It stands beside everything you record, so others know whom to ask."
            autoComplete="name"
            error={form.errorOf("name")}
          />
          <PasswordField
            name="password"
            label="Password"
            optional
            hint="At least 10 characters. Left empty, you sign in with a mailed link each time."
            autoComplete="new-password"
            error={form.errorOf("password")}
          />
        </>
      )}
      <div>
        <SubmitButton pending={form.pending} pendingLabel="Joining…">
          Join {areaName}
        </SubmitButton>
      </div>
    </form>
  );
}
