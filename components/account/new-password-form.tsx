"use client";

import { enterWithSecret } from "@/components/account/enter";
import { PasswordField } from "@/components/account/password-field";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface NewPasswordFormProps {
  action: FormAction<{ signInSecret: string }>;
  /** Of the mailed link; absent: the person is signed in. */
  secret?: string;
  /** Ask for the present password first. */
  asksCurrent?: boolean;
  to: string;
}

/** Sets a password, ends every other session and signs this device in again. */
export function NewPasswordForm({ action, secret, asksCurrent = false, to }: NewPasswordFormProps) {
  const form = useForm(action, ({ signInSecret }) => enterWithSecret(signInSecret, to));
  return (
    <form {...form.formProps} className="grid gap-5">
      <ErrorSummary problems={form.problems} title="The password was not changed" />
      {secret ? <input type="hidden" name="secret" value={secret} /> : null}
      {asksCurrent ? (
        <PasswordField
          name="current"
          label="Current password"
          autoComplete="current-password"
          error={form.errorOf("current")}
        />
      ) : null}
      <PasswordField
        name="password"
        label="New password"
        hint="At least 10 characters. A few words are easier to type than signs."
        autoComplete="new-password"
        error={form.errorOf("password")}
      />
      <div>
        <SubmitButton pending={form.pending} pendingLabel="Saving…">
          Save the password
        </SubmitButton>
      </div>
    </form>
  );
}
