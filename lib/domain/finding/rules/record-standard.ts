import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { EN_959 } from "@/lib/domain/finding/strengths";
import { isSerious } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { exceeds, kn } from "@/lib/domain/finding/words";

/**
 * record.standard: a rating below EN 959, or no standard claimed where people belay or hang. A rating that
 * is not on record is for `load.unknown`; a missing standard is not mentioned while a type is being chosen.
 */
export function recordStandard(e: BoltEvidence): Finding | null {
  const { ratedRadialKn: radial, ratedAxialKn: axial, standard } = e.bolt;
  const below =
    (radial !== null && exceeds(EN_959.radialKn, radial)) ||
    (axial !== null && exceeds(EN_959.axialKn, axial));
  const numbers = {
    ratedRadialKn: radial,
    ratedAxialKn: axial,
    wantedRadialKn: EN_959.radialKn,
    wantedAxialKn: EN_959.axialKn,
    standard,
  };
  const source = { mark: "published", name: "EN 959:2018, 4.3.1 and 4.3.2" } as const;
  if (below) {
    return {
      code: "record.standard",
      level: "limit",
      title: "Rated below EN 959",
      text: `Rated ${radial === null ? "not known" : kn(radial)} across and ${axial === null ? "not known" : kn(axial)} along the axis; the standard wants ${kn(EN_959.radialKn)} and ${kn(EN_959.axialKn)}.`,
      clearsWhen: `a bolt rated ${EN_959.radialKn} / ${EN_959.axialKn} kN is placed`,
      numbers,
      assumed: [],
      source,
    };
  }
  const wanted = e.use === "belay" || isSerious(e.use);
  if (standard !== null || !wanted || e.context === "choosing") return null;
  return {
    code: "record.standard",
    level: "note",
    title: "No standard claimed",
    text: "The record names no standard for this bolt.",
    clearsWhen: "the standard it was made to is recorded",
    numbers,
    assumed: [],
    source,
  };
}
