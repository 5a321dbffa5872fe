import { DEFAULT_POLICY } from "@/lib/domain/policy";
import type { Finding } from "@/lib/domain/finding/types";
import type { RuleCode, Use } from "@/lib/domain/vocabulary";
import { boltFindings } from "@/lib/domain/finding/bolt-findings";
import type {
  AnchorEvidence,
  BoltEvidence,
  BoltFacts,
  CareFacts,
  GroupFacts,
  OpenReportFacts,
  PlaceFacts,
  PlacementFacts,
} from "@/lib/domain/finding/evidence";

/**
 * Evidence for tests: an ordinary bolt with every fact on record, against which each test changes what it
 * is about.
 */

export const TODAY = "2026-06-01";

export const ORDINARY_BOLT: BoltFacts = {
  form: "expansion_stud_hanger",
  metal: "1.4401",
  hangerMetal: "1.4401",
  linkMetal: null,
  rodCount: null,
  rodDiameterMm: null,
  leverMm: null,
  shankDiameterMm: 10,
  ratedRadialKn: 25,
  ratedAxialKn: 15,
  bendOnsetKn: 20,
  bendOnsetHighKn: 20,
  bendOnsetAxialKn: null,
  bendOnsetBasis: "tested",
  method: "mechanical",
  embedmentMm: 65,
  holeDiameterMm: 10,
  eyeRadiusMm: null,
  coatingThicknessUm: null,
  installedOn: "2026-01-01",
  installedOnPrecision: "day",
  standard: "EN 959:2018",
  batch: "B1",
  adhesiveId: null,
  adhesiveBatch: null,
  bondMpa: null,
  adhesiveExpiresOn: null,
  usableFrom: null,
  recheckDueOn: null,
  magnetic: null,
  rustGrade: null,
};

export const BENT_ROD: BoltFacts = {
  ...ORDINARY_BOLT,
  form: "glued_bent_rod",
  hangerMetal: null,
  rodCount: 2,
  rodDiameterMm: 8,
  leverMm: 20,
  shankDiameterMm: null,
  bendOnsetKn: null,
  bendOnsetHighKn: null,
  bendOnsetBasis: "unknown",
  method: "epoxy",
  embedmentMm: 100,
  holeDiameterMm: 16,
};

/** Inland and washed: no rule about metal speaks against stainless of class III. */
export const MILD_PLACE: PlaceFacts = {
  seaDistanceM: 50_000,
  seaDistanceErrorM: 0,
  coast: "other",
  washing: "rain",
  so2: "low",
  saltedRoadDistanceM: null,
  warmDry: false,
};

export const NO_CARE: CareFacts = {
  openReports: [],
  warnings: [],
  lastCheckOn: "2026-01-01",
  fracturedMetals: [],
  closures: [],
};

export function placement(over: Partial<PlacementFacts> = {}): PlacementFacts {
  return {
    placementId: "p1",
    number: 1,
    kind: "bolt",
    role: "main",
    xMm: null,
    yMm: null,
    zMm: null,
    edgeDistanceMm: null,
    edgeSide: null,
    overhang: null,
    deadHoleDistancesMm: [],
    rockBodyId: null,
    ...over,
  };
}

export function group(over: Partial<GroupFacts> = {}): GroupFacts {
  return { mainCount: 1, backupCount: 0, hasGeometry: false, rockBodies: [], placements: [], ...over };
}

export function report(over: Partial<OpenReportFacts> = {}): OpenReportFacts {
  return {
    reportId: "r1",
    kind: "routine_check",
    depth: "handled",
    observedAt: "2026-05-01T10:00:00.000Z",
    grade: null,
    bendAngleDeg: null,
    crackMoves: null,
    crackNew: null,
    soundsHollow: null,
    metalCracked: null,
    confirmed: true,
    ...over,
  };
}

type Over = Partial<Omit<BoltEvidence, "bolt" | "place">> & {
  bolt?: Partial<BoltFacts>;
  place?: Partial<PlaceFacts>;
};

/** A bolt in the rock under a use, nothing against it, with what the test changes. */
export function inRock(use: Use, { bolt, place, ...over }: Over = {}): BoltEvidence {
  const agreed = DEFAULT_POLICY.demand[use];
  return {
    context: "in_rock",
    use,
    bolt: { ...ORDINARY_BOLT, ...bolt },
    place: { ...MILD_PLACE, ...place },
    rock: { ucsMpa: 120 },
    demand: {
      workingKn: agreed.workingKn,
      peakKn: agreed.peakKn,
      angleFromAxisDeg: 90,
      origin: "area policy, version 1",
    },
    onDate: TODAY,
    placement: placement(),
    group: group(),
    care: NO_CARE,
    textileThroughEye: null,
    ...over,
  };
}

/** The same as a type that is being chosen. */
export function choosing(use: Use, over: Over = {}): BoltEvidence {
  return { ...inRock(use, over), context: "choosing", placement: null, group: null, care: null };
}

export function findingsOf(e: BoltEvidence): readonly Finding[] {
  return boltFindings(e, DEFAULT_POLICY);
}

/** The finding of one rule, or null when it says nothing. */
export function found(e: BoltEvidence, code: RuleCode): Finding | null {
  return findingsOf(e).find((one) => one.code === code) ?? null;
}

export function levelOf(e: BoltEvidence, code: RuleCode): string | null {
  return found(e, code)?.level ?? null;
}

export function anchor(over: Partial<AnchorEvidence> = {}): AnchorEvidence {
  return {
    anchorId: "a1",
    uses: ["highline"],
    onDate: TODAY,
    place: MILD_PLACE,
    rock: { ucsMpa: 120 },
    group: group({
      mainCount: 3,
      placements: [placement(), placement({ number: 2 }), placement({ number: 3 })],
    }),
    fittings: [],
    care: NO_CARE,
    bolts: [
      { boltId: "b1", placementNumber: 1, evidence: inRock("highline", { group: group({ mainCount: 3 }) }) },
    ],
    ...over,
  };
}
