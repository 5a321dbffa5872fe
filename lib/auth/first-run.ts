import "server-only";
import { v7 } from "uuid";
import { type Db, inTransaction } from "@/db/client";
import { lockFirstRun, voidFirstRunLinks } from "@/db/repositories/accounts";
import { hasAdministrator, insertOneTimeToken } from "@/db/repositories/people";
import { hashSecret, newSecret } from "@/lib/auth/secrets";
import { env } from "@/lib/config/env";

const WEEK_MS = 7 * 86_400_000;

/**
 * The link that makes the administrator of a new installation; null when there is one already. It works once,
 * for a week; every call makes a new one and the earlier ones worthless.
 */
export function issueFirstRunLink(db: Db, now: Date): Promise<string | null> {
  return inTransaction(db, async (tx) => {
    await lockFirstRun(tx);
    if (await hasAdministrator(tx)) return null;
    await voidFirstRunLinks(tx, now);
    const secret = newSecret();
    await insertOneTimeToken(tx, {
      id: v7(),
      purpose: "first_run",
      tokenHash: hashSecret(secret),
      createdAt: now,
      expiresAt: new Date(now.getTime() + WEEK_MS),
    });
    return new URL(`/first-run/${secret}`, env().BYSSUS_URL).toString();
  });
}
