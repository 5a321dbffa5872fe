"use client";

import { enterWithSecret } from "@/components/account/enter";
import { PasswordField } from "@/components/account/password-field";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

/** The account of the person who runs this installation. */
export function FirstRunForm({
  action,
  secret,
}: {
  action: FormAction<{ signInSecret: string }>;
  secret: string;
}) {
  const form = useForm(action, ({ signInSecret }) => enterWithSecret(signInSecret, "/"));
  return (
    <form {...form.formProps} className="grid gap-5">
      <ErrorSummary problems={form.problems} title="Not set up yet" />
      <input type="hidden" name="secret" value={secret} />
      <TextField name="name" label="Your name" autoComplete="name" error={form.errorOf("name")} />
      <TextField
        name="email"
        label="E-mail"
        type="email"
        inputMode="email"
        autoComplete="username"
        autoCapitalize="none"
        error={form.errorOf("email")}
      />
      <PasswordField
        name="password"
        label="Password"
        hint="At least 10 characters. A few words are easier to type than signs."
        autoComplete="new-password"
        error={form.errorOf("password")}
      />
      <div>
        <SubmitButton pending={form.pending} pendingLabel="Setting up…">
          Become the administrator
        </SubmitButton>
      </div>
    </form>
  );
}
