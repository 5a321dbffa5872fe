import "server-only";
import { getDb } from "@/db/client";
import { findOpenInvitation } from "@/db/repositories/invitations";
import { findOneTimeToken, findUserByEmail } from "@/db/repositories/people";
import type { Role } from "@/lib/shared/actor";

export interface InvitationView {
  email: string;
  role: Role;
  areaName: string;
  invitedBy: string;
  /** ISO 8601 UTC */
  expiresAt: string;
  /** The address has an account: nothing to fill in. */
  hasAccount: boolean;
}

/** What an invitation link offers, without spending it; null when it was used, taken back or has expired. */
export async function getInvitation(tokenHash: string, now: Date): Promise<InvitationView | null> {
  const db = getDb();
  const token = await findOneTimeToken(db, tokenHash, "invitation", now);
  const invitation = token?.invitationId ? await findOpenInvitation(db, token.invitationId, now) : null;
  if (!invitation) return null;
  return {
    email: invitation.email,
    role: invitation.role,
    areaName: invitation.areaName,
    invitedBy: invitation.invitedBy ?? "An administrator",
    expiresAt: invitation.expiresAt.toISOString(),
    hasAccount: (await findUserByEmail(db, invitation.email)) !== null,
  };
}

/** Whether a link of this kind still works, without spending it. */
export async function linkWorks(
  tokenHash: string,
  purpose: "reset_password" | "first_run",
  now: Date,
): Promise<boolean> {
  return (await findOneTimeToken(getDb(), tokenHash, purpose, now)) !== null;
}
