import { coatingLifeYears, corrosionDepthM, remainingRod } from "@/lib/engineering";
import { yearsBetween } from "@/lib/domain/finding/dates";
import type { BoltEvidence, BoltFacts } from "@/lib/domain/finding/evidence";
import { isMechanical } from "@/lib/domain/finding/traits";
import { isSome } from "@/lib/domain/finding/words";

/** How zinc and then steel are used up: ISO 9223 rates at their upper end, ISO 9224 growth. */

/**
 * Corrosivity by distance to the sea where nobody measured it (common practice); µm in the first year,
 * upper ends.
 */
const CATEGORIES = [
  { name: "CX", toM: 250, zincUm: 25, steelUm: 700 },
  { name: "C5", toM: 1_000, zincUm: 8.4, steelUm: 200 },
  { name: "C4", toM: 10_000, zincUm: 4.2, steelUm: 80 },
] as const;
const INLAND = { name: "C3", zincUm: 2.1, steelUm: 50 } as const;
const ZINC_EXPONENT = 0.813;
const STEEL_EXPONENT = 0.523;

/**
 * Greatest age a plated bolt whose date is not known may have, years (common practice: drilled bolts since
 * then).
 */
const OLDEST_YEARS = 60;
/** Shanks in use where the diameter is not recorded, mm. */
const PLAUSIBLE_SHANK_MM = [8, 12];

function categoryAt(seaM: number): { zincUm: number; steelUm: number } {
  return CATEGORIES.find(({ toM }) => seaM <= toM) ?? INLAND;
}

/**
 * Coating, µm: as measured, else 8 for electroplate (BS 7371-3, published) and 50 for hot dip (common
 * practice).
 */
export function coatingUm(bolt: BoltFacts, metal: string): number {
  return bolt.coatingThicknessUm ?? (metal === "hot-dip-galvanised" ? 50 : 8);
}

/** The diameters the shank may have, mm: one when it is known. */
export function diametersMm(bolt: BoltFacts): readonly number[] {
  const known =
    bolt.shankDiameterMm ?? bolt.rodDiameterMm ?? (isMechanical(bolt) ? bolt.holeDiameterMm : null);
  return isSome(known) ? [known] : PLAUSIBLE_SHANK_MM;
}

/** The ages the bolt may have on the date asked for, years: one when the date is known, least age first. */
export function ages(e: BoltEvidence): readonly number[] {
  if (e.bolt.installedOn === null) return [0, OLDEST_YEARS];
  const age = Math.max(0, yearsBetween(e.bolt.installedOn, e.onDate));
  return e.bolt.installedOnPrecision === "before" ? [age, Math.max(age, OLDEST_YEARS)] : [age];
}

/** Zinc life in years: the shorter of the power law and the straight line. */
function zincYears(thicknessUm: number, seaM: number): number {
  if (!isSome(thicknessUm)) return 0;
  const firstYearUm = categoryAt(seaM).zincUm;
  return Math.min(
    coatingLifeYears({
      thicknessM: thicknessUm / 1e6,
      firstYearM: firstYearUm / 1e6,
      exponent: ZINC_EXPONENT,
    }),
    thicknessUm / firstYearUm,
  );
}

/** Part of the section gone after some years, 0 to 1. */
export function sectionLost(diameterMm: number, thicknessUm: number, seaM: number, age: number): number {
  const bare = Math.max(0, age - zincYears(thicknessUm, seaM));
  const depthM = corrosionDepthM({
    firstYearM: categoryAt(seaM).steelUm / 1e6,
    exponent: STEEL_EXPONENT,
    years: bare,
  });
  return 1 - remainingRod({ rodDiaM: diameterMm / 1000, depthM }).tensionRatio;
}

/** Years after which that part of the section is gone: `sectionLost` turned round. */
export function yearsUntilLost(diameterMm: number, thicknessUm: number, seaM: number, part: number): number {
  const depthM = (diameterMm / 2000) * (1 - Math.sqrt(1 - part));
  const firstYearM = categoryAt(seaM).steelUm / 1e6;
  return (
    zincYears(thicknessUm, seaM) +
    coatingLifeYears({ thicknessM: depthM, firstYearM, exponent: STEEL_EXPONENT })
  );
}
