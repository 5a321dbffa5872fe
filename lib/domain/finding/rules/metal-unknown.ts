import { familyOf } from "@/lib/domain/catalogue/metals";
import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { placeInWords } from "@/lib/domain/finding/place";
import { metalClass } from "@/lib/domain/finding/rules/metal-class";
import { metalPlated } from "@/lib/domain/finding/rules/metal-plated";
import { metalStressCorrosion } from "@/lib/domain/finding/rules/metal-stress-corrosion";
import { acrossUnknown, worstLevel } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";

/** What a magnet that sticks, or does not, leaves possible: one metal for each way the rules can go. */
const STICKS = ["zinc-plated", "hot-dip-galvanised", "1.4016", "1.4462"];
const STICKS_AND_RUSTS = ["zinc-plated", "hot-dip-galvanised"];
const DOES_NOT_STICK = ["1.4301", "1.4401", "1.4547", "ti-2"];
/** From this grade on, rust on a magnetic bolt means carbon steel. */
const RUSTY = 2;

/**
 * metal.unknown: the metal of the bolt is not on record.
 *
 * Asks, unless magnet and look leave only metals that the other metal rules judge alike in this place; then
 * it says what they would say. A designation that is in no table counts as not known.
 */
export function metalUnknown(e: BoltEvidence): Finding | null {
  if (familyOf(e.bolt.metal) !== null) return null;
  const candidates = candidatesFor(e.bolt.magnetic, e.bolt.rustGrade);
  const level = acrossUnknown(candidates.map((metal) => outcome(e, metal))) ?? "note";
  const magnet =
    e.bolt.magnetic === null
      ? "No magnet was tried"
      : e.bolt.magnetic
        ? "A magnet sticks to it"
        : "A magnet does not stick to it";
  const rust = e.bolt.rustGrade === null ? "" : `; rust grade ${e.bolt.rustGrade}`;
  return {
    code: "metal.unknown",
    level,
    title: level === "ask" ? "Metal not known" : "Metal not known, but one answer for all it can be",
    text: `The metal of the bolt is ${e.bolt.metal === null ? "not on record" : `recorded as ${e.bolt.metal}, which is in no table`}. ${magnet}${rust}. The place: ${placeInWords(e.place)}.`,
    clearsWhen:
      level === "ask" && e.bolt.magnetic === null
        ? "the metal is recorded, or a magnet and a look at the rust leave one answer"
        : "the metal is recorded",
    numbers: {
      metal: e.bolt.metal,
      magnetic: e.bolt.magnetic,
      rustGrade: e.bolt.rustGrade,
      seaDistanceM: e.place.seaDistanceM,
    },
    assumed: level === "ask" ? [] : [`it is one of ${candidates.join(", ")}`],
    source: { mark: "common_practice", name: "What is not known is never a pass" },
  };
}

function candidatesFor(magnetic: boolean | null, rustGrade: number | null): readonly string[] {
  if (magnetic === false) return DOES_NOT_STICK;
  if (magnetic === null) return [...STICKS, ...DOES_NOT_STICK];
  return rustGrade !== null && rustGrade >= RUSTY ? STICKS_AND_RUSTS : STICKS;
}

function outcome(e: BoltEvidence, metal: string): Level | null {
  const as = { ...e, bolt: { ...e.bolt, metal, hangerMetal: null, linkMetal: null } };
  return worstLevel(
    [metalClass(as), metalStressCorrosion(as), metalPlated(as)].map((found) => found?.level ?? null),
  );
}
