import "server-only";
import { and, asc, count, eq, inArray, sql } from "drizzle-orm";
import type { Handle, Tx } from "@/db/client";
import { areas, memberships, users } from "@/db/schema";
import type { Role } from "@/lib/shared/actor";

/** Locks an area so that who belongs to it changes one at a time; null when there is none. */
export async function lockArea(tx: Tx, areaId: string) {
  const [row] = await tx
    .select({ id: areas.id, name: areas.name, visibility: areas.visibility })
    .from(areas)
    .where(eq(areas.id, areaId))
    .limit(1)
    .for("update");
  return row ?? null;
}

/** Areas by name; `ids` null: all. */
export async function listAreaNames(db: Handle, ids: readonly string[] | null) {
  if (ids?.length === 0) return [];
  return db
    .select({ id: areas.id, name: areas.name })
    .from(areas)
    .where(ids === null ? undefined : inArray(areas.id, [...ids]))
    .orderBy(asc(areas.name));
}

export async function listMembers(db: Handle, areaId: string) {
  return db
    .select({
      userId: users.id,
      name: users.name,
      email: users.email,
      role: memberships.role,
      version: memberships.version,
    })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(memberships.areaId, areaId))
    .orderBy(asc(users.name), asc(users.id));
}

export async function findMembership(db: Handle, areaId: string, userId: string) {
  const [row] = await db
    .select({
      userId: users.id,
      name: users.name,
      email: users.email,
      role: memberships.role,
      version: memberships.version,
    })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(memberships.areaId, areaId), eq(memberships.userId, userId)))
    .limit(1);
  return row ?? null;
}

export async function countStewards(db: Handle, areaId: string): Promise<number> {
  const [row] = await db
    .select({ n: count() })
    .from(memberships)
    .where(and(eq(memberships.areaId, areaId), eq(memberships.role, "steward")));
  return row?.n ?? 0;
}

export async function insertMembership(
  tx: Tx,
  row: { areaId: string; userId: string; role: Role; by: string },
  now: Date,
): Promise<void> {
  const { by, ...membership } = row;
  await tx
    .insert(memberships)
    .values({ ...membership, createdAt: now, createdBy: by, updatedAt: now, updatedBy: by });
}

/** False when somebody saved since `version` was read. */
export async function updateRole(
  tx: Tx,
  row: { areaId: string; userId: string; role: Role; version: number; by: string },
  now: Date,
): Promise<boolean> {
  const changed = await tx
    .update(memberships)
    .set({ role: row.role, updatedAt: now, updatedBy: row.by, version: sql`${memberships.version} + 1` })
    .where(
      and(
        eq(memberships.areaId, row.areaId),
        eq(memberships.userId, row.userId),
        eq(memberships.version, row.version),
      ),
    )
    .returning({ version: memberships.version });
  return changed.length === 1;
}

export async function deleteMembership(tx: Tx, areaId: string, userId: string): Promise<void> {
  await tx.delete(memberships).where(and(eq(memberships.areaId, areaId), eq(memberships.userId, userId)));
}
