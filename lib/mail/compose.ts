import "server-only";
import { env } from "@/lib/config/env";
import type { Mail, MailKind } from "@/lib/mail/mail";

/** Stands under every mail about an anchor. */
export const CAUTION =
  "Byssus informs competent people; it does not certify an anchor. Look for yourself before you trust it.";

interface Parts {
  kind: MailKind;
  subject: string;
  /** Paragraphs; each is one line of text. */
  text: readonly string[];
  link?: string;
  /** What stands under the link: how long it works, what to do when it was not you. */
  after?: readonly string[];
  aboutAnchor?: boolean;
}

/** A mail in the one form all have: what happened, where to go, what to know. */
export function compose({ kind, subject, text, link, after = [], aboutAnchor = false }: Parts): Mail {
  const paragraphs = [
    ...text.map(oneLine),
    ...(link ? [link] : []),
    ...after.map(oneLine),
    ...(aboutAnchor ? [CAUTION] : []),
    `-- \nByssus, ${env().BYSSUS_URL}`,
  ];
  return { kind, subject: oneLine(subject), body: `${paragraphs.join("\n\n")}\n` };
}

/** The address of a page, for mails. */
export function pageUrl(path: string, query: Record<string, string> = {}): string {
  const url = new URL(path, env().BYSSUS_URL);
  for (const [name, value] of Object.entries(query)) url.searchParams.set(name, value);
  return url.toString();
}

/** What people typed may hold line breaks; in a subject they would start a new header. */
function oneLine(text: string): string {
  return text.replace(/\s+/g, " ").trim();
}
