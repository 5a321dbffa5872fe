import type { LoadPolicy } from "@/lib/domain/policy";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { carriesLoad } from "@/lib/domain/finding/traits";

/** One force the bolt is asked to take, before sharing. */
export interface LoadCase {
  name: string;
  kn: number;
  /** Angle from the bolt's axis out of the rock: 90 across, 0 straight out. */
  angleDeg: number;
  /** Compared with the breaking strength only. */
  strengthOnly: boolean;
  /** Goes through one bolt whatever the group. */
  alone: boolean;
}

export interface Loads {
  working: LoadCase;
  /** The peak first; further peaks of the use after it. */
  peaks: readonly LoadCase[];
  /** Bounds of what one bolt gets, as parts of the whole: equal share and one carries all. */
  friendliestShare: number;
  sharedBy: number;
  assumed: readonly string[];
}

/** Common practice: a fall held through one redirected belay bolt, and a pull straight out of the rock. */
const BELAY_REDIRECTED_KN = 20;
const BELAY_OUTWARD_KN = 5;

/**
 * The load cases of a use with the bounds of sharing, or null for a bolt that carries no load of the use.
 * Choosing a type, protection, directionals and rows: one bolt carries all. The extra cases of a belay
 * belong to the area's policy; typed loads replace the whole set.
 */
export function loadsOf(e: BoltEvidence, policy: LoadPolicy): Loads | null {
  if (!carriesLoad(e)) return null;
  const agreed = policy.demand[e.use];
  const { workingKn, peakKn, angleFromAxisDeg: angleDeg } = e.demand;
  const working = { name: "working case", kn: workingKn, angleDeg, strengthOnly: false, alone: false };
  const peaks: LoadCase[] = [
    { name: "peak case", kn: peakKn, angleDeg, strengthOnly: agreed.peakStrengthOnly, alone: false },
  ];
  if (e.use === "belay" && workingKn === agreed.workingKn && peakKn === agreed.peakKn) {
    peaks.push(
      { name: "redirected fall", kn: BELAY_REDIRECTED_KN, angleDeg, strengthOnly: true, alone: true },
      { name: "pull straight out", kn: BELAY_OUTWARD_KN, angleDeg: 0, strengthOnly: false, alone: false },
    );
  }
  const sharedBy = sharers(e);
  return {
    working,
    peaks,
    friendliestShare: 1 / sharedBy,
    sharedBy,
    assumed: [...sharingInWords(e, sharedBy), ...originInWords(e)],
  };
}

/** Between how many bolts the load can be shared at best. */
function sharers(e: BoltEvidence): number {
  if (e.context === "choosing" || e.group === null || e.group.isRow === true) return 1;
  if (e.use === "protection" || e.use === "directional") return 1;
  const inReserve = e.placement?.role === "backup";
  return Math.max(1, inReserve ? e.group.backupCount : e.group.mainCount);
}

function sharingInWords(e: BoltEvidence, sharedBy: number): string[] {
  if (sharedBy > 1) {
    return [`the share is not computed: between an equal part for each of ${sharedBy} and all on this bolt`];
  }
  return ["one bolt carries all"];
}

function originInWords(e: BoltEvidence): string[] {
  const { angleFromAxisDeg: angle } = e.demand;
  const direction =
    angle === 90 ? "pulled straight across the bolt" : `pulled ${angle}° from the bolt's axis`;
  return [`loads: ${e.demand.origin}`, direction];
}

/** What one bolt gets of a case: pull-out along the axis (a push counts as none) and across it, kN. */
export function onBolt(load: LoadCase, share: number): { axialKn: number; radialKn: number } {
  const totalKn = load.kn * (load.alone ? 1 : share);
  const angleRad = (load.angleDeg * Math.PI) / 180;
  return {
    axialKn: Math.max(0, clean(totalKn * Math.cos(angleRad))),
    radialKn: Math.abs(clean(totalKn * Math.sin(angleRad))),
  };
}

/** cos 90° is not quite 0 in floating point: a hair of pull-out must not ask for an axial strength. */
function clean(value: number): number {
  return Math.abs(value) < 1e-9 ? 0 : value;
}
