import type { LoadPolicy } from "@/lib/domain/policy";
import type { Level } from "@/lib/domain/vocabulary";
import {
  bendNeeds,
  bendUse,
  LEAST_ONSET_KN,
  neededOnsetInWords,
  SERIOUS_MARGIN,
} from "@/lib/domain/finding/bend-need";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import type { Loads } from "@/lib/domain/finding/loads";
import { loadsOf, onBolt } from "@/lib/domain/finding/loads";
import type { BendOnset } from "@/lib/domain/finding/strengths";
import { bendOnsetOf } from "@/lib/domain/finding/strengths";
import { isSerious } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { atMostKn, exceeds, kn } from "@/lib/domain/finding/words";

/**
 * load.bend: does the bolt bend for good under the load expected here?
 *
 * Linear interaction of pull-out and pull across. A tested or maker's onset uses its low end: the careful
 * side of a scatter. An estimate has a low and a high end and is never a pass: at best it limits a serious
 * use, and elsewhere it leaves a note. Rope access stops a tested onset on its working case only, as people
 * hang in it daily and its peak is a rescue; an estimate is held against the peak like a highline's, since
 * an estimate may only lower.
 *
 * Bounds of sharing: every level is taken with one bolt carrying all. Only where that is a stop, the equal
 * share is asked too, and what it clears becomes "not known" (serious) or a limit (others).
 */
export function loadBend(e: BoltEvidence, policy: LoadPolicy): Finding | null {
  const loads = loadsOf(e, policy);
  const onset = bendOnsetOf(e.bolt);
  if (loads === null || onset === null) return null;

  const level = withinBounds(e, loads, onset);
  if (level === null) return null;
  const decisive = decisiveCase(e, loads);
  const carried = onBolt(decisive, 1);
  const used = bendUse(decisive, 1, { radialKn: onset.highKn, axialKn: onset.axialKn });
  return {
    code: "load.bend",
    level,
    title: titleFor(level, onset, isSerious(e.use)),
    text: inWords(decisive.name, carried, onset, loads),
    clearsWhen: clearsWhen(e, loads, onset),
    numbers: {
      use: e.use,
      workingKn: loads.working.kn,
      peakKn: e.demand.peakKn,
      radialKn: carried.radialKn,
      axialKn: carried.axialKn,
      onsetKn: onset.lowKn,
      onsetHighKn: onset.highKn,
      axialOnsetKn: onset.axialKn,
      basis: onset.basis,
      sharedBy: loads.sharedBy,
      utilisation: used,
    },
    assumed: [...loads.assumed, ...onset.assumed],
    source:
      onset.basis === "estimate"
        ? { mark: "arithmetic", name: "Statics of the rod section: an estimate, never a rating" }
        : { mark: "common_practice", name: "No permanent bend where people hang on the bolt" },
  };
}

function withinBounds(e: BoltEvidence, loads: Loads, onset: BendOnset): Level | null {
  const worst = levelAt(e, loads, onset, 1);
  if (worst !== "stop" || levelAt(e, loads, onset, loads.friendliestShare) === "stop") return worst;
  return isSerious(e.use) ? "ask" : "limit";
}

function levelAt(e: BoltEvidence, loads: Loads, onset: BendOnset, share: number): Level | null {
  const peaks = loads.peaks.filter((load) => isSerious(e.use) || !load.strengthOnly);
  const usedBy = (radialKn: number) => {
    const end = { radialKn, axialKn: onset.axialKn };
    return {
      peak: Math.max(0, ...peaks.map((load) => bendUse(load, share, end))),
      working: bendUse(loads.working, share, end),
    };
  };
  const low = usedBy(onset.lowKn);
  return onset.basis === "estimate"
    ? levelOfEstimate(e, low, usedBy(onset.highKn))
    : levelOfKnown(e, low, onset.lowKn);
}

/** Parts of an onset used up by the greatest peak that counts and by the working case. */
interface Used {
  peak: number;
  working: number;
}

function levelOfEstimate(e: BoltEvidence, low: Used, high: Used): Level {
  if (!isSerious(e.use)) return exceeds(high.working, 1) ? "limit" : "note";
  if (exceeds(high.peak, 1)) return "stop";
  return exceeds(low.peak, 1) ? "ask" : "limit";
}

function levelOfKnown(e: BoltEvidence, used: Used, onsetKn: number): Level | null {
  if (isSerious(e.use)) {
    if (exceeds(e.use === "rope_access" ? used.working : used.peak, 1)) return "stop";
    return exceeds(SERIOUS_MARGIN * used.peak, 1) ? "limit" : null;
  }
  if (exceeds(LEAST_ONSET_KN, onsetKn)) return "stop";
  if (exceeds(used.working, 1)) return "limit";
  return exceeds(used.peak, 1) ? "note" : null;
}

/** The case shown: what the use is stopped on. */
function decisiveCase(e: BoltEvidence, loads: Loads): Loads["working"] {
  const onPeak =
    e.use === "highline" || (e.use === "rope_access" && bendOnsetOf(e.bolt)?.basis === "estimate");
  return onPeak ? (loads.peaks[0] ?? loads.working) : loads.working;
}

function titleFor(level: Level, onset: BendOnset, serious: boolean): string {
  if (level === "stop") return "Bends before the load expected here";
  if (level === "ask") return "May bend before the load expected here";
  if (onset.basis === "estimate") return "Bend onset is only estimated";
  if (serious) return "Little margin against bending";
  return level === "limit" ? "Expect a bend after a hard fall: look after each" : "May bend at the peak case";
}

function inWords(
  name: string,
  carried: { axialKn: number; radialKn: number },
  onset: BendOnset,
  loads: Loads,
): string {
  const pulls = [`${kn(carried.radialKn)} across the bolt`];
  if (carried.axialKn > 0) pulls.push(`${kn(carried.axialKn)} along its axis`);
  const begins =
    onset.highKn > onset.lowKn
      ? `between ${kn(onset.lowKn)} and ${kn(onset.highKn)}`
      : `at ${kn(onset.lowKn)}`;
  const shared =
    loads.sharedBy > 1
      ? ` (${kn(carried.radialKn / loads.sharedBy)} in an equal share of ${loads.sharedBy})`
      : "";
  const never = onset.basis === "estimate" ? " An estimate is never a rating." : "";
  return `The ${name} puts ${pulls.join(" and ")}${shared}; it begins to bend ${begins} (${onset.origin}).${never}`;
}

function clearsWhen(e: BoltEvidence, loads: Loads, onset: BendOnset): string {
  const bolt = `${neededOnsetInWords(e, loads, onset.axialKn)} (tested or from the maker) is placed`;
  if (onset.basis === "estimate" || (!isSerious(e.use) && onset.lowKn < LEAST_ONSET_KN)) {
    return onset.basis === "estimate" ? `${bolt}, or this bolt's onset is tested and reaches that` : bolt;
  }
  const low = { radialKn: onset.lowKn, axialKn: onset.axialKn };
  const bounds = bendNeeds(e, loads).map(({ load, factor }) => {
    const used = bendUse(load, 1, low) * factor;
    return exceeds(used, 1)
      ? `the ${load.name} brings at most ${atMostKn(load.kn / used)} on this bolt`
      : null;
  });
  return [bolt, bounds.filter((words) => words !== null).join(" and ")]
    .filter((words) => words !== "")
    .join(", or ");
}
