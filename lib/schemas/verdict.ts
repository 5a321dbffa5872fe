import { z } from "zod";
import { day, forceKn, metal, number, oneOf, text, yesNo } from "@/lib/schemas/fields";
import { COASTS, FORMS, METHODS, ONSET_BASES, SO2_BANDS, USES, WASHINGS } from "@/lib/domain/vocabulary";

const mm = number(0, 10_000);

/** A what-if. All but `use` and `bolt.form` may be null or missing: what is not known is a finding. */
export const whatIfInput = z
  .object({
    use: oneOf(USES),
    bolt: z.object({
      form: oneOf(FORMS),
      metal: metal.nullish(),
      hangerMetal: metal.nullish(),
      linkMetal: metal.nullish(),
      rodCount: z.int("A whole number is wanted here.").min(1).max(10).nullish(),
      rodDiameterMm: mm.nullish(),
      leverMm: mm.nullish(),
      shankDiameterMm: mm.nullish(),
      ratedRadialKn: forceKn.nullish(),
      ratedAxialKn: forceKn.nullish(),
      bendOnsetKn: forceKn.nullish(),
      bendOnsetHighKn: forceKn.nullish(),
      bendOnsetAxialKn: forceKn.nullish(),
      bendOnsetBasis: oneOf(ONSET_BASES).nullish(),
      method: oneOf(METHODS).nullish(),
      embedmentMm: mm.nullish(),
      holeDiameterMm: mm.nullish(),
      eyeRadiusMm: mm.nullish(),
      coatingThicknessUm: number(0, 10_000).nullish(),
      installedOn: day.nullish(),
      standard: text(80, 0).nullish(),
      batch: text(80, 0).nullish(),
      magnetic: yesNo.nullish(),
      rustGrade: z.int("A whole number from 0 to 4 is wanted here.").min(0).max(4).nullish(),
    }),
    place: z
      .object({
        seaDistanceM: number(0, 20_000_000).nullish(),
        coast: oneOf(COASTS).nullish(),
        washing: oneOf(WASHINGS).nullish(),
        so2: oneOf(SO2_BANDS).nullish(),
        saltedRoadDistanceM: number(0, 20_000_000).nullish(),
        warmDry: yesNo.nullish(),
      })
      .nullish(),
    rock: z.object({ ucsMpa: number(0, 1000).nullish() }).nullish(),
    demand: z
      .object({
        workingKn: forceKn.nullish(),
        peakKn: forceKn.nullish(),
        angleFromAxisDeg: number(0, 180).nullish(),
      })
      .nullish(),
    textileThroughEye: yesNo.nullish(),
    onDate: day.nullish(),
  })
  .meta({ id: "WhatIf" });
