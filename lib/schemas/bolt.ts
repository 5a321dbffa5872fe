import { z } from "zod";
import { newPlacement } from "@/lib/schemas/anchor";
import {
  day,
  forceKn,
  id,
  instant,
  metal,
  note,
  number,
  oneOf,
  tempC,
  text,
  whole,
  yesNo,
} from "@/lib/schemas/fields";
import { DATE_PRECISIONS, FORMS, HOLE_CLEANINGS, METHODS } from "@/lib/domain/vocabulary";

const boltFacts = {
  boltTypeId: id.nullable().optional(),
  boltMetal: metal.nullable().optional(),
  hangerMetal: metal.nullable().optional(),
  linkMetal: metal.nullable().optional(),
  leverMm: number(0, 500).nullable().optional(),
  batch: text(80).nullable().optional(),
  installedOnPrecision: oneOf(DATE_PRECISIONS).optional(),
  installedBy: text(120).nullable().optional(),
  method: oneOf(METHODS).nullable().optional(),
  adhesiveId: id.nullable().optional(),
  adhesiveBatch: text(80).nullable().optional(),
  adhesiveExpiresOn: day.nullable().optional(),
  glueTempC: tempC.nullable().optional(),
  rockTempC: tempC.nullable().optional(),
  holeCleaning: oneOf(HOLE_CLEANINGS).nullable().optional(),
  torqueNm: number(0, 1000).nullable().optional(),
  recheckDueOn: day.nullable().optional(),
  embedmentMm: number(0, 1000).nullable().optional(),
  witnessMark: yesNo.nullable().optional(),
  magnetic: yesNo.nullable().optional(),
  rustGrade: whole(0, 4).nullable().optional(),
  claimedStandard: text(80).nullable().optional(),
  note: note().nullable().optional(),
};

const installFacts = {
  id,
  /** The hole it goes into; left out when `newPlacement` makes one. */
  placementId: id.optional(),
  newPlacement: newPlacement.optional(),
  /** Needed when the type is not in the catalogue. */
  form: oneOf(FORMS).optional(),
  ...boltFacts,
  /** Null or missing: not known, for bolts found in the rock. */
  installedOn: day.nullable().optional(),
  /** When it was set, for glue: the cure time counts from here. Missing: now. */
  installedAt: instant.optional(),
  /** Why the former bolt came out, when there was one. */
  removedWhy: text(500).optional(),
};

export const logInstallInput = z
  .strictObject({ anchorId: id, ...installFacts })
  .refine((value) => (value.placementId === undefined) !== (value.newPlacement === undefined), {
    path: ["placementId"],
    message: "Name the placement, or describe a new one.",
  })
  .meta({ id: "Install" });
export type LogInstallInput = z.output<typeof logInstallInput>;

/** Several bolts of one row at once: all are stored, or none. */
export const logInstallSeriesInput = z.strictObject({
  anchorId: id,
  bolts: z
    .array(z.strictObject(installFacts))
    .min(1, "At least one bolt.")
    .max(60, "At most 60 bolts at a time."),
});
export type LogInstallSeriesInput = z.output<typeof logInstallSeriesInput>;
export type InstallFacts = LogInstallSeriesInput["bolts"][number];

export const boltChange = z
  .strictObject({ form: oneOf(FORMS), installedOn: day.nullable(), ...boltFacts })
  .partial()
  .meta({ id: "BoltChange" });
export type BoltChange = z.output<typeof boltChange>;

export const boltPatch = boltChange
  .refine((value) => Object.keys(value).length > 0, "Nothing to change was sent.")
  .meta({ id: "BoltPatch" });

export const pullTestInput = z
  .strictObject({
    id,
    boltId: id,
    direction: oneOf(["axial", "radial"]),
    loadKn: forceKn,
    holdS: number(0, 100_000).nullable().optional(),
    movementMm: number(0, 1000).nullable().optional(),
    mode: oneOf(["held", "moved", "bent", "broke", "pulled_out"]),
    testedOn: day,
    testedBy: text(120).nullable().optional(),
    note: note().nullable().optional(),
  })
  .meta({ id: "PullTest" });
export type PullTestInput = z.output<typeof pullTestInput>;

export const strikeInput = z.strictObject({
  subject: oneOf(["anchor", "placement", "bolt", "span", "report"]),
  id,
  reason: text(500, 3),
});
export type StrikeInput = z.output<typeof strikeInput>;
