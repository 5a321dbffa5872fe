import {
  date,
  doublePrecision,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
  uuid,
} from "drizzle-orm/pg-core";
import { audit, instant, sentDigest, strike } from "@/db/columns/audit";
import { anchors } from "@/db/schema/anchor";
import { areas } from "@/db/schema/area";
import { users } from "@/db/schema/people";

/** A line's way between two anchors. */
export const spans = pgTable(
  "spans",
  {
    id: uuid().primaryKey(),
    areaId: uuid()
      .notNull()
      .references(() => areas.id),
    anchorAId: uuid()
      .notNull()
      .references(() => anchors.id),
    anchorBId: uuid()
      .notNull()
      .references(() => anchors.id),
    name: text().notNull(),
    /** Geodesic on the WGS84 ellipsoid, recomputed when an anchor moves. */
    lengthM: doublePrecision().notNull(),
    note: text(),
    ...strike(),
    ...sentDigest(),
    ...audit(),
  },
  (t) => [index().on(t.anchorAId), index().on(t.anchorBId), index().on(t.areaId)],
);

/** What is usually rigged on a span: the inputs of a load check, kept as JSON by version. */
export const spanRigs = pgTable(
  "span_rigs",
  {
    id: uuid().primaryKey(),
    spanId: uuid()
      .notNull()
      .references(() => spans.id),
    versionNo: integer().notNull(),
    rig: jsonb().$type<Record<string, unknown>>().notNull(),
    createdAt: instant().notNull().defaultNow(),
    createdBy: uuid(),
  },
  (t) => [unique().on(t.spanId, t.versionNo)],
);

/** A person's or group's own webbing set. */
export const kits = pgTable("kits", {
  id: uuid().primaryKey(),
  ownerUserId: uuid().references(() => users.id),
  areaId: uuid().references(() => areas.id),
  name: text().notNull(),
  segments: jsonb().$type<Record<string, unknown>[]>().notNull(),
  ...audit(),
});

/** What happened on a span: line up, line down, a load-cell reading, a storm. */
export const lineLog = pgTable(
  "line_log",
  {
    id: uuid().primaryKey(),
    spanId: uuid()
      .notNull()
      .references(() => spans.id),
    kind: text().$type<"up" | "down" | "reading" | "storm">().notNull(),
    at: instant().notNull(),
    tensionKn: doublePrecision(),
    windMps: doublePrecision(),
    people: integer(),
    note: text(),
    ...sentDigest(),
    ...audit(),
  },
  (t) => [index().on(t.spanId)],
);

/** A rigger's computation, kept as it was. */
export const loadChecks = pgTable(
  "load_checks",
  {
    id: uuid().primaryKey(),
    areaId: uuid()
      .notNull()
      .references(() => areas.id),
    spanId: uuid().references(() => spans.id),
    anchorId: uuid().references(() => anchors.id),
    inputs: jsonb().$type<Record<string, unknown>>().notNull(),
    outputs: jsonb().$type<Record<string, unknown>>().notNull(),
    engineVersion: text().notNull(),
    policyVersion: integer().notNull(),
    forDate: date({ mode: "string" }).notNull(),
    checklist: jsonb().$type<Record<string, unknown>>(),
    /** SHA-256 of the share secret; null: not shared. */
    shareHash: text().unique(),
    ...sentDigest(),
    ...audit(),
  },
  (t) => [index().on(t.spanId)],
);
