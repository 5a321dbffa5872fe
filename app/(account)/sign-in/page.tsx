import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { askForLink, enterAsDemoPerson } from "@/app/(account)/actions";
import { DemoAccounts } from "@/components/account/demo-accounts";
import { MailLinkForm } from "@/components/account/mail-link-form";
import { SignInForm } from "@/components/account/sign-in-form";
import { Page } from "@/components/layout/page";
import { getActor } from "@/lib/auth/get-actor";
import { listDemoAccounts } from "@/lib/queries/account/list-demo-accounts";
import { localPath } from "@/lib/shared/local-path";

export const metadata: Metadata = { title: "Sign in" };

export default async function SignInPage({
  searchParams,
}: {
  searchParams: Promise<{ next?: string | string[] }>;
}) {
  const { next } = await searchParams;
  const to = localPath(typeof next === "string" ? next : undefined);
  if ((await getActor()).kind === "person") redirect(to);
  const accounts = await listDemoAccounts();
  return (
    <Page
      title="Sign in"
      intro="Anybody can read the public part without an account. Sign in to report, to log installs, and to see what members see."
    >
      <div className="grid max-w-5xl items-start gap-x-12 gap-y-8 lg:grid-cols-2">
        <div className="border-t-2 border-frame pt-4">
          <SignInForm to={to} />
        </div>
        <div className="grid gap-8">
          {accounts.length > 0 ? (
            <DemoAccounts accounts={accounts} action={enterAsDemoPerson} to={to} />
          ) : null}
          <div className="border-t-2 border-frame pt-4">
            <MailLinkForm
              action={askForLink}
              fieldId="link-email"
              submitLabel="Mail me a link"
              worksFor="20 minutes"
            >
              <div className="grid gap-1">
                <h2>With a link by mail</h2>
                <p className="text-muted">No password needed: open the link on the device you want to use.</p>
              </div>
            </MailLinkForm>
          </div>
          <p className="text-sm text-muted">
            No account? Stewards invite people to their area. Ask the group that looks after yours.
          </p>
        </div>
      </div>
    </Page>
  );
}
