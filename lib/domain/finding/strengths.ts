import { estimateRodEye } from "@/lib/engineering";
import { familyOf, metalName, strengthOf } from "@/lib/domain/catalogue/metals";
import type { BoltFacts } from "@/lib/domain/finding/evidence";
import { isSome } from "@/lib/domain/finding/words";

/** Breaking strength as rated, kN; a part of null is not known. */
export interface Rated {
  radialKn: number | null;
  axialKn: number | null;
  assumed: readonly string[];
}

/** EN 959:2018, 4.3.1 and 4.3.2: axial 15 kN, radial 25 kN (published). */
export const EN_959 = { radialKn: 25, axialKn: 15 } as const;

/**
 * Numbers a claimed standard stands for: EN 959, and UIAA 123 with its stricter 20 kN axial; both
 * published.
 */
function numbersOf(standard: string | null): { radialKn: number; axialKn: number; name: string } | null {
  if (standard === null) return null;
  if (/\bEN\s*959\b/i.test(standard)) return { ...EN_959, name: "EN 959" };
  if (/\bUIAA\s*123\b/i.test(standard)) return { radialKn: 25, axialKn: 20, name: "UIAA 123" };
  return null;
}

/** The rated strength: numbers on record first, then those of a standard that is claimed. */
export function ratedOf(bolt: BoltFacts): Rated {
  const claimed = numbersOf(bolt.standard);
  const usesClaim = claimed !== null && (bolt.ratedRadialKn === null || bolt.ratedAxialKn === null);
  return {
    radialKn: bolt.ratedRadialKn ?? claimed?.radialKn ?? null,
    axialKn: bolt.ratedAxialKn ?? claimed?.axialKn ?? null,
    assumed: usesClaim
      ? [`${claimed.name} is claimed: it counts as ${claimed.radialKn} / ${claimed.axialKn} kN`]
      : [],
  };
}

/** Load at which a permanent bend begins, kN. */
export interface BendOnset {
  basis: "tested" | "maker" | "estimate";
  /** Across the bolt: equal for a single number. */
  lowKn: number;
  highKn: number;
  /** Along the axis; the rated axial strength when no axial onset is known. Null: neither is known. */
  axialKn: number | null;
  assumed: readonly string[];
  /** Where the number comes from, in words. */
  origin: string;
}

/** Rod bent cold is stronger than the table says, MPa: common practice, the friendly end of an estimate. */
const COLD_BENT_MPA = 400;

/**
 * The bend onset on record, or an estimate where one can be made; null: neither. A number of unknown basis
 * is treated as an estimate. Estimates are made for glued bent rods alone, with metal, rod diameter and
 * lever known and two rods (a bent rod has two legs unless the record says otherwise).
 */
export function bendOnsetOf(bolt: BoltFacts): BendOnset | null {
  const axial = axialOnset(bolt);
  const { bendOnsetKn: recorded, bendOnsetBasis: basis } = bolt;
  if (recorded !== null) {
    const isEstimate = basis === "estimate" || basis === "unknown";
    return {
      basis: isEstimate ? "estimate" : basis,
      lowKn: recorded,
      highKn: Math.max(recorded, bolt.bendOnsetHighKn ?? recorded),
      ...axial,
      origin: {
        tested: "tested",
        maker: "from the maker",
        estimate: "an estimate",
        unknown: "of unknown origin",
      }[basis],
    };
  }
  const estimate = estimateBentRod(bolt);
  return estimate === null
    ? null
    : {
        ...estimate,
        axialKn: axial.axialKn,
        assumed: [...estimate.assumed, ...axial.assumed],
        origin: "an estimate",
      };
}

function axialOnset(bolt: BoltFacts): { axialKn: number | null; assumed: readonly string[] } {
  if (bolt.bendOnsetAxialKn !== null) return { axialKn: bolt.bendOnsetAxialKn, assumed: [] };
  const rated = ratedOf(bolt);
  return {
    axialKn: rated.axialKn,
    assumed: rated.axialKn === null ? [] : ["axial onset not known: the rated axial strength is used"],
  };
}

/**
 * Low: first yield at the table's strength, fixity half a diameter. High: whole section, cold-bent, fixity
 * none.
 */
function estimateBentRod(bolt: BoltFacts): Omit<BendOnset, "axialKn" | "origin"> | null {
  const strength = strengthOf(bolt.metal);
  const { rodDiameterMm, leverMm } = bolt;
  if (bolt.form !== "glued_bent_rod" || (bolt.rodCount ?? 2) !== 2) return null;
  if (strength === null || !isSome(rodDiameterMm) || leverMm === null) return null;

  const isTitanium = familyOf(bolt.metal) === "titanium";
  const highYieldMpa = isTitanium ? strength.yieldMpa : Math.max(COLD_BENT_MPA, strength.yieldMpa);
  const rod = {
    rodDiaM: rodDiameterMm / 1000,
    rods: 2,
    leverM: leverMm / 1000,
    fuPa: strength.ultimateMpa * 1e6,
  };
  const low = estimateRodEye({ ...rod, fyPa: strength.yieldMpa * 1e6 });
  const high = estimateRodEye({ ...rod, fyPa: highYieldMpa * 1e6 });
  const onset = (which: "lowN" | "highN", from: typeof low) =>
    (from.find((capacity) => capacity.mode === "bend-onset")?.[which] ?? 0) / 1000;
  return {
    basis: "estimate",
    lowKn: onset("lowN", low),
    highKn: onset("highN", high),
    assumed: [
      bolt.rodCount === null ? "two rods: not recorded" : "two rods that share the load",
      `${metalName(bolt.metal)} yields between ${strength.yieldMpa} and ${highYieldMpa} MPa (${strength.source.name})`,
    ],
  };
}
