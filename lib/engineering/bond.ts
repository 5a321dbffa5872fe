import type { Capacity } from "./capacity";
import { requirePositive } from "./guard";

/**
 * Pull-out of a bonded bar: the lower of the two cylinders on which the glue can let go.
 *
 *     N = π d h τ     hole wall: d_hole with τ_hole; bar: d_bar with τ_bar, when that is given
 *
 *   d  diameter, m    h  bonded length, m    τ  bond strength, Pa
 *
 * τ is 5 to 12 MPa in sound, clean, dry holes and near zero in dust or water: no formula sees the hole.
 * Not for: a sideways pull (`radialN` is null: the bond does not limit it), glue that has not cured.
 *
 * Source: uniform bond model of EN 1992-4 and ACI 318-19 (published); the range of τ is common practice.
 * Worked example (also a test): 12 mm hole, 100 mm, 8 MPa: 30.16 kN.
 *
 * @throws RangeError when a length or stress is not positive, or the bar is thicker than its hole.
 */
export function estimateBond(i: {
  holeDiaM: number;
  barDiaM: number;
  embedM: number;
  tauHolePa: number;
  tauBarPa?: number;
}): Capacity {
  requirePositive("holeDiaM", i.holeDiaM);
  requirePositive("barDiaM", i.barDiaM);
  requirePositive("embedM", i.embedM);
  requirePositive("tauHolePa", i.tauHolePa);
  if (i.tauBarPa !== undefined) requirePositive("tauBarPa", i.tauBarPa);
  if (i.barDiaM > i.holeDiaM) {
    throw new RangeError(`barDiaM must be at most holeDiaM (${i.holeDiaM}), got ${i.barDiaM}`);
  }
  const wallN = Math.PI * i.holeDiaM * i.embedM * i.tauHolePa;
  const barN = i.tauBarPa === undefined ? Infinity : Math.PI * i.barDiaM * i.embedM * i.tauBarPa;
  return {
    mode: "bond",
    axialN: Math.min(wallN, barN),
    radialN: null,
    source: "estimate",
    interactionExponent: 1.5,
  };
}
