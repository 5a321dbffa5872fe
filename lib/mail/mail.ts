import "server-only";

/** A mail as it is queued: plain text, one recipient. */
export interface Mail {
  kind: MailKind;
  subject: string;
  body: string;
}

export const MAIL_KINDS = [
  "sign_in",
  "reset_password",
  "invitation",
  "password_changed",
  "role_changed",
  "membership_ended",
  "out_of_use",
  "back_in_service",
  "report_filed",
  "report_answered",
  "job_assigned",
  "warning_published",
] as const;
export type MailKind = (typeof MAIL_KINDS)[number];

const SECRET_KINDS: ReadonlySet<string> = new Set<MailKind>(["sign_in", "reset_password", "invitation"]);

/** Mails with a secret link in them: once sent, their text is not kept. */
export function carriesSecret(kind: string): boolean {
  return SECRET_KINDS.has(kind);
}
