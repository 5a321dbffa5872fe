import "server-only";
import { getDb } from "@/db/client";
import { listApiTokens } from "@/db/repositories/api-tokens";
import { listAreaNames } from "@/db/repositories/memberships";
import { findUserById } from "@/db/repositories/people";
import type { Person, Role, TokenScope } from "@/lib/shared/actor";

export interface ApiTokenView {
  id: string;
  name: string;
  hint: string;
  scopes: readonly TokenScope[];
  /** Each ISO 8601 UTC. */
  createdAt: string;
  expiresAt: string | null;
  lastUsedAt: string | null;
}

export interface SettingsView {
  name: string;
  email: string;
  isAdmin: boolean;
  hasPassword: boolean;
  roles: { areaName: string; role: Role }[];
  tokens: ApiTokenView[];
}

/** Everything the person can change about their own account. */
export async function getSettings(person: Person): Promise<SettingsView> {
  const db = getDb();
  const [user, areas, tokens] = await Promise.all([
    findUserById(db, person.userId),
    listAreaNames(db, Object.keys(person.roles)),
    listApiTokens(db, person.userId),
  ]);
  return {
    name: person.name,
    email: person.email,
    isAdmin: person.isAdmin,
    hasPassword: (user?.passwordHash ?? null) !== null,
    roles: areas.flatMap(({ id, name }) => {
      const role = person.roles[id];
      return role ? [{ areaName: name, role }] : [];
    }),
    tokens: tokens.map(({ id, name, hint, scopes, createdAt, expiresAt, lastUsedAt }) => ({
      id,
      name,
      hint,
      scopes,
      createdAt: createdAt.toISOString(),
      expiresAt: expiresAt?.toISOString() ?? null,
      lastUsedAt: lastUsedAt?.toISOString() ?? null,
    })),
  };
}
