import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { hasPlate, isHighline } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { exceeds, mm } from "@/lib/domain/finding/words";

/**
 * Thickness under textile, mm: below the first it limits, below the second it is a note (common practice).
 */
const LIMIT_MM = 10;
const NOTE_MM = 12;

/**
 * eye.radius: what textile or a running rope lies on.
 *
 * A plate hanger cuts: textile or a lowered rope straight through it stops in every use, once it is
 * recorded to be so; most hangers carry a connector and nothing is said of those. On a highline soft
 * connectors straight on the eye are usual, so there the thickness is judged unless a connector is
 * recorded. Thickness is the rod's, or twice the edge radius.
 */
export function eyeRadius(e: BoltEvidence): Finding | null {
  const straight = e.textileThroughEye;
  if (hasPlate(e.bolt)) {
    if (straight !== true) return null;
    return finding(
      "stop",
      null,
      "Textile straight through a plate hanger",
      "The edge of a plate cuts what runs over it.",
      false,
    );
  }
  const thicknessMm = e.bolt.rodDiameterMm ?? (e.bolt.eyeRadiusMm === null ? null : 2 * e.bolt.eyeRadiusMm);
  if (!isHighline(e.use) || straight === false) return null;
  if (thicknessMm === null) {
    const text = "How thick the eye is under textile is not on record: it is taken as thin.";
    return finding("limit", null, "Thickness of the eye not recorded", text, straight === null);
  }
  if (!exceeds(NOTE_MM, thicknessMm)) return null;
  const level: Level = exceeds(LIMIT_MM, thicknessMm) ? "limit" : "note";
  const text = `Textile on the eye lies on ${mm(thicknessMm)}; ${mm(NOTE_MM)} treats it well, below ${mm(LIMIT_MM)} it cuts.`;
  return finding(level, thicknessMm, "Thin eye under textile", text, straight === null);
}

function finding(
  level: Level,
  thicknessMm: number | null,
  title: string,
  text: string,
  taken: boolean,
): Finding {
  return {
    code: "eye.radius",
    level,
    title,
    text,
    clearsWhen:
      thicknessMm === null
        ? "a steel connector is used between bolt and textile"
        : `a steel connector is used, or an eye of at least ${mm(NOTE_MM)} is placed`,
    numbers: { thicknessMm, wantedMm: thicknessMm === null ? null : NOTE_MM },
    assumed: taken ? ["textile lies straight on the eye: not recorded"] : [],
    source: { mark: "common_practice", name: "Thin rods and plate edges cut textile" },
  };
}
