import type { Capacity } from "./capacity";
import { requireCount, requireNotNegative, requirePositive } from "./guard";

/**
 * Bend onset and break of an eye made of n separate round rods that stand out of the rock.
 *
 *     My = fy π d³/32     first yield of the outer fibre of one rod
 *     Mp = fy d³/6        whole section yielding (16/(3π) = 1.698 times My)
 *     la = e + φ d        lever to the point of fixity inside the rock
 *     bend onset  n α M / la                       never more than 0.6 fy n A
 *     break       1.2 W fu n α / la  ..  0.6 fu n A
 *     axial       yield fy n A, break fu n A
 *
 *   d  rod diameter, m            e  lever: rock face to the load, m
 *   n  rods that share it         φ  fixity: depth of crushed rock or glue, in diameters
 *   A  π d²/4, W  π d³/32         α  1 free head, 2 a head that cannot rotate
 *
 * Onset is a range: low = elastic (My) with φ 0.5, high = plastic (Mp) with φ 0; a φ that is given applies
 * to both ends. `radialN` is the low end. Breaking starts as lever-arm rupture (low, `radialN`); once bent,
 * the rods swing into tension and tend to the shear value (high).
 *
 * What it says: onset goes with d³ fy / e. From 8 to 10 mm rod doubles it, from 15 to 30 mm lever halves it.
 * Rods welded side by side, or loaded in their common plane, are stiffer: a bonus, not assumed.
 * Not for: plates, forged eyes, cracked or corroded rods.
 *
 * Source: section statics; shear with a lever arm in the form of EN 1992-4 (la = e + 0.5 d, M = 1.2 W fu;
 * from memory). Worked example (also a test): two 8 mm rods, fy 400 MPa, e 20 mm, φ 0: 2.01 to 3.41 kN.
 *
 * @throws RangeError when a length, stress or count is out of range.
 */
export function estimateRodEye(i: {
  rodDiaM: number;
  rods: number;
  leverM: number;
  fyPa: number;
  fuPa: number;
  fixityD?: number;
  alphaM?: 1 | 2;
}): Capacity[] {
  requirePositive("rodDiaM", i.rodDiaM);
  requireCount("rods", i.rods, 1);
  requireNotNegative("leverM", i.leverM);
  requirePositive("fyPa", i.fyPa);
  requirePositive("fuPa", i.fuPa);
  if (i.fixityD !== undefined) requireNotNegative("fixityD", i.fixityD);
  const alpha = i.alphaM ?? 1;
  if (alpha !== 1 && alpha !== 2) throw new RangeError(`alphaM must be 1 or 2, got ${String(i.alphaM)}`);

  const areaM2 = (i.rods * Math.PI * i.rodDiaM ** 2) / 4;
  const elasticModulusM3 = (Math.PI * i.rodDiaM ** 3) / 32;
  const plasticModulusM3 = i.rodDiaM ** 3 / 6;
  const shortLeverM = i.leverM + (i.fixityD ?? 0) * i.rodDiaM;
  const longLeverM = i.leverM + (i.fixityD ?? 0.5) * i.rodDiaM;
  const shearYieldN = 0.6 * i.fyPa * areaM2;
  const shearBreakN = 0.6 * i.fuPa * areaM2;
  // A lever of zero makes the bending term infinite: shear then governs, as it should.
  const byLever = (momentNm: number, leverM: number) => (i.rods * alpha * momentNm) / leverM;

  const onsetLowN = Math.min(byLever(i.fyPa * elasticModulusM3, longLeverM), shearYieldN);
  const onsetHighN = Math.min(byLever(i.fyPa * plasticModulusM3, shortLeverM), shearYieldN);
  const breakLowN = Math.min(byLever(1.2 * i.fuPa * elasticModulusM3, longLeverM), shearBreakN);
  return [
    {
      mode: "bend-onset",
      axialN: i.fyPa * areaM2,
      radialN: onsetLowN,
      lowN: onsetLowN,
      highN: onsetHighN,
      source: "estimate",
      interactionExponent: 1,
    },
    {
      mode: "steel-break",
      axialN: i.fuPa * areaM2,
      radialN: breakLowN,
      lowN: breakLowN,
      highN: shearBreakN,
      source: "estimate",
      interactionExponent: 2,
    },
  ];
}
