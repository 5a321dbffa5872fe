import { SWITCH_YEARS } from "./corrosion-depth";
import { requirePositive } from "./guard";

/**
 * Years until a coating is used up: `corrosionDepthM` turned round.
 *
 *     t = (s / r)^(1/b)                              while that is 20 years or less
 *     t = 20 + (s - r 20^b) / (r b 20^(b-1))         after: the straight line
 *
 *   s  thickness of the coating, m    r  loss in the first year, m/yr    b  exponent, 0.813 for zinc
 *
 * A coating thinner than one year's loss is gone sooner than s / r; a thicker one lasts longer than s / r.
 * Whoever wants the careful number takes the shorter of this and s / r.
 * Not for: scratched, chipped or threaded zinc, or zinc beside stainless steel.
 *
 * Source: ISO 9224:2012 (form and exponent from memory), ISO 9223:2012 for r.
 * Worked example (also a test): 12 µm in C2, upper end 0.7 µm: 32.32 years (32.96 without the switch).
 *
 * @throws RangeError when an argument is not positive.
 */
export function coatingLifeYears(i: { thicknessM: number; firstYearM: number; exponent: number }): number {
  requirePositive("thicknessM", i.thicknessM);
  requirePositive("firstYearM", i.firstYearM);
  requirePositive("exponent", i.exponent);
  const years = (i.thicknessM / i.firstYearM) ** (1 / i.exponent);
  if (years <= SWITCH_YEARS) return years;
  const atSwitchM = i.firstYearM * SWITCH_YEARS ** i.exponent;
  const slope = i.firstYearM * i.exponent * SWITCH_YEARS ** (i.exponent - 1);
  return SWITCH_YEARS + (i.thicknessM - atSwitchM) / slope;
}
