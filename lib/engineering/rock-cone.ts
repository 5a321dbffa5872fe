import type { Capacity } from "./capacity";
import { requirePositive, requireWithin } from "./guard";

/** Strength above which the formula, calibrated on concrete, gains nothing, Pa. */
export const UCS_CAP_PA = 55e6;

/**
 * Pull-out of a cone of rock around one bolt.
 *
 *     N = k √f h^1.5 ψ        N in newton, f in MPa, h in mm: the formula is dimensional
 *
 *   h  effective depth    f  min(UCS, 55 MPa): the formula is calibrated on concrete
 *   k  7.7, the cracked-concrete level
 *   ψ  quality: 1 massive, 0.5 default, 0.3 or less jointed, weathered, soft
 *
 * No code covers anchors in rock. The doubt is -50/+100 % (`lowN`, `highN`), and one joint behind the bolt
 * makes it worthless: it may lower a verdict, never raise one. `radialN` is null: a cone does not limit a
 * sideways pull.
 *
 * Source: EN 1992-4 (k from memory); the form as in ACI 318-19 (published).
 * Worked example (also a test): 80 mm, UCS 40 MPa, ψ 0.5: 17.4 kN.
 *
 * @throws RangeError when an argument is not positive or the quality is above 1.
 */
export function estimateRockCone(i: {
  embedM: number;
  ucsPa: number;
  quality: number;
  k?: number;
  ucsCapPa?: number;
}): Capacity {
  requirePositive("embedM", i.embedM);
  requirePositive("ucsPa", i.ucsPa);
  requireWithin("quality", i.quality, 0, 1);
  const k = i.k ?? 7.7;
  const capPa = i.ucsCapPa ?? UCS_CAP_PA;
  requirePositive("k", k);
  requirePositive("ucsCapPa", capPa);

  const strengthMpa = Math.min(i.ucsPa, capPa) / 1e6;
  const coneN = k * Math.sqrt(strengthMpa) * (i.embedM * 1000) ** 1.5 * i.quality;
  return {
    mode: "rock-cone",
    axialN: coneN,
    radialN: null,
    lowN: coneN * 0.5,
    highN: coneN * 2,
    source: "estimate",
    interactionExponent: 1.5,
  };
}
