import "server-only";
import { v7 } from "uuid";
import type { Tx } from "@/db/client";
import { insertOneTimeToken, type OneTimePurpose } from "@/db/repositories/people";
import { hashSecret, newSecret } from "@/lib/auth/secrets";
import { AppError } from "@/lib/shared/errors";

type MailedPurpose = Exclude<OneTimePurpose, "first_run">;

/** How long each kind of link works, minutes. */
export const LINK_MINUTES = {
  sign_in: 20,
  reset_password: 60,
  invitation: 14 * 24 * 60,
} as const satisfies Record<MailedPurpose, number>;

/** A device that has just proved itself signs in with this within two minutes. */
const HANDOVER_MINUTES = 2;

interface For {
  email?: string;
  userId?: string | null;
  invitationId?: string;
}

/** Makes a single-use secret and stores its hash. The secret itself is returned and kept nowhere. */
export async function issueLink(
  tx: Tx,
  purpose: MailedPurpose,
  whom: For,
  now: Date,
  minutes: number = LINK_MINUTES[purpose],
): Promise<string> {
  const secret = newSecret();
  await insertOneTimeToken(tx, {
    id: v7(),
    purpose,
    tokenHash: hashSecret(secret),
    email: whom.email ?? null,
    userId: whom.userId ?? null,
    invitationId: whom.invitationId ?? null,
    createdAt: now,
    expiresAt: new Date(now.getTime() + minutes * 60_000),
  });
  return secret;
}

/** A secret for the device that sent this request, to sign in (again) after its sessions were ended. */
export function issueHandover(tx: Tx, userId: string, now: Date): Promise<string> {
  return issueLink(tx, "sign_in", { userId }, now, HANDOVER_MINUTES);
}

/** Unknown, used and expired links read the same. */
export function linkGone(): AppError {
  return new AppError("not_found", "This link was used already or has expired. Ask for a new one.");
}
