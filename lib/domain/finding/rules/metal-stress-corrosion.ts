import { metalAgainstStressCorrosion } from "@/lib/engineering";
import { metalName } from "@/lib/domain/catalogue/metals";
import { metalsThatPass } from "@/lib/domain/catalogue/metals-that-pass";
import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import type { MetalPart } from "@/lib/domain/finding/parts";
import { metalParts } from "@/lib/domain/finding/parts";
import { placeInWords, placeMissing, placeOf } from "@/lib/domain/finding/place";
import { severity } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { areRecorded, distance, sentence } from "@/lib/domain/finding/words";

/**
 * metal.stress-corrosion: can chloride crack a part without warning?
 *
 * Separate from the corrosion class on purpose: a grade may meet the class and still crack. Links count in
 * full: cracking is not seen, so being replaceable does not help. One confirmed fracture stops that grade
 * at the whole site.
 */
export function metalStressCorrosion(e: BoltEvidence): Finding | null {
  const worst = metalParts(e.bolt)
    .map((part) => ({ part, ...levelOf(part, e) }))
    .reduce<{ part: MetalPart; level: Level; reason: string } | null>((found, { part, level, reason }) => {
      if (level === null) return found;
      return found === null || severity(level) > severity(found.level) ? { part, level, reason } : found;
    }, null);
  if (worst === null) return null;

  const { part, level, reason } = worst;
  const missing = placeMissing(e.place);
  return {
    code: "metal.stress-corrosion",
    level,
    title: {
      stop: "May crack from salt without warning",
      ask: "Not known whether salt can crack it",
      limit: "Within reach of cracking from salt",
      note: "Warm, dry and sheltered: salt may gather",
    }[level],
    text: `${sentence(part.part)} of ${metalName(part.metal)}, ${placeInWords(e.place)}. ${reason}`,
    clearsWhen:
      level === "ask"
        ? areRecorded(missing)
        : level === "note"
          ? null
          : `the ${part.part} is of a metal that suits the place: ${metalsThatPass(e.place)}`,
    numbers: {
      part: part.part,
      metal: part.metal,
      seaDistanceM: e.place.seaDistanceM,
      seaDistanceErrorM: e.place.seaDistanceErrorM,
      washing: e.place.washing,
      warmDry: e.place.warmDry,
    },
    assumed:
      e.place.seaDistanceM !== null && e.place.seaDistanceErrorM > 0
        ? [`the near side of ${distance(e.place.seaDistanceM)} ± ${distance(e.place.seaDistanceErrorM)}`]
        : [],
    source: {
      mark: "published",
      name: "Accepted grades: EN 13451-1:2011; distances: common practice from federation notices",
    },
  };
}

function levelOf({ metal }: MetalPart, e: BoltEvidence): { level: Level | null; reason: string } {
  if (e.care !== null && e.care.fracturedMetals.includes(metal)) {
    return { level: "stop", reason: "A stress-corrosion fracture of this metal is confirmed at this site." };
  }
  const { level, reason } = metalAgainstStressCorrosion(metal, placeOf(e.place));
  // An unlisted metal is for `metal.unknown` to ask about; here only the place may be the open question.
  if (level === "ok" || (level === "ask" && placeMissing(e.place).length === 0))
    return { level: null, reason };
  return { level, reason };
}
