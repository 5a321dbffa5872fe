import { requireNotNegative, requirePositive } from "./guard";

/** Years after which the power law gives way to a straight line. */
export const SWITCH_YEARS = 20;

/**
 * Depth of uniform corrosion after some years outdoors, m.
 *
 *     D = r t^b                                      t <= 20 years
 *     D = r 20^b + r b 20^(b-1) (t - 20)             after: the slope reached at 20 years
 *
 *   r  loss in the first year, m/yr    t  years    b  0.523 carbon steel, 0.813 zinc (upper: 0.575, 0.873)
 *
 * Not for: pitting, the crevice under a hanger, mixed metals and stress corrosion. They take little or no
 * section before they break a bolt, and give no warning that this formula could see.
 *
 * Source: ISO 9224:2012 (form and exponents from memory), ISO 9223:2012 for r.
 * Worked example (also a test): steel in C3, upper end 50 µm, 20 years: 239.6 µm.
 *
 * @throws RangeError when the rate or exponent is not positive, or the time is negative.
 */
export function corrosionDepthM(i: { firstYearM: number; exponent: number; years: number }): number {
  requirePositive("firstYearM", i.firstYearM);
  requirePositive("exponent", i.exponent);
  requireNotNegative("years", i.years);
  const curved = i.firstYearM * Math.min(i.years, SWITCH_YEARS) ** i.exponent;
  const slope = i.firstYearM * i.exponent * SWITCH_YEARS ** (i.exponent - 1);
  return curved + slope * Math.max(0, i.years - SWITCH_YEARS);
}
