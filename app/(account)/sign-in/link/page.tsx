import type { Metadata } from "next";
import { LinkButtonForm } from "@/components/account/link-button-form";
import { LinkGone } from "@/components/account/link-gone";
import { Page } from "@/components/layout/page";

export const metadata: Metadata = { title: "Sign in by link" };

export default async function SignInLinkPage({
  searchParams,
}: {
  searchParams: Promise<{ secret?: string | string[] }>;
}) {
  const { secret } = await searchParams;
  if (typeof secret !== "string") return <LinkGone again="/sign-in" />;
  return (
    <Page
      title="Sign in by link"
      width="read"
      intro="One press and this device is signed in. If you did not ask for the link, close the page."
    >
      <LinkButtonForm secret={secret} to="/" />
    </Page>
  );
}
