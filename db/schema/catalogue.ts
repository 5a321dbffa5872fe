import { boolean, doublePrecision, integer, jsonb, pgTable, text, uuid } from "drizzle-orm/pg-core";
import { audit } from "@/db/columns/audit";
import type { Form, Method, OnsetBasis, TypeStatus } from "@/lib/domain/vocabulary";

/** One kind of hardware. Each number names its source; null is "not known", never zero. */
export const boltTypes = pgTable("bolt_types", {
  id: uuid().primaryKey(),
  /** Generic: "8 mm twin-leg bent rod, 1.4401". */
  name: text().notNull().unique(),
  form: text().$type<Form>().notNull(),
  /** EN number, `ti-1`…`ti-5`, `zinc-plated` or `hot-dip-galvanised`. */
  boltMetal: text(),
  hangerMetal: text(),
  linkMetal: text(),
  /** Rods that carry side by side: 2 for a twin-leg eye. */
  rodCount: integer(),
  rodDiameterMm: doublePrecision(),
  /** Rock face to the load along the axis. */
  leverMm: doublePrecision(),
  shankDiameterMm: doublePrecision(),
  lengthMm: doublePrecision(),
  holeDiameterMm: doublePrecision(),
  /** Edge radius of the eye or hanger where textile would lie. */
  eyeRadiusMm: doublePrecision(),
  coatingThicknessUm: doublePrecision(),
  /** Breaking loads as rated; they say nothing about bending. */
  ratedRadialKn: doublePrecision(),
  ratedAxialKn: doublePrecision(),
  /** Where a permanent bend begins, across the bolt: low and high end (equal for a single number). */
  bendOnsetLowKn: doublePrecision(),
  bendOnsetHighKn: doublePrecision(),
  bendOnsetAxialKn: doublePrecision(),
  bendOnsetBasis: text().$type<OnsetBasis>().notNull().default("unknown"),
  standard: text(),
  allowedMethods: text().array().$type<Method[]>().notNull().default([]),
  status: text().$type<TypeStatus>().notNull().default("current"),
  /** Where the numbers come from, in words. */
  sourceNote: text().notNull().default(""),
  /** A fixed ring or chain belongs to it. */
  hasRing: boolean().notNull().default(false),
  ...audit(),
});

/** One row of a maker's cure table: valid from this temperature up to the next row. Never interpolated. */
export interface CureStep {
  minTempC: number;
  workMin: number;
  cureMin: number;
}

export const adhesives = pgTable("adhesives", {
  id: uuid().primaryKey(),
  name: text().notNull().unique(),
  kind: text().$type<"epoxy" | "vinylester" | "polyester">().notNull(),
  /** Bond strength in sound clean holes; null: the range of common practice is used. */
  bondMpa: doublePrecision(),
  cureSteps: jsonb().$type<CureStep[]>().notNull(),
  cartridgeMl: doublePrecision(),
  sourceNote: text().notNull().default(""),
  ...audit(),
});

/** Generic webbings for spans; stretch as points of (kN, % stretch). */
export const webbings = pgTable("webbings", {
  id: uuid().primaryKey(),
  name: text().notNull().unique(),
  massGPerM: doublePrecision().notNull(),
  widthMm: doublePrecision().notNull(),
  stretch: jsonb().$type<{ loadKn: number; stretchPercent: number }[]>().notNull(),
  strengthKn: doublePrecision(),
  sourceNote: text().notNull().default(""),
  ...audit(),
});
