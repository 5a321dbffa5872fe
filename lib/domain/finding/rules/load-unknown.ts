import type { LoadPolicy } from "@/lib/domain/policy";
import type { Level } from "@/lib/domain/vocabulary";
import { neededOnsetInWords } from "@/lib/domain/finding/bend-need";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import type { Loads } from "@/lib/domain/finding/loads";
import { loadsOf, onBolt } from "@/lib/domain/finding/loads";
import type { Rated } from "@/lib/domain/finding/strengths";
import { bendOnsetOf, ratedOf } from "@/lib/domain/finding/strengths";
import { isSerious, worstLevel } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { list } from "@/lib/domain/finding/words";

/**
 * load.unknown: what the load rules could not compare.
 *
 * A rating counts as known when the record or a claimed standard gives it. The axial one is asked for only
 * where the pull has a part along the axis. No onset at all asks in a serious use, limits a belay on a bent
 * rod (the build that bends first), and is a note elsewhere: most plate hangers have no published onset and
 * need none there.
 */
export function loadUnknown(e: BoltEvidence, policy: LoadPolicy): Finding | null {
  const loads = loadsOf(e, policy);
  if (loads === null) return null;
  const rated = ratedOf(e.bolt);
  const missing = [
    rated.radialKn === null ? "the rated strength across the bolt" : null,
    rated.axialKn === null && pullsOut(loads) ? "the rated strength along the axis" : null,
  ].filter((words) => words !== null);
  const onset = bendOnsetOf(e.bolt);
  if (missing.length === 0 && onset !== null) return null;

  const unrated = missing.length > 0;
  const level = worstLevel([unrated ? "ask" : null, onset === null ? levelWithoutOnset(e) : null]) ?? "note";
  const words = onset === null ? [...missing, "the load at which it begins to bend"] : missing;
  return {
    code: "load.unknown",
    level,
    title: unrated ? "Strength not known" : "Bend onset not known",
    text: `Not on record: ${list(words)}. The load could not be compared with it; a rating says nothing about bending.`,
    clearsWhen: [
      unrated ? "a rating is recorded or EN 959 is claimed" : null,
      onset === null ? onsetToRecord(e, loads, rated) : null,
    ]
      .filter((part) => part !== null)
      .join(", and "),
    numbers: {
      use: e.use,
      ratedRadialKn: rated.radialKn,
      ratedAxialKn: rated.axialKn,
      onsetKn: onset?.lowKn ?? null,
      peakKn: e.demand.peakKn,
    },
    assumed: loads.assumed,
    source: { mark: "common_practice", name: "What is not known is never a pass" },
  };
}

function onsetToRecord(e: BoltEvidence, loads: Loads, rated: Rated): string {
  const bolt = neededOnsetInWords(e, loads, e.bolt.bendOnsetAxialKn ?? rated.axialKn);
  return `the record shows ${bolt}, tested or from the maker`;
}

function pullsOut(loads: Loads): boolean {
  return [loads.working, ...loads.peaks].some((load) => onBolt(load, 1).axialKn > 0);
}

function levelWithoutOnset(e: BoltEvidence): Level {
  if (isSerious(e.use)) return "ask";
  return e.use === "belay" && e.bolt.form === "glued_bent_rod" ? "limit" : "note";
}
