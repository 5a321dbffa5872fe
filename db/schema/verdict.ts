import { date, doublePrecision, index, integer, jsonb, pgTable, text, uuid } from "drizzle-orm/pg-core";
import { audit, instant, sentDigest } from "@/db/columns/audit";
import { anchors } from "@/db/schema/anchor";
import { areas } from "@/db/schema/area";
import { bolts } from "@/db/schema/bolt";
import { adhesives, boltTypes } from "@/db/schema/catalogue";
import type { Level, RuleCode, SourceMark, Use, Verdict } from "@/lib/domain/vocabulary";

/** The verdict on one bolt: its worst over the anchor's uses. Narrow on purpose: rewritten often. */
export const boltEval = pgTable(
  "bolt_eval",
  {
    boltId: uuid()
      .primaryKey()
      .references(() => bolts.id),
    anchorId: uuid()
      .notNull()
      .references(() => anchors.id),
    verdict: text().$type<Verdict>().notNull(),
    /** Greatest load over limit found by the load rules; null: none could be computed. */
    utilisation: doublePrecision(),
    engineVersion: text().notNull(),
    policyVersion: integer().notNull(),
    evaluatedAt: instant().notNull(),
  },
  (t) => [index().on(t.anchorId)],
);

export const anchorEval = pgTable(
  "anchor_eval",
  {
    anchorId: uuid()
      .primaryKey()
      .references(() => anchors.id),
    verdict: text().$type<Verdict>().notNull(),
    utilisation: doublePrecision(),
    findingCount: integer().notNull(),
    /** Codes present, for filters. */
    codes: text().array().$type<RuleCode[]>().notNull(),
    /** The one fact that would help most when the verdict is not_enough_known. */
    helpMost: text(),
    /** What the place asks of a metal; null: not known. */
    placeClass: jsonb().$type<{ f1: number; f2: number; f3: number; crf: number; crc: string }>(),
    engineVersion: text().notNull(),
    policyVersion: integer().notNull(),
    evaluatedAt: instant().notNull(),
  },
  (t) => [index().on(t.verdict), index().on(t.utilisation.desc(), t.anchorId)],
);

/** Every reason of every current verdict; replaced as a whole when the anchor is re-evaluated. */
export const findings = pgTable(
  "findings",
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    anchorId: uuid()
      .notNull()
      .references(() => anchors.id),
    /** Null: about the anchor as a whole. */
    boltId: uuid().references(() => bolts.id),
    placementNumber: integer(),
    fittingId: uuid(),
    /** The uses of the anchor under which it arises. */
    uses: text().array().$type<Use[]>().notNull(),
    code: text().$type<RuleCode>().notNull(),
    level: text().$type<Level>().notNull(),
    title: text().notNull(),
    text: text().notNull(),
    clearsWhen: text(),
    numbers: jsonb().$type<Record<string, number | string | boolean | null>>().notNull(),
    assumed: jsonb().$type<string[]>().notNull(),
    sourceMark: text().$type<SourceMark>().notNull(),
    sourceName: text().notNull(),
  },
  (t) => [index().on(t.anchorId), index().on(t.boltId), index().on(t.code)],
);

/** Hardware or glue found faulty by its maker or by the group. Null conditions match everything. */
export const batchWarnings = pgTable("batch_warnings", {
  id: uuid().primaryKey(),
  /** Null: holds in every area of the installation. */
  areaId: uuid().references(() => areas.id),
  title: text().notNull(),
  body: text().notNull(),
  says: text().$type<"stop" | "inspect">().notNull(),
  boltTypeId: uuid().references(() => boltTypes.id),
  adhesiveId: uuid().references(() => adhesives.id),
  metal: text(),
  /** Matched against the hardware batch, or the adhesive batch when an adhesive is named. `*` stands for anything. */
  batchPattern: text(),
  installedFrom: date({ mode: "string" }),
  installedTo: date({ mode: "string" }),
  source: text(),
  publishedAt: instant(),
  closedAt: instant(),
  ...sentDigest(),
  ...audit(),
});
