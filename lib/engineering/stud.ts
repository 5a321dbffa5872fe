import type { Capacity } from "./capacity";
import { requireNotNegative, requirePositive } from "./guard";

/**
 * Bend onset and break of a threaded stud that carries a hanger.
 *
 *     flush   yield 0.6 fy As             break 0.6 fu As (0.5 fu As when fu > 500 MPa)
 *     gap e   yield fy W / la, capped as flush    break 1.2 W fu / la, capped as flush
 *     ds = sqrt(4 As/π)    W = π ds³/32    la = e + 0.5 ds
 *     axial   yield fy As, break fu As
 *
 *   As  stress area of the thread, m²: π/4 (d - 0.9382 P)²      e  gap between rock and hanger, m
 *
 * What it says: an M10 A4-70 stud yields at 15.7 kN flush and at 2.0 kN with a 10 mm gap. A loose or spaced
 * hanger is an order-of-magnitude defect, not a cosmetic one. Flush means a gap of exactly 0. Onset low =
 * elastic, high = plastic (16/(3π) times the elastic moment), on the same lever.
 *
 * Source: ISO 898-1 stress area (published); 0.6 for von Mises' 0.577, break factors and the lever form of
 * EN 1992-4 (from memory). Worked example (also a test): M10 A4-70 (fy 450 MPa, As 58 mm²) yields at 15.66 kN
 * flush and at 1.96 kN with a 10 mm gap.
 *
 * @throws RangeError when an argument is out of range.
 */
export function estimateStud(i: {
  stressAreaM2: number;
  gapM: number;
  fyPa: number;
  fuPa: number;
}): Capacity[] {
  requirePositive("stressAreaM2", i.stressAreaM2);
  requireNotNegative("gapM", i.gapM);
  requirePositive("fyPa", i.fyPa);
  requirePositive("fuPa", i.fuPa);

  const stressDiaM = Math.sqrt((4 * i.stressAreaM2) / Math.PI);
  const modulusM3 = (Math.PI * stressDiaM ** 3) / 32;
  const shearYieldN = 0.6 * i.fyPa * i.stressAreaM2;
  const shearBreakN = (i.fuPa > 500e6 ? 0.5 : 0.6) * i.fuPa * i.stressAreaM2;
  const leverM = i.gapM + 0.5 * stressDiaM;
  const bending = (momentNm: number, capN: number) =>
    i.gapM === 0 ? capN : Math.min(momentNm / leverM, capN);

  const onsetN = bending(i.fyPa * modulusM3, shearYieldN);
  const breakN = bending(1.2 * i.fuPa * modulusM3, shearBreakN);
  return [
    {
      mode: "bend-onset",
      axialN: i.fyPa * i.stressAreaM2,
      radialN: onsetN,
      lowN: onsetN,
      highN: bending((i.fyPa * stressDiaM ** 3) / 6, shearYieldN),
      source: "estimate",
      interactionExponent: 1,
    },
    {
      mode: "steel-break",
      axialN: i.fuPa * i.stressAreaM2,
      radialN: breakN,
      lowN: breakN,
      highN: shearBreakN,
      source: "estimate",
      interactionExponent: 2,
    },
  ];
}
