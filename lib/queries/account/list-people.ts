import "server-only";
import { getDb } from "@/db/client";
import { listOpenInvitations } from "@/db/repositories/invitations";
import { listAreaNames, listMembers } from "@/db/repositories/memberships";
import { can } from "@/lib/policy/can";
import type { Actor, Role } from "@/lib/shared/actor";

export interface MemberView {
  userId: string;
  name: string;
  email: string;
  role: Role;
  version: number;
  isYou: boolean;
}

export interface InvitationRowView {
  id: string;
  email: string;
  role: Role;
  invitedBy: string | null;
  /** ISO 8601 UTC */
  expiresAt: string;
}

export interface AreaPeople {
  areaId: string;
  areaName: string;
  members: MemberView[];
  invitations: InvitationRowView[];
}

/** Members and open invitations of the areas whose people the actor manages; none for everybody else. */
export async function listPeople(actor: Actor, now: Date): Promise<AreaPeople[]> {
  if (actor.kind === "visitor") return [];
  const db = getDb();
  const managed = Object.keys(actor.roles).filter((areaId) => can(actor, "people.manage", { areaId }));
  const areas = await listAreaNames(db, actor.isAdmin ? null : managed);
  return Promise.all(
    areas.map(async (area) => {
      const [members, invitations] = await Promise.all([
        listMembers(db, area.id),
        listOpenInvitations(db, area.id, now),
      ]);
      return {
        areaId: area.id,
        areaName: area.name,
        members: members.map(({ userId, name, email, role, version }) => ({
          userId,
          name,
          email,
          role,
          version,
          isYou: userId === actor.userId,
        })),
        invitations: invitations.map(({ id, email, role, invitedBy, expiresAt }) => ({
          id,
          email,
          role,
          invitedBy,
          expiresAt: expiresAt.toISOString(),
        })),
      };
    }),
  );
}
