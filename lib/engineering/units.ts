import { requireFinite } from "./guard";

/**
 * Unit conversion: the only file of this folder that knows kN, %, mm, degrees, feet and pounds.
 *
 * Everything behind it is SI (N, m, kg, rad, Pa, s) and carries the unit in its name. Mixed units go wrong
 * exactly where the formulas are least forgiving: EA times strain, sqrt(MPa) times mm^1.5, squared lengths.
 * Every function throws a RangeError when its argument is not a finite number.
 *
 * Source: NIST SP 811 (standard gravity, foot, pound and pound-force are exact by definition).
 * Worked example (also a test): 5000 lbf = 22 241.108 N, printed on hardware as 22 kN.
 */

/** Standard acceleration of gravity, m/s², exact. */
export const GRAVITY_MS2 = 9.80665;
/** International avoirdupois pound, kg, exact. */
const POUND_KG = 0.45359237;
/** International foot, m, exact. */
const FOOT_M = 0.3048;

/** kN to N. */
export function knToN(kn: number): number {
  requireFinite("kn", kn);
  return kn * 1000;
}

/** N to kN. */
export function nToKn(n: number): number {
  requireFinite("n", n);
  return n / 1000;
}

/** Degrees to radians. */
export function degToRad(d: number): number {
  requireFinite("d", d);
  return (d * Math.PI) / 180;
}

/** Radians to degrees. */
export function radToDeg(r: number): number {
  requireFinite("r", r);
  return (r * 180) / Math.PI;
}

/**
 * Stiffness of webbing from "kN per 1 % of stretch" to EA in N.
 * EA = F / strain; 1 kN at a strain of 0.01 is 1000 / 0.01 = 1e5 N.
 */
export function eaNFromKnPerPercent(k: number): number {
  requireFinite("k", k);
  return k * 1e5;
}

/** Millimetres to metres. */
export function mmToM(mm: number): number {
  requireFinite("mm", mm);
  return mm / 1000;
}

/** Pounds-force to N: one pound under standard gravity. For hardware marked in lbf. */
export function lbfToN(lbf: number): number {
  requireFinite("lbf", lbf);
  return lbf * POUND_KG * GRAVITY_MS2;
}

/** Feet to metres. */
export function ftToM(ft: number): number {
  requireFinite("ft", ft);
  return ft * FOOT_M;
}
