import { boolean, date, doublePrecision, index, integer, pgTable, text, uuid } from "drizzle-orm/pg-core";
import { audit, instant, sentDigest, strike } from "@/db/columns/audit";
import { placements } from "@/db/schema/anchor";
import { adhesives, boltTypes } from "@/db/schema/catalogue";
import type { Condition, DatePrecision, Form, HoleCleaning, Method } from "@/lib/domain/vocabulary";

/**
 * One piece of hardware in one hole. The bolt in force in a placement is the one that is neither removed nor
 * struck; `replacesBoltId` points to its predecessor, so the chain is the history of the hole.
 */
export const bolts = pgTable(
  "bolts",
  {
    id: uuid().primaryKey(),
    placementId: uuid()
      .notNull()
      .references(() => placements.id),
    /** Null: the type is not in the catalogue or not known; then `form` says what can be seen. */
    boltTypeId: uuid().references(() => boltTypes.id),
    /** What the hardware looks like; a known type's form. */
    form: text().$type<Form>().notNull(),
    /** Metals where they differ from the type's, or where the type is not known. */
    boltMetal: text(),
    hangerMetal: text(),
    linkMetal: text(),
    /** Lever as placed where it differs from the type's (an eye not set flush). */
    leverMm: doublePrecision(),
    batch: text(),
    installedOn: date({ mode: "string" }),
    installedOnPrecision: text().$type<DatePrecision>().notNull().default("day"),
    /** Name as remembered; the account, when there is one, is `installedByUserId`. */
    installedBy: text(),
    installedByUserId: uuid(),
    method: text().$type<Method>(),
    adhesiveId: uuid().references(() => adhesives.id),
    adhesiveBatch: text(),
    adhesiveExpiresOn: date({ mode: "string" }),
    glueTempC: doublePrecision(),
    rockTempC: doublePrecision(),
    holeCleaning: text().$type<HoleCleaning>(),
    torqueNm: doublePrecision(),
    recheckDueOn: date({ mode: "string" }),
    /** h_ef for studs, engaged thread for screws, straight rod for glued. */
    embedmentMm: doublePrecision(),
    /** Glue cures until then: out of use. Null: usable from the install. */
    usableFrom: instant(),
    witnessMark: boolean(),
    /** Does a magnet stick? Null: nobody tried. */
    magnetic: boolean(),
    /** 0 none to 4 section lost, as last seen. */
    rustGrade: integer(),
    claimedStandard: text(),
    note: text(),
    removedOn: date({ mode: "string" }),
    removedBy: text(),
    removedWhy: text(),
    replacesBoltId: uuid(),
    condition: text().$type<Condition>().notNull().default("in_service"),
    derivedCondition: text().$type<Condition>().notNull().default("in_service"),
    decidedCondition: text().$type<Condition>(),
    decidedReason: text(),
    decidedBy: uuid(),
    decidedAt: instant(),
    outOfUseSince: instant(),
    ...strike(),
    ...sentDigest(),
    ...audit(),
  },
  (t) => [index().on(t.placementId), index().on(t.boltTypeId), index().on(t.adhesiveId)],
);

/** A measured pull on one bolt. */
export const pullTests = pgTable(
  "pull_tests",
  {
    id: uuid().primaryKey(),
    boltId: uuid()
      .notNull()
      .references(() => bolts.id),
    direction: text().$type<"axial" | "radial">().notNull(),
    loadKn: doublePrecision().notNull(),
    holdS: doublePrecision(),
    movementMm: doublePrecision(),
    /** held | moved | bent | broke | pulled_out */
    mode: text().$type<"held" | "moved" | "bent" | "broke" | "pulled_out">().notNull(),
    testedOn: date({ mode: "string" }).notNull(),
    testedBy: text(),
    note: text(),
    ...sentDigest(),
    ...audit(),
  },
  (t) => [index().on(t.boltId)],
);
