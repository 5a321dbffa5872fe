import type { Metadata } from "next";
import { askForReset } from "@/app/(account)/actions";
import { MailLinkForm } from "@/components/account/mail-link-form";
import { Page } from "@/components/layout/page";

export const metadata: Metadata = { title: "Set a new password" };

export default function ForgotPage() {
  return (
    <Page
      title="Set a new password"
      width="read"
      intro="Write your address; the mail holds a link to choose a new one."
    >
      <MailLinkForm
        action={askForReset}
        fieldId="reset-email"
        submitLabel="Mail me a link"
        worksFor="60 minutes"
      />
    </Page>
  );
}
