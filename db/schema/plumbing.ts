import { index, integer, jsonb, pgTable, text, uniqueIndex, uuid } from "drizzle-orm/pg-core";
import { instant } from "@/db/columns/audit";
import { anchors } from "@/db/schema/anchor";
import { sites } from "@/db/schema/area";
import { users } from "@/db/schema/people";

/** The audit trail: append-only (a trigger refuses update and delete). An anchor's revision table is read from it. */
export const events = pgTable(
  "events",
  {
    id: uuid().primaryKey(),
    at: instant().notNull().defaultNow(),
    actorUserId: uuid(),
    /** Kept as it was then. */
    actorName: text().notNull(),
    areaId: uuid(),
    anchorId: uuid(),
    subjectType: text().notNull(),
    subjectId: uuid().notNull(),
    /** A domain verb in the past tense: `bolt.installed`, `report.filed`, `anchor.moved`. */
    kind: text().notNull(),
    /** One line for people. */
    summary: text().notNull(),
    before: jsonb().$type<Record<string, unknown>>(),
    after: jsonb().$type<Record<string, unknown>>(),
    reason: text(),
  },
  (t) => [index().on(t.anchorId, t.at), index().on(t.areaId, t.at), index().on(t.subjectId)],
);

/** Mail waiting to be sent: written in the transaction that causes it, drained afterwards at least once. */
export const outbox = pgTable(
  "outbox",
  {
    id: uuid().primaryKey(),
    toEmail: text().notNull(),
    subject: text().notNull(),
    body: text().notNull(),
    kind: text().notNull(),
    areaId: uuid(),
    /** One mail per cause and person. */
    dedupeKey: text().notNull(),
    state: text().$type<"queued" | "sent" | "given_up">().notNull().default("queued"),
    attempts: integer().notNull().default(0),
    nextAttemptAt: instant().notNull().defaultNow(),
    lastError: text(),
    createdAt: instant().notNull().defaultNow(),
    sentAt: instant(),
  },
  (t) => [uniqueIndex().on(t.dedupeKey), index().on(t.state, t.nextAttemptAt)],
);

/** Who wants mail about what: exactly one of anchor and site is set. */
export const watches = pgTable(
  "watches",
  {
    id: uuid().primaryKey(),
    userId: uuid()
      .notNull()
      .references(() => users.id),
    anchorId: uuid().references(() => anchors.id),
    siteId: uuid().references(() => sites.id),
    createdAt: instant().notNull().defaultNow(),
  },
  (t) => [
    uniqueIndex().on(t.userId, t.anchorId),
    uniqueIndex().on(t.userId, t.siteId),
    index().on(t.anchorId),
  ],
);

/** Mails caught by the local sink of demo and development. */
export const sinkMails = pgTable("sink_mails", {
  id: uuid().primaryKey(),
  receivedAt: instant().notNull().defaultNow(),
  fromAddress: text().notNull(),
  toAddress: text().notNull(),
  subject: text().notNull(),
  body: text().notNull(),
});
