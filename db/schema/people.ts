import { boolean, index, integer, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { audit, instant } from "@/db/columns/audit";
import { areas } from "@/db/schema/area";
import type { Role, TokenScope } from "@/lib/shared/actor";

/** A person who can sign in. E-mail is kept in lower case. */
export const users = pgTable("users", {
  id: uuid().primaryKey(),
  email: text().notNull().unique(),
  name: text().notNull(),
  /** argon2id; null: signs in by e-mail link only. */
  passwordHash: text(),
  emailVerifiedAt: instant(),
  isAdmin: boolean().notNull().default(false),
  /** Raised to end every session of the person: a session carries the epoch it was made in. */
  sessionEpoch: integer().notNull().default(1),
  /** TOTP secret; null: no second factor. */
  secondFactorSecret: text(),
  /** Demo accounts exist only in the demo and may be listed on its sign-in page. */
  isDemo: boolean().notNull().default(false),
  disabledAt: instant(),
  ...audit(),
});

/**
 * Single-use secrets sent by mail or printed once: e-mail sign-in, password reset, invitation, first run.
 * Only the SHA-256 of the secret is stored.
 */
export const oneTimeTokens = pgTable(
  "one_time_tokens",
  {
    id: uuid().primaryKey(),
    purpose: text().$type<"sign_in" | "reset_password" | "invitation" | "first_run">().notNull(),
    tokenHash: text().notNull().unique(),
    email: text(),
    userId: uuid().references(() => users.id),
    invitationId: uuid(),
    expiresAt: instant().notNull(),
    usedAt: instant(),
    createdAt: instant().notNull().defaultNow(),
  },
  (t) => [index().on(t.email, t.purpose)],
);

/** One role per person and area. */
export const memberships = pgTable(
  "memberships",
  {
    userId: uuid()
      .notNull()
      .references(() => users.id),
    areaId: uuid()
      .notNull()
      .references(() => areas.id),
    role: text().$type<Role>().notNull(),
    ...audit(),
  },
  (t) => [primaryKey({ columns: [t.userId, t.areaId] }), index().on(t.areaId)],
);

export const invitations = pgTable(
  "invitations",
  {
    id: uuid().primaryKey(),
    areaId: uuid()
      .notNull()
      .references(() => areas.id),
    email: text().notNull(),
    role: text().$type<Role>().notNull(),
    expiresAt: instant().notNull(),
    acceptedAt: instant(),
    acceptedBy: uuid(),
    revokedAt: instant(),
    digest: text(),
    ...audit(),
  },
  (t) => [index().on(t.areaId)],
);

/** For programs. The token is shown once; only its SHA-256 stays. */
export const apiTokens = pgTable("api_tokens", {
  id: uuid().primaryKey(),
  userId: uuid()
    .notNull()
    .references(() => users.id),
  name: text().notNull(),
  tokenHash: text().notNull().unique(),
  /** First characters, so that a person can tell tokens apart. */
  hint: text().notNull(),
  scopes: text().array().$type<TokenScope[]>().notNull(),
  expiresAt: instant(),
  lastUsedAt: instant(),
  revokedAt: instant(),
  createdAt: instant().notNull().defaultNow(),
});

/** Rate limits, in the shape rate-limiter-flexible's Drizzle store wants. */
export const rateLimits = pgTable("rate_limits", {
  key: text().primaryKey(),
  points: integer().notNull(),
  expire: instant(),
});
