import { asc, eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { outbox } from "@/db/schema";

/** Everything queued for an address, oldest first. */
export function mailsTo(db: Db, email: string) {
  return db.select().from(outbox).where(eq(outbox.toEmail, email)).orderBy(asc(outbox.id));
}

/** The secret in the link of the newest mail of a kind. */
export async function secretMailed(db: Db, email: string, kind: string): Promise<string> {
  const mail = (await mailsTo(db, email)).findLast((row) => row.kind === kind);
  const secret = /(?:secret=|\/invitation\/)([\w-]{43})/.exec(mail?.body ?? "")?.[1];
  if (!secret) throw new Error(`No link of kind ${kind} was mailed to ${email}.`);
  return secret;
}
