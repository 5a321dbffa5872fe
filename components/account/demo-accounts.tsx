"use client";

import { enterWithSecret } from "@/components/account/enter";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface DemoAccountsProps {
  accounts: readonly { email: string; name: string }[];
  action: FormAction<{ signInSecret: string }>;
  to: string;
}

/** The people of the demo; one press signs in as one of them. */
export function DemoAccounts({ accounts, action, to }: DemoAccountsProps) {
  return (
    <section aria-labelledby="demo-accounts" className="border border-line-strong bg-sunk p-4">
      <h2 id="demo-accounts" className="text-lg">
        Look around as
      </h2>
      <p className="mt-1 text-sm text-muted">
        This is a demo: the island and everything on it are invented. Each person sees what their role sees.
      </p>
      <ul className="mt-3 divide-y divide-line border-y border-line">
        {accounts.map((account) => (
          <li key={account.email}>
            <DemoAccountForm account={account} action={action} to={to} />
          </li>
        ))}
      </ul>
    </section>
  );
}

function DemoAccountForm({
  account,
  action,
  to,
}: Omit<DemoAccountsProps, "accounts"> & { account: DemoAccountsProps["accounts"][number] }) {
  const form = useForm(action, ({ signInSecret }) => enterWithSecret(signInSecret, to));
  return (
    <form {...form.formProps} className="grid gap-2 py-2">
      <input type="hidden" name="email" value={account.email} />
      <div className="flex items-center justify-between gap-4">
        <span className="grid min-w-0">
          <span className="font-semibold">{account.name}</span>
          <Address email={account.email} />
        </span>
        <SubmitButton tone="secondary" pending={form.pending} pendingLabel="Signing in…">
          Enter<span className="sr-only"> as {account.name}</span>
        </SubmitButton>
      </div>
      <ErrorSummary problems={form.problems} title="Not signed in" />
    </form>
  );
}

/** Breaks before the host where there is no room for both. */
function Address({ email }: { email: string }) {
  const at = email.indexOf("@");
  return (
    <span className="type-code text-sm text-muted">
      {email.slice(0, at)}
      <wbr />
      {email.slice(at)}
    </span>
  );
}
