import "server-only";
import { v7 } from "uuid";
import { inTransaction, type Tx } from "@/db/client";
import { insertUser } from "@/db/repositories/accounts";
import { appendEvents } from "@/db/repositories/events";
import { type InvitationRow, lockInvitation, markInvitation } from "@/db/repositories/invitations";
import { findMembership, insertMembership, lockArea, updateRole } from "@/db/repositories/memberships";
import { findUserByEmail, spendOneTimeToken } from "@/db/repositories/people";
import { hashPassword } from "@/lib/auth/password";
import { hashSecret } from "@/lib/auth/secrets";
import { issueHandover, linkGone } from "@/lib/commands/account/one-time-link";
import type { CommandContext } from "@/lib/commands/context";
import { invalidField } from "@/lib/commands/writing/refusals";
import type { AcceptInvitationInput } from "@/lib/schemas/account";
import { ROLES } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

interface Joining {
  id: string;
  name: string;
}

/**
 * Joins the area the mailed link invites to, with the account of that address or a new one. Whoever holds the
 * link reads that mailbox, so the link is proof enough. A role that is held already is never lowered.
 * @throws AppError `not_found` when the link was used, taken back or has expired.
 */
export function acceptInvitation(
  { db, now }: CommandContext,
  input: AcceptInvitationInput,
): Promise<{ signInSecret: string }> {
  return inTransaction(db, async (tx) => {
    const token = await spendOneTimeToken(tx, hashSecret(input.secret), "invitation", now);
    const invitation = token?.invitationId ? await lockInvitation(tx, token.invitationId) : null;
    if (!invitation || invitation.acceptedAt || invitation.revokedAt || invitation.expiresAt <= now) {
      throw linkGone();
    }
    const joining =
      (await knownPerson(tx, invitation.email)) ?? (await newPerson(tx, invitation, input, now));
    await join(tx, invitation, joining, now);
    return { signInSecret: await issueHandover(tx, joining.id, now) };
  });
}

async function knownPerson(tx: Tx, email: string): Promise<Joining | null> {
  const user = await findUserByEmail(tx, email);
  if (user?.disabledAt) {
    throw new AppError("forbidden", "This account is closed. Ask an administrator of this installation.");
  }
  return user;
}

async function newPerson(
  tx: Tx,
  invitation: InvitationRow,
  input: AcceptInvitationInput,
  now: Date,
): Promise<Joining> {
  if (!input.name) throw invalidField("name", "Write the name others will see.");
  const person = { id: v7(), name: input.name };
  const passwordHash = input.password ? await hashPassword(input.password) : null;
  await insertUser(tx, { ...person, email: invitation.email, passwordHash, emailVerifiedAt: now }, now);
  return person;
}

async function join(
  tx: Tx,
  invitation: InvitationRow,
  { id: userId, name }: Joining,
  now: Date,
): Promise<void> {
  const { areaId, role } = invitation;
  await lockArea(tx, areaId);
  const held = await findMembership(tx, areaId, userId);
  if (!held) {
    await insertMembership(tx, { areaId, userId, role, by: userId }, now);
  } else if (ROLES.indexOf(held.role) < ROLES.indexOf(role)) {
    await updateRole(tx, { areaId, userId, role, version: held.version, by: userId }, now);
  }
  await markInvitation(tx, invitation.id, { acceptedAt: now, acceptedBy: userId }, { by: userId, now });
  const actor = { kind: "person", userId, name, email: invitation.email, isAdmin: false, roles: {} } as const;
  await appendEvents(tx, { actor, now }, [
    {
      areaId,
      subjectType: "membership",
      subjectId: userId,
      kind: "member.joined",
      summary: `${name} joined as ${role}`,
      after: { role },
    },
  ]);
}
