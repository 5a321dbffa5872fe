import "server-only";
import { getDb } from "@/db/client";
import { findSinkMail, listSinkMails, type SinkMailRow } from "@/db/repositories/sink-mails";
import { usesMailSink } from "@/lib/config/env";
import { AppError } from "@/lib/shared/errors";

export interface CaughtMailView {
  id: string;
  to: string;
  subject: string;
  body: string;
  /** ISO 8601 UTC */
  receivedAt: string;
}

/** Mail caught by the local sink, newest first. @throws AppError `not_found` where there is no sink. */
export async function listCaughtMails(): Promise<CaughtMailView[]> {
  requireSink();
  return (await listSinkMails(getDb())).map(viewOf);
}

/** @throws AppError `not_found` */
export async function getCaughtMail(id: string): Promise<CaughtMailView> {
  requireSink();
  const row = await findSinkMail(getDb(), id);
  if (!row) throw new AppError("not_found", "There is no such mail.");
  return viewOf(row);
}

function requireSink(): void {
  if (!usesMailSink()) throw new AppError("not_found", "There is no mailbox here: mail really leaves.");
}

function viewOf({ id, toAddress, subject, body, receivedAt }: SinkMailRow): CaughtMailView {
  return { id, to: toAddress, subject, body, receivedAt: receivedAt.toISOString() };
}
