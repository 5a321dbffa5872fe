"use client";

import { useState } from "react";
import { enterWithSecret } from "@/components/account/enter";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";

/**
 * The button behind a mailed sign-in link. The link alone does nothing, so a program that opens every link
 * of a mail does not use it up.
 */
export function LinkButtonForm({ secret, to }: { secret: string; to: string }) {
  const [pending, setPending] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);
  return (
    <form
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        setPending(true);
        setRefusal(null);
        enterWithSecret(secret, to).catch((error: unknown) => {
          setRefusal(error instanceof Error ? error.message : "Something went wrong. Try again.");
          setPending(false);
        });
      }}
    >
      <ErrorSummary problems={refusal ? [{ path: "", message: refusal }] : []} title="Not signed in" />
      <div>
        <SubmitButton pending={pending} pendingLabel="Signing in…">
          Sign in on this device
        </SubmitButton>
      </div>
    </form>
  );
}
