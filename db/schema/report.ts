import { boolean, doublePrecision, index, integer, jsonb, pgTable, text, uuid } from "drizzle-orm/pg-core";
import { audit, instant, sentDigest } from "@/db/columns/audit";
import { point } from "@/db/columns/point";
import { anchors, fittings, placements } from "@/db/schema/anchor";
import { areas, sites } from "@/db/schema/area";
import { bolts } from "@/db/schema/bolt";
import { spans } from "@/db/schema/span";
import type { Depth, ReportKind, ReportState } from "@/lib/domain/vocabulary";

/** What somebody saw. Never deleted; answered by `handled*`. */
export const reports = pgTable(
  "reports",
  {
    id: uuid().primaryKey(),
    areaId: uuid().references(() => areas.id),
    siteId: uuid().references(() => sites.id),
    anchorId: uuid().references(() => anchors.id),
    placementId: uuid().references(() => placements.id),
    /** The bolt that was in the placement when it was seen. */
    boltId: uuid().references(() => bolts.id),
    fittingId: uuid().references(() => fittings.id),
    spanId: uuid().references(() => spans.id),
    /** Where, when nothing is registered there yet. */
    point: point(),
    kind: text().$type<ReportKind>().notNull(),
    depth: text().$type<Depth>().notNull().default("seen"),
    observedAt: instant().notNull(),
    receivedAt: instant().notNull().defaultNow(),
    /** The measurements of this kind, unit in the key: `bendAngleDeg`, `playMm`, `crackLengthMm`… */
    measured: jsonb().$type<Record<string, number | string | boolean | null>>().notNull().default({}),
    /** Worst component grade 0-4; null: not graded. */
    grade: integer(),
    /** A check that found nothing: evidence for putting back in service. */
    foundSound: boolean().notNull().default(false),
    note: text().notNull().default(""),
    /** Ring scan without an account: not confirmed until a member says so. */
    confirmed: boolean().notNull().default(true),
    /** This report took its bolt and anchor out of use when it was filed. */
    tookOutOfUse: boolean().notNull().default(false),
    state: text().$type<ReportState>().notNull().default("open"),
    handledAt: instant(),
    handledBy: uuid(),
    handledHow: text(),
    reporterName: text(),
    ...sentDigest(),
    ...audit(),
  },
  (t) => [index().on(t.anchorId), index().on(t.boltId), index().on(t.state), index().using("gist", t.point)],
);

/** A picture. The original stays private; public copies carry no metadata. */
export const photos = pgTable(
  "photos",
  {
    id: uuid().primaryKey(),
    reportId: uuid().references(() => reports.id),
    boltId: uuid().references(() => bolts.id),
    jobId: uuid(),
    anchorId: uuid().references(() => anchors.id),
    /** Of the original as received. */
    sha256: text().notNull(),
    originalKey: text().notNull(),
    largeKey: text().notNull(),
    thumbKey: text().notNull(),
    widthPx: integer().notNull(),
    heightPx: integer().notNull(),
    /** mm per pixel, when a known length was marked. */
    scaleMmPerPx: doublePrecision(),
    marks: jsonb().$type<Record<string, unknown>>(),
    caption: text().notNull().default(""),
    ...audit(),
  },
  (t) => [index().on(t.reportId), index().on(t.anchorId), index().on(t.boltId)],
);
