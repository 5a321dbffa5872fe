import type { Metadata } from "next";
import { becomeAdministrator } from "@/app/(account)/actions";
import { FirstRunForm } from "@/components/account/first-run-form";
import { LinkGone } from "@/components/account/link-gone";
import { Page } from "@/components/layout/page";
import { hashSecret } from "@/lib/auth/secrets";
import { now } from "@/lib/config/clock";
import { linkWorks } from "@/lib/queries/account/get-invitation";

export const metadata: Metadata = { title: "Set up Byssus" };

export default async function FirstRunPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  if (!(await linkWorks(hashSecret(token), "first_run", now()))) {
    return (
      <LinkGone>
        Start Byssus again: while there is no administrator, it prints a new link each time.
      </LinkGone>
    );
  }
  return (
    <Page
      title="Set up Byssus"
      width="read"
      intro="This installation has nobody yet. You become its administrator: you make areas and invite their stewards."
    >
      <FirstRunForm action={becomeAdministrator} secret={token} />
    </Page>
  );
}
