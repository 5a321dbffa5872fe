import "server-only";
import { validate } from "uuid";
import { getDb } from "@/db/client";
import { findSinkMail, listSinkMails, type SinkMailRow } from "@/db/repositories/sink-mails";
import { usesMailSink } from "@/lib/config/env";

export interface CaughtMailView {
  id: string;
  to: string;
  subject: string;
  body: string;
  /** ISO 8601 UTC */
  receivedAt: string;
}

/** Mail caught by the local sink, newest first; none where there is no sink. */
export async function listCaughtMails(): Promise<CaughtMailView[]> {
  return usesMailSink() ? (await listSinkMails(getDb())).map(viewOf) : [];
}

/** Null where there is no such mail, or no sink. */
export async function findCaughtMail(id: string): Promise<CaughtMailView | null> {
  const row = usesMailSink() && validate(id) ? await findSinkMail(getDb(), id) : null;
  return row ? viewOf(row) : null;
}

function viewOf({ id, toAddress, subject, body, receivedAt }: SinkMailRow): CaughtMailView {
  return { id, to: toAddress, subject, body, receivedAt: receivedAt.toISOString() };
}
