import type { PlaceClass } from "@/lib/engineering";
import type { LoadPolicy } from "@/lib/domain/policy";
import type { Use, Verdict } from "@/lib/domain/vocabulary";
import { boltFindings } from "@/lib/domain/finding/bolt-findings";
import { CAUTION, ENGINE_VERSION } from "@/lib/domain/finding/engine";
import type { BoltEvidence, BoltFacts, Demand, PlaceFacts } from "@/lib/domain/finding/evidence";
import { placeClassOf } from "@/lib/domain/finding/place";
import type { Finding } from "@/lib/domain/finding/types";
import { verdictOf } from "@/lib/domain/finding/verdict-of";

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
  const evidence = evidenceOf(input, policy);
  const findings = boltFindings(evidence, policy);
  return {
    verdict: verdictOf(findings),
    engine: ENGINE_VERSION,
    placeClass: placeClassOf(evidence.place),
    findings,
    caution: CAUTION,
  };
}

/** The evidence behind a what-if. */
function evidenceOf(input: WhatIfInput, policy: LoadPolicy): BoltEvidence {
  const { place } = input;
  return {
    context: "choosing",
    use: input.use,
    bolt: boltOf(input.bolt),
    place: {
      seaDistanceM: size(place?.seaDistanceM),
      seaDistanceErrorM: size(place?.seaDistanceErrorM) ?? 0,
      coast: place?.coast ?? "other",
      washing: place?.washing ?? null,
      so2: place?.so2 ?? null,
      saltedRoadDistanceM: size(place?.saltedRoadDistanceM),
      warmDry: place?.warmDry ?? false,
    },
    rock: { ucsMpa: size(input.rock?.ucsMpa) },
    demand: demandOf(input, policy),
    onDate: input.onDate,
    placement: null,
    group: null,
    care: null,
    textileThroughEye: input.textileThroughEye ?? null,
  };
}

/** Beyond this no length, force or distance of this world lies; formulas stay finite below it. */
const GREATEST = 1e9;

/** A number, or null for one that is missing. */
function size(value: number | null | undefined): number | null {
  return value === null || value === undefined ? null : Math.min(value, GREATEST);
}

/** Missing and null both mean "not known". */
function boltOf(bolt: WhatIfBolt): BoltFacts {
  return {
    form: bolt.form,
    metal: bolt.metal ?? null,
    hangerMetal: bolt.hangerMetal ?? null,
    linkMetal: bolt.linkMetal ?? null,
    rodCount: size(bolt.rodCount),
    rodDiameterMm: size(bolt.rodDiameterMm),
    leverMm: size(bolt.leverMm),
    shankDiameterMm: size(bolt.shankDiameterMm),
    ratedRadialKn: size(bolt.ratedRadialKn),
    ratedAxialKn: size(bolt.ratedAxialKn),
    bendOnsetKn: size(bolt.bendOnsetKn),
    bendOnsetHighKn: size(bolt.bendOnsetHighKn),
    bendOnsetAxialKn: size(bolt.bendOnsetAxialKn),
    method: bolt.method ?? null,
    embedmentMm: size(bolt.embedmentMm),
    holeDiameterMm: size(bolt.holeDiameterMm),
    eyeRadiusMm: size(bolt.eyeRadiusMm),
    coatingThicknessUm: size(bolt.coatingThicknessUm),
    installedOn: bolt.installedOn ?? null,
    standard: bolt.standard ?? null,
    batch: bolt.batch ?? null,
    adhesiveId: bolt.adhesiveId ?? null,
    adhesiveBatch: bolt.adhesiveBatch ?? null,
    bondMpa: size(bolt.bondMpa),
    adhesiveExpiresOn: bolt.adhesiveExpiresOn ?? null,
    usableFrom: bolt.usableFrom ?? null,
    recheckDueOn: bolt.recheckDueOn ?? null,
    magnetic: bolt.magnetic ?? null,
    rustGrade: size(bolt.rustGrade),
    bendOnsetBasis: bolt.bendOnsetBasis ?? "unknown",
    installedOnPrecision: bolt.installedOnPrecision ?? "day",
  };
}

function demandOf({ demand, use }: WhatIfInput, policy: LoadPolicy): Demand {
  const agreed = policy.demand[use];
  const typed = typeof demand?.workingKn === "number" || typeof demand?.peakKn === "number";
  return {
    workingKn: size(demand?.workingKn) ?? agreed.workingKn,
    peakKn: size(demand?.peakKn) ?? agreed.peakKn,
    angleFromAxisDeg: demand?.angleFromAxisDeg ?? 90,
    origin: typed ? "typed" : `area policy, version ${policy.version}`,
  };
}
