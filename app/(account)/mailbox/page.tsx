import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { Page } from "@/components/layout/page";
import { Moment } from "@/components/ui/date-text";
import { EmptyState } from "@/components/ui/state-panel";
import { usesMailSink } from "@/lib/config/env";
import { listCaughtMails } from "@/lib/queries/account/mailbox";

export const metadata: Metadata = { title: "Mailbox" };

export default async function MailboxPage() {
  if (!usesMailSink()) notFound();
  const mails = await listCaughtMails();
  return (
    <Page
      title="Mailbox"
      width="read"
      intro="No mail leaves this installation: what would have been sent to anybody is kept here, newest first."
    >
      {mails.length === 0 ? (
        <EmptyState title="No mail yet">
          Ask for a sign-in link or report a bent bolt, and look again.
        </EmptyState>
      ) : (
        <ul className="divide-y divide-line border-y border-line">
          {mails.map(({ id, to, subject, receivedAt }) => (
            <li key={id}>
              <Link
                href={`/mailbox/${id}`}
                className="grid touch gap-0.5 px-1 py-3 hover:bg-sunk hover:text-action"
              >
                <span className="font-semibold">{subject}</span>
                <span className="flex flex-wrap justify-between gap-x-4 text-sm text-muted">
                  <span className="type-code break-all">to {to}</span>
                  <Moment at={receivedAt} timeZone="UTC" />
                </span>
              </Link>
            </li>
          ))}
        </ul>
      )}
    </Page>
  );
}
