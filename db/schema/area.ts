import {
  boolean,
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
import { point, shape } from "@/db/columns/point";
import type { LoadPolicy } from "@/lib/domain/policy";
import type { AreaVisibility, Coast, SiteVisibility, So2Band, Washing } from "@/lib/domain/vocabulary";

/** What a rescuer needs, each a sentence; null: nobody has written it down yet. */
export interface EmergencyBlock {
  number: string | null;
  stretcherAccess: string | null;
  signal: string | null;
  meetingPoint: string | null;
}

/** The ground one anchor group looks after. */
export const areas = pgTable("areas", {
  id: uuid().primaryKey(),
  slug: text().notNull().unique(),
  name: text().notNull(),
  summary: text().notNull().default(""),
  visibility: text().$type<AreaVisibility>().notNull().default("public"),
  /** Polygon the area covers; null: not drawn yet. */
  boundary: shape(),
  coast: text().$type<Coast>().notNull().default("other"),
  /** SO2 band where a site has none of its own; null: taken as low and said so. */
  so2: text().$type<So2Band>(),
  timeZone: text().notNull().default("UTC"),
  contactEmail: text(),
  emergency: jsonb().$type<EmergencyBlock>(),
  ...audit(),
});

/** Versions of an area's load policy; the highest `versionNo` is in force, none means the built-in default. */
export const areaPolicies = pgTable(
  "area_policies",
  {
    id: uuid().primaryKey(),
    areaId: uuid()
      .notNull()
      .references(() => areas.id),
    versionNo: integer().notNull(),
    policy: jsonb().$type<LoadPolicy>().notNull(),
    note: text().notNull().default(""),
    createdAt: instant().notNull().defaultNow(),
    createdBy: uuid(),
  },
  (t) => [unique().on(t.areaId, t.versionNo)],
);

/** A cliff, cleft, quarry or stack. */
export const sites = pgTable(
  "sites",
  {
    id: uuid().primaryKey(),
    areaId: uuid()
      .notNull()
      .references(() => areas.id),
    slug: text().notNull(),
    name: text().notNull(),
    visibility: text().$type<SiteVisibility>().notNull().default("public"),
    point: point().notNull(),
    summary: text().notNull().default(""),
    rockType: text(),
    /** Uniaxial compressive strength; the lower end of the ISRM grade when judged by hammer. */
    ucsMpa: doublePrecision(),
    /** How the strength was judged: "ISRM R4 by hammer", "point load test". */
    ucsBasis: text(),
    washing: text().$type<Washing>(),
    so2: text().$type<So2Band>(),
    saltedRoadDistanceM: doublePrecision(),
    /** Warm, dry or sun-baked so that salt concentrates. */
    warmDry: boolean().notNull().default(false),
    approach: text(),
    landPermission: text(),
    noBoltZones: text(),
    ...strike(),
    ...audit(),
  },
  (t) => [unique().on(t.areaId, t.slug), index().using("gist", t.point)],
);

/** An access stop: for an area, one of its sites or one anchor. */
export const closures = pgTable(
  "closures",
  {
    id: uuid().primaryKey(),
    areaId: uuid()
      .notNull()
      .references(() => areas.id),
    siteId: uuid().references(() => sites.id),
    anchorId: uuid(),
    reason: text().notNull(),
    /** First and last closed day. For a yearly season only month and day count. `endsOn` null: until lifted. */
    startsOn: date({ mode: "string" }).notNull(),
    endsOn: date({ mode: "string" }),
    yearly: boolean().notNull().default(false),
    /** Who ordered it: land owner, authority, the group. */
    source: text(),
    liftedAt: instant(),
    ...sentDigest(),
    ...audit(),
  },
  (t) => [index().on(t.areaId)],
);

/** Shoreline used for distances to the sea, one row a line, with its own doubt. */
export const coastline = pgTable(
  "coastline",
  {
    id: integer().primaryKey().generatedAlwaysAsIdentity(),
    /** "Isle of Tarrow" and the like; shown beside every distance computed from it. */
    source: text().notNull(),
    /** How far the line may lie from the real shore. */
    errorM: doublePrecision().notNull(),
    /** Distances beyond this are not known from this coast: it does not cover other land. */
    coversM: doublePrecision().notNull(),
    geom: shape().notNull(),
  },
  (t) => [index().using("gist", t.geom)],
);
