import "server-only";
import nodemailer from "nodemailer";
import { env } from "@/lib/config/env";
import { sinkPort } from "@/lib/mail/sink";

export interface Envelope {
  id: string;
  toEmail: string;
  subject: string;
  body: string;
}

/** Hands one mail to the mail server; throws when it was not taken. */
export type Deliver = (mail: Envelope) => Promise<void>;

/** How mail leaves: the configured server, else the local sink when it runs, else null (mail stays queued). */
export function openTransport(): Deliver | null {
  const url = env().SMTP_URL ?? sinkUrl();
  return url ? smtpDeliver(url, env().MAIL_FROM) : null;
}

/** A mail server that hangs must not hold a row locked for minutes. */
const TIMEOUTS_MS = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 30_000 };

/**
 * Sends over SMTP. The message id is made of the mail's own id, so that the second copy after a crash between
 * sending and noting it can be told from a second mail.
 */
export function smtpDeliver(url: string, from: string): Deliver {
  const transport = nodemailer.createTransport({ url, ...TIMEOUTS_MS }, { from });
  const domain = /@([\w.-]+)>?\s*$/.exec(from)?.[1] ?? "byssus.invalid";
  return async (mail) => {
    await transport.sendMail({
      to: { name: "", address: mail.toEmail },
      subject: mail.subject,
      text: mail.body,
      messageId: `<${mail.id}@${domain}>`,
      headers: { "Auto-Submitted": "auto-generated" },
    });
  };
}

function sinkUrl(): string | null {
  const port = sinkPort();
  return port === null ? null : `smtp://127.0.0.1:${port}?ignoreTLS=true`;
}
