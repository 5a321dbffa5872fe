import { requirePositive, requireWithin } from "./guard";
import { UCS_CAP_PA } from "./rock-cone";

/**
 * Sideways pull that breaks the rock out towards a free edge, N.
 *
 *     V = k9 d^α h^β √f c^1.5 ψ        α = 0.1 √(h/c)    β = 0.1 (d/c)^0.2
 *
 *   d  bolt diameter, mm    h  effective depth, mm    c  distance to the edge, mm    f  min(UCS, 55 MPa), MPa
 *   k9  1.7, the cracked-concrete level    ψ  quality of the rock, as for the cone
 *
 * Dimensional: newton, mm and MPa. An estimate with the doubt of the cone; it may only lower a verdict.
 * Not for: a group, a corner, or a pull away from the edge.
 *
 * Source: EN 1992-4 concrete edge failure (from memory; k9 from memory).
 * Worked example (also a test): 12 mm, 100 mm deep, 120 mm from the edge, UCS 40 MPa, ψ 0.5: 11.9 kN.
 *
 * @throws RangeError when an argument is not positive or the quality is above 1.
 */
export function edgeBreakoutN(i: {
  boltDiaM: number;
  embedM: number;
  edgeM: number;
  ucsPa: number;
  quality: number;
  k9?: number;
}): number {
  requirePositive("boltDiaM", i.boltDiaM);
  requirePositive("embedM", i.embedM);
  requirePositive("edgeM", i.edgeM);
  requirePositive("ucsPa", i.ucsPa);
  requireWithin("quality", i.quality, 0, 1);
  const k9 = i.k9 ?? 1.7;
  requirePositive("k9", k9);

  const alpha = 0.1 * Math.sqrt(i.embedM / i.edgeM);
  const beta = 0.1 * (i.boltDiaM / i.edgeM) ** 0.2;
  const strengthMpa = Math.min(i.ucsPa, UCS_CAP_PA) / 1e6;
  return (
    k9 *
    (i.boltDiaM * 1000) ** alpha *
    (i.embedM * 1000) ** beta *
    Math.sqrt(strengthMpa) *
    (i.edgeM * 1000) ** 1.5 *
    i.quality
  );
}
