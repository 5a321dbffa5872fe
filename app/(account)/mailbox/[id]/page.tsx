import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { MailText } from "@/components/account/mail-text";
import { Page } from "@/components/layout/page";
import { Moment } from "@/components/ui/date-text";
import { Fact, Facts } from "@/components/ui/facts";
import { findCaughtMail } from "@/lib/queries/account/mailbox";

export const metadata: Metadata = { title: "Mail" };

export default async function MailPage({ params }: { params: Promise<{ id: string }> }) {
  const mail = await findCaughtMail((await params).id);
  if (!mail) notFound();
  return (
    <Page title={mail.subject} width="read">
      <div className="grid gap-6">
        <Facts>
          <Fact name="To">
            <span className="type-code break-all">{mail.to}</span>
          </Fact>
          <Fact name="Received">
            <Moment at={mail.receivedAt} timeZone="UTC" /> UTC
          </Fact>
        </Facts>
        <MailText body={mail.body} />
        <p>
          <Link href="/mailbox" className="inline-flex touch items-center text-link">
            All mail
          </Link>
        </p>
      </div>
    </Page>
  );
}
