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
import { point } from "@/db/columns/point";
import { sites } from "@/db/schema/area";
import type {
  Attachment,
  Condition,
  FittingKind,
  PlacementKind,
  PlacementRole,
  RiggingKind,
  Sharpness,
  Side,
  Use,
  Washing,
} from "@/lib/domain/vocabulary";

/** How the anchor is usually rigged. Lengths per main placement in order of number; null: not recorded. */
export interface RiggingDefault {
  kind: RiggingKind;
  legLengthsM: (number | null)[];
  backupSlackM: number | null;
  note: string | null;
}

/**
 * Condition is kept twice: what the evidence says (`derivedCondition`) and what a steward decided
 * (`decidedCondition` with who, when and why). `condition` is the one in force and what maps and lists show.
 */
const conditionColumns = () => ({
  condition: text().$type<Condition>().notNull().default("in_service"),
  derivedCondition: text().$type<Condition>().notNull().default("in_service"),
  decidedCondition: text().$type<Condition>(),
  decidedReason: text(),
  decidedBy: uuid(),
  decidedAt: instant(),
  /** When the event happened that took it out of use; hand checks must be later than this. Null: not out. */
  outOfUseSince: instant(),
});

/** One anchor: the thing a person ties into, with all its placements. Its page is the anchor sheet. */
export const anchors = pgTable(
  "anchors",
  {
    id: uuid().primaryKey(),
    siteId: uuid()
      .notNull()
      .references(() => sites.id),
    label: text().notNull(),
    /** Short code for tags and speech, unique in the installation. */
    code: text().notNull().unique(),
    uses: text().array().$type<Use[]>().notNull(),
    point: point().notNull(),
    /** How well the point is known; null: not known. */
    pointErrorM: doublePrecision(),
    elevationM: doublePrecision(),
    /** Direction the load is expected to pull: azimuth clockwise from true north, elevation up positive. */
    designAzimuthDeg: doublePrecision(),
    designElevationDeg: doublePrecision(),
    /** The face most placements sit in: azimuth its outward normal points to, dip from horizontal (90 = vertical). */
    faceAzimuthDeg: doublePrecision(),
    faceDipDeg: doublePrecision(),
    rigging: jsonb().$type<RiggingDefault>(),
    /** Masterpoint in the face frame of placement 1, mm; null: not measured. */
    masterpointXMm: doublePrecision(),
    masterpointYMm: doublePrecision(),
    masterpointZMm: doublePrecision(),
    /** Rain washing at the anchor itself where it differs from the site. */
    washing: text().$type<Washing>(),
    seaDistanceM: doublePrecision(),
    /** `coast`: computed from the coastline table; `measured`: by hand; null: not known. */
    seaDistanceSource: text().$type<"coast" | "measured">(),
    seaDistanceErrorM: doublePrecision(),
    seaDistanceNote: text(),
    /** A line of protection bolts kept on one sheet: its name and climbed length. Null: not a row. */
    rowName: text(),
    rowLengthM: doublePrecision(),
    note: text(),
    ...conditionColumns(),
    ...strike(),
    ...sentDigest(),
    ...audit(),
  },
  (t) => [index().using("gist", t.point), index().on(t.siteId), index().on(t.condition)],
);

/** A block, flake or face that placements sit in together. */
export const rockBodies = pgTable(
  "rock_bodies",
  {
    id: uuid().primaryKey(),
    anchorId: uuid()
      .notNull()
      .references(() => anchors.id),
    label: text().notNull(),
    attachment: text().$type<Attachment>().notNull().default("unknown"),
    lengthM: doublePrecision(),
    widthM: doublePrecision(),
    heightM: doublePrecision(),
    note: text(),
    ...audit(),
  },
  (t) => [index().on(t.anchorId)],
);

/** One place where load can enter the rock: a hole for a bolt, or a tree, boulder, thread, removable gear. */
export const placements = pgTable(
  "placements",
  {
    id: uuid().primaryKey(),
    anchorId: uuid()
      .notNull()
      .references(() => anchors.id),
    number: integer().notNull(),
    kind: text().$type<PlacementKind>().notNull().default("bolt"),
    role: text().$type<PlacementRole>().notNull().default("main"),
    /** mm from placement 1: x right along the face, y up it, z out of the rock. Null: not measured. */
    xMm: doublePrecision(),
    yMm: doublePrecision(),
    zMm: doublePrecision(),
    /** Own face where it differs from the anchor's. */
    faceAzimuthDeg: doublePrecision(),
    faceDipDeg: doublePrecision(),
    overhang: boolean(),
    holeDiameterMm: doublePrecision(),
    holeDepthMm: doublePrecision(),
    /** Bolt axis out of the rock where it is not square to the face. */
    axisAzimuthDeg: doublePrecision(),
    axisElevationDeg: doublePrecision(),
    edgeDistanceMm: doublePrecision(),
    edgeSide: text().$type<Side>(),
    /** Abandoned holes near it, in the same frame as the placement itself. */
    deadHoles: jsonb().$type<{ xMm: number; yMm: number }[]>().notNull().default([]),
    rockBodyId: uuid().references(() => rockBodies.id),
    /** Size of a natural placement: trunk diameter, boulder's greatest edge, thread's neck. */
    sizeMm: doublePrecision(),
    note: text(),
    ...strike(),
    ...sentDigest(),
    ...audit(),
  },
  (t) => [unique().on(t.anchorId, t.number)],
);

/** Rock edges that textile may touch between anchor and load. */
export const edges = pgTable(
  "edges",
  {
    id: uuid().primaryKey(),
    anchorId: uuid()
      .notNull()
      .references(() => anchors.id),
    label: text().notNull(),
    sharpness: text().$type<Sharpness>().notNull(),
    paddingNeeded: boolean().notNull().default(true),
    /** How the padding is kept from moving. */
    secured: text(),
    /** Ends of the edge in the face frame, mm; null: not drawn. */
    x1Mm: doublePrecision(),
    y1Mm: doublePrecision(),
    x2Mm: doublePrecision(),
    y2Mm: doublePrecision(),
    ...audit(),
  },
  (t) => [index().on(t.anchorId)],
);

/** Rings, chains, links and slings that hang on the anchor and wear. */
export const fittings = pgTable(
  "fittings",
  {
    id: uuid().primaryKey(),
    anchorId: uuid()
      .notNull()
      .references(() => anchors.id),
    placementId: uuid().references(() => placements.id),
    kind: text().$type<FittingKind>().notNull(),
    metal: text(),
    diameterMm: doublePrecision(),
    /** Least diameter left where it is worn, as last measured. */
    diameterLeftMm: doublePrecision(),
    replaceable: boolean().notNull().default(true),
    installedOn: date({ mode: "string" }),
    removedAt: instant(),
    note: text(),
    ...audit(),
  },
  (t) => [index().on(t.anchorId)],
);
