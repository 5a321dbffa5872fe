import { randomUUID } from "node:crypto";
import { v7 } from "uuid";
import type { Db } from "@/db/client";
import { areas, memberships, users } from "@/db/schema";
import type { CommandContext } from "@/lib/commands/context";
import type { AreaVisibility } from "@/lib/domain/vocabulary";
import { type Actor, type Person, type Role, VISITOR } from "@/lib/shared/actor";

/** The hour at which most tests happen. */
export const NOON = new Date("2026-06-01T12:00:00Z");

export function later(minutes: number, than: Date = NOON): Date {
  return new Date(than.getTime() + minutes * 60_000);
}

export function contextOf(db: Db, actor: Actor = VISITOR, now: Date = NOON): CommandContext {
  return { db, actor, now, requestId: randomUUID() };
}

export async function addArea(db: Db, visibility: AreaVisibility = "public"): Promise<string> {
  const id = v7();
  await db.insert(areas).values({ id, slug: id, name: `Area ${id.slice(-4)}`, visibility });
  return id;
}

interface PersonOptions {
  roles?: Record<string, Role>;
  isAdmin?: boolean;
  passwordHash?: string;
  disabledAt?: Date;
}

/** Adds a person with an address of their own. */
export async function addPerson(db: Db, options: PersonOptions = {}): Promise<Person> {
  const { roles = {}, isAdmin = false, passwordHash = null, disabledAt = null } = options;
  const userId = v7();
  const email = `${userId}@people.example`;
  const name = `Person ${userId.slice(-4)}`;
  await db.insert(users).values({ id: userId, email, name, isAdmin, passwordHash, disabledAt });
  for (const [areaId, role] of Object.entries(roles)) {
    await db.insert(memberships).values({ userId, areaId, role });
  }
  return { kind: "person", userId, name, email, isAdmin, roles };
}

/** One person of each kind towards one area; `outsider` is steward of another. */
export async function addCast(db: Db, areaId: string) {
  const elsewhere = await addArea(db);
  return {
    visitor: VISITOR,
    outsider: await addPerson(db, { roles: { [elsewhere]: "steward" } }),
    rigger: await addPerson(db, { roles: { [areaId]: "rigger" } }),
    bolter: await addPerson(db, { roles: { [areaId]: "bolter" } }),
    steward: await addPerson(db, { roles: { [areaId]: "steward" } }),
    admin: await addPerson(db, { isAdmin: true }),
  };
}
