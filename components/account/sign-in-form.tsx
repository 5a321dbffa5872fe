"use client";

import Link from "next/link";
import { enterWithPassword } from "@/components/account/enter";
import { refusedInWords } from "@/components/account/refused-in-words";
import { PasswordField } from "@/components/account/password-field";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import type { ActionState } from "@/lib/shared/action-state";

/** E-mail and password. */
export function SignInForm({ to }: { to: string }) {
  const form = useForm<null>((_before, sent) => tryPassword(sent, to));
  return (
    <form {...form.formProps} className="grid gap-5" aria-labelledby="by-password">
      <h2 id="by-password">With your password</h2>
      <ErrorSummary problems={form.problems} title="Not signed in" />
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
        autoComplete="current-password"
        error={form.errorOf("password")}
      />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <SubmitButton pending={form.pending} pendingLabel="Signing in…">
          Sign in
        </SubmitButton>
        <Link href="/forgot" className="inline-flex touch items-center text-link">
          Forgot the password?
        </Link>
      </div>
    </form>
  );
}

async function tryPassword(sent: unknown, to: string): Promise<ActionState<null>> {
  const text = (name: string) => (sent instanceof FormData ? String(sent.get(name) ?? "") : "");
  const problems = [
    ...(text("email") === "" ? [{ path: "email", message: "Write your e-mail address." }] : []),
    ...(text("password") === "" ? [{ path: "password", message: "Write your password." }] : []),
  ];
  if (problems.length > 0) {
    return { state: "refused", code: "invalid_input", message: "Both are needed.", problems, values: {} };
  }
  return refusedInWords(() => enterWithPassword(text("email"), text("password"), to));
}
