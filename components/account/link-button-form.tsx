"use client";

import { enterWithSecret } from "@/components/account/enter";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import { useForm } from "@/components/ui/use-form";
import { refusedInWords } from "@/components/account/refused-in-words";

/**
 * The button behind a mailed sign-in link. The link alone does nothing, so a program that opens every link
 * of a mail does not use it up.
 */
export function LinkButtonForm({ secret, to }: { secret: string; to: string }) {
  const form = useForm<null>(() => refusedInWords(() => enterWithSecret(secret, to)));
  return (
    <form {...form.formProps} className="grid gap-4">
      <ErrorSummary problems={form.problems} title="Not signed in" />
      <div>
        <SubmitButton pending={form.pending} pendingLabel="Signing in…">
          Sign in on this device
        </SubmitButton>
      </div>
    </form>
  );
}
