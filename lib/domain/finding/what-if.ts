import type { PlaceClass } from "@/lib/engineering";
import type { LoadPolicy } from "@/lib/domain/policy";
import type { Use, Verdict } from "@/lib/domain/vocabulary";
import { CAUTION } from "@/lib/domain/finding/engine";
import { evaluateBolt } from "@/lib/domain/finding/evaluate-bolt";
import type { BoltEvidence, BoltFacts, Demand, PlaceFacts } from "@/lib/domain/finding/evidence";
import type { Finding } from "@/lib/domain/finding/types";

/** What a what-if takes of a bolt; everything but the form may be missing or null. */
export type WhatIfBolt = Pick<BoltFacts, "form"> & {
  [K in Exclude<keyof BoltFacts, "form">]?: BoltFacts[K] | null;
};

/** A question about a bolt that is not stored. What is missing or null is not known. */
export interface WhatIfInput {
  use: Use;
  bolt: WhatIfBolt;
  place?: { [K in keyof PlaceFacts]?: PlaceFacts[K] | null } | null;
  rock?: { ucsMpa?: number | null } | null;
  demand?: { [K in "workingKn" | "peakKn" | "angleFromAxisDeg"]?: number | null } | null;
  textileThroughEye?: boolean | null;
  /** The date the question is asked for. */
  onDate: string;
}

export interface WhatIfAnswer {
  verdict: Verdict;
  engine: string;
  placeClass: PlaceClass | null;
  findings: readonly Finding[];
  caution: string;
}

/** Judges a bolt in the strict context: one bolt carries all, and failing that is a stop. */
export function whatIf(input: WhatIfInput, policy: LoadPolicy): WhatIfAnswer {
  const { verdict, engine, placeClass, findings } = evaluateBolt(evidenceOf(input, policy), policy);
  return { verdict, engine, placeClass, findings, caution: CAUTION };
}

/** The evidence behind a what-if, for callers who want more than the answer. */
export function evidenceOf(input: WhatIfInput, policy: LoadPolicy): BoltEvidence {
  const { place } = input;
  return {
    context: "choosing",
    use: input.use,
    bolt: boltOf(input.bolt),
    place: {
      seaDistanceM: place?.seaDistanceM ?? null,
      seaDistanceErrorM: place?.seaDistanceErrorM ?? 0,
      coast: place?.coast ?? "other",
      washing: place?.washing ?? null,
      so2: place?.so2 ?? null,
      saltedRoadDistanceM: place?.saltedRoadDistanceM ?? null,
      warmDry: place?.warmDry ?? false,
    },
    rock: { ucsMpa: input.rock?.ucsMpa ?? null },
    demand: demandOf(input, policy),
    onDate: input.onDate,
    placement: null,
    group: null,
    care: null,
    textileThroughEye: input.textileThroughEye ?? null,
  };
}

/** Missing and null both mean "not known". */
function boltOf(bolt: WhatIfBolt): BoltFacts {
  return {
    form: bolt.form,
    metal: bolt.metal ?? null,
    hangerMetal: bolt.hangerMetal ?? null,
    linkMetal: bolt.linkMetal ?? null,
    rodCount: bolt.rodCount ?? null,
    rodDiameterMm: bolt.rodDiameterMm ?? null,
    leverMm: bolt.leverMm ?? null,
    shankDiameterMm: bolt.shankDiameterMm ?? null,
    ratedRadialKn: bolt.ratedRadialKn ?? null,
    ratedAxialKn: bolt.ratedAxialKn ?? null,
    bendOnsetKn: bolt.bendOnsetKn ?? null,
    bendOnsetHighKn: bolt.bendOnsetHighKn ?? null,
    bendOnsetAxialKn: bolt.bendOnsetAxialKn ?? null,
    method: bolt.method ?? null,
    embedmentMm: bolt.embedmentMm ?? null,
    holeDiameterMm: bolt.holeDiameterMm ?? null,
    eyeRadiusMm: bolt.eyeRadiusMm ?? null,
    coatingThicknessUm: bolt.coatingThicknessUm ?? null,
    installedOn: bolt.installedOn ?? null,
    standard: bolt.standard ?? null,
    batch: bolt.batch ?? null,
    adhesiveId: bolt.adhesiveId ?? null,
    adhesiveBatch: bolt.adhesiveBatch ?? null,
    bondMpa: bolt.bondMpa ?? null,
    adhesiveExpiresOn: bolt.adhesiveExpiresOn ?? null,
    usableFrom: bolt.usableFrom ?? null,
    recheckDueOn: bolt.recheckDueOn ?? null,
    magnetic: bolt.magnetic ?? null,
    rustGrade: bolt.rustGrade ?? null,
    bendOnsetBasis: bolt.bendOnsetBasis ?? "unknown",
    installedOnPrecision: bolt.installedOnPrecision ?? "day",
  };
}

function demandOf({ demand, use }: WhatIfInput, policy: LoadPolicy): Demand {
  const agreed = policy.demand[use];
  const typed = typeof demand?.workingKn === "number" || typeof demand?.peakKn === "number";
  return {
    workingKn: demand?.workingKn ?? agreed.workingKn,
    peakKn: demand?.peakKn ?? agreed.peakKn,
    angleFromAxisDeg: demand?.angleFromAxisDeg ?? 90,
    origin: typed ? "typed" : `area policy, version ${policy.version}`,
  };
}
