import { z } from "zod";
import {
  basisView,
  conditionView,
  dateView,
  formView,
  instantView,
  methodView,
  precisionView,
  verdictView,
} from "@/lib/schemas/views/common";

const metal = z.string().nullable();
const quantity = z.number().nullable();

export const pullTestView = z.object({
  id: z.string(),
  direction: z.enum(["axial", "radial"]),
  loadKn: z.number(),
  holdS: quantity,
  movementMm: quantity,
  mode: z.enum(["held", "moved", "bent", "broke", "pulled_out"]),
  testedOn: dateView,
  note: z.string().nullable(),
});

/** One piece of hardware as recorded, its type's numbers filled in where it has none of its own. */
export const boltView = z
  .object({
    id: z.string(),
    version: z.number(),
    placementId: z.string(),
    typeId: z.string().nullable(),
    typeName: z.string().nullable(),
    form: formView,
    boltMetal: metal,
    hangerMetal: metal,
    linkMetal: metal,
    rodCount: quantity,
    rodDiameterMm: quantity,
    leverMm: quantity,
    shankDiameterMm: quantity,
    ratedRadialKn: quantity,
    ratedAxialKn: quantity,
    bendOnsetLowKn: quantity,
    bendOnsetHighKn: quantity,
    bendOnsetAxialKn: quantity,
    bendOnsetBasis: basisView,
    typeSourceNote: z.string(),
    standard: z.string().nullable(),
    batch: z.string().nullable(),
    installedOn: dateView.nullable(),
    installedOnPrecision: precisionView,
    installedBy: z.string().nullable(),
    method: methodView.nullable(),
    adhesiveName: z.string().nullable(),
    adhesiveBatch: z.string().nullable(),
    adhesiveExpiresOn: dateView.nullable(),
    glueTempC: quantity,
    rockTempC: quantity,
    holeCleaning: z.string().nullable(),
    torqueNm: quantity,
    recheckDueOn: dateView.nullable(),
    embedmentMm: quantity,
    usableFrom: instantView.nullable(),
    witnessMark: z.boolean().nullable(),
    magnetic: z.boolean().nullable(),
    rustGrade: quantity,
    note: z.string().nullable(),
    removedOn: dateView.nullable(),
    removedBy: z.string().nullable(),
    removedWhy: z.string().nullable(),
    replacesBoltId: z.string().nullable(),
    struckReason: z.string().nullable(),
    condition: conditionView,
    outOfUseSince: instantView.nullable(),
    verdict: verdictView.nullable(),
    utilisation: quantity,
    pullTests: z.array(pullTestView),
  })
  .meta({ id: "Bolt" });

export type BoltView = z.infer<typeof boltView>;
export type PullTestView = z.infer<typeof pullTestView>;
