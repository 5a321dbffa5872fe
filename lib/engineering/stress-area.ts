import { requirePositive } from "./guard";

/**
 * Stress area of a metric thread, m²: what carries in tension and, at the rock, in shear.
 *
 *     As = π/4 (d - 0.9382 P)²        d: nominal diameter, m    P: pitch, m
 *
 * Source: ISO 898-1 (published). Worked example (also a test): M10 with a pitch of 1.5 mm: 58.0 mm².
 *
 * @throws RangeError when an argument is not positive or the pitch is not less than the diameter.
 */
export function stressAreaM2(i: { diaM: number; pitchM: number }): number {
  requirePositive("diaM", i.diaM);
  requirePositive("pitchM", i.pitchM);
  if (i.pitchM >= i.diaM) throw new RangeError(`pitchM must be less than diaM (${i.diaM}), got ${i.pitchM}`);
  return (Math.PI / 4) * (i.diaM - 0.9382 * i.pitchM) ** 2;
}
