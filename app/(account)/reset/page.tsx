import type { Metadata } from "next";
import { setNewPassword } from "@/app/(account)/actions";
import { LinkGone } from "@/components/account/link-gone";
import { NewPasswordForm } from "@/components/account/new-password-form";
import { Page } from "@/components/layout/page";
import { hashSecret } from "@/lib/auth/secrets";
import { now } from "@/lib/config/clock";
import { linkWorks } from "@/lib/queries/account/get-invitation";

export const metadata: Metadata = { title: "Choose a new password" };

export default async function ResetPage({
  searchParams,
}: {
  searchParams: Promise<{ secret?: string | string[] }>;
}) {
  const { secret } = await searchParams;
  if (typeof secret !== "string" || !(await linkWorks(hashSecret(secret), "reset_password", now()))) {
    return <LinkGone again="/forgot" />;
  }
  return (
    <Page
      title="Choose a new password"
      width="read"
      intro="You are signed out on every other device when it is saved."
    >
      <NewPasswordForm action={setNewPassword} secret={secret} to="/" />
    </Page>
  );
}
