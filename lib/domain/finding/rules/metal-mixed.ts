import { familyOf, metalName } from "@/lib/domain/catalogue/metals";
import type { MetalFamily } from "@/lib/domain/catalogue/metals";
import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { carefulSeaM, placeInWords } from "@/lib/domain/finding/place";
import { hasPlate } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";

/** Salt makes any two families a battery within this distance, m (common practice). */
const SALT_M = 1_000;

/**
 * metal.mixed: hanger and bolt of different metal families.
 *
 * Stainless with plated limits anywhere; any other pair limits within 1 km of the sea (a distance that is
 * not known counts as near) and is a note beyond. A link of another family is a note: it can be swapped. A
 * hanger whose metal is not on record is a note too; a bolt of unknown metal is for `metal.unknown`.
 */
export function metalMixed(e: BoltEvidence): Finding | null {
  const bolt = familyOf(e.bolt.metal);
  if (bolt === null) return null;
  const hanger = familyOf(e.bolt.hangerMetal);
  const link = familyOf(e.bolt.linkMetal);
  const seaM = carefulSeaM(e.place);

  if (hanger !== null && hanger !== bolt) {
    return finding(e, levelOf(bolt, hanger, seaM), "hanger", e.bolt.hangerMetal, seaM === null);
  }
  if (link !== null && link !== bolt) return finding(e, "note", "link", e.bolt.linkMetal, false);
  if (hanger === null && hasPlate(e.bolt)) return finding(e, "note", "hanger", null, false);
  return null;
}

function levelOf(bolt: MetalFamily, hanger: MetalFamily, seaM: number | null): Level {
  const zincOnStainless = [bolt, hanger].includes("plated") && [bolt, hanger].includes("stainless");
  return zincOnStainless || seaM === null || seaM <= SALT_M ? "limit" : "note";
}

function finding(
  e: BoltEvidence,
  level: Level,
  part: "hanger" | "link",
  metal: string | null,
  seaTakenAsNear: boolean,
): Finding {
  return {
    code: "metal.mixed",
    level,
    title: metal === null ? "Metal of the hanger not recorded" : "Different metals touch",
    text:
      metal === null
        ? `The bolt is of ${metalName(e.bolt.metal)}; the metal of its hanger is not on record.`
        : `Bolt of ${metalName(e.bolt.metal)}, ${part} of ${metalName(metal)}, ${placeInWords(e.place)}.`,
    clearsWhen:
      metal === null ? "the metal of the hanger is recorded" : `bolt and ${part} are of one metal family`,
    numbers: { part, boltMetal: e.bolt.metal, partMetal: metal, seaDistanceM: e.place.seaDistanceM },
    assumed: seaTakenAsNear ? ["the sea taken as near: distance not known"] : [],
    source: { mark: "published", name: "EN 959:2018, 4.2.7, one material; distances: common practice" },
  };
}
