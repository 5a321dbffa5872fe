import type { AxialRadial, Capacity } from "./capacity";
import { requireFinite, requireNotNegative, requirePositive } from "./guard";

/**
 * How far a demand uses up a capacity: 1 is the limit.
 *
 *     u = (N/NR)^a + (V/VR)^a        a = 1 bend onset, 1.5 rock, 2 steel
 *
 *   N  axial demand, N; a push into the rock counts as 0      NR, VR  axial and radial resistance, N
 *   V  radial demand, N
 *
 * A resistance of null does not limit that direction (a bond holds no statement about a sideways pull).
 * For a = 1 the value grows in step with the load; for a above 1 it does not: the factor by which the load
 * may still grow is u^(-1/a), not 1/u.
 *
 * Source: interaction of tension and shear as in EN 1992-4 (exponents from memory).
 * Worked example (also a test): N/NR 0.6, V/VR 0.5, a 1.5: 0.818.
 *
 * @throws RangeError when a demand is not finite, the radial demand is negative, or no resistance is given.
 */
export function utilisation(d: AxialRadial, c: Capacity): number {
  requireFinite("axialN", d.axialN);
  requireNotNegative("radialN", d.radialN);
  if (c.axialN === null && c.radialN === null) {
    throw new RangeError("capacity must give axialN or radialN, got neither");
  }
  if (c.axialN !== null) requirePositive("capacity axialN", c.axialN);
  if (c.radialN !== null) requirePositive("capacity radialN", c.radialN);
  const axial = c.axialN === null ? 0 : Math.max(0, d.axialN) / c.axialN;
  const radial = c.radialN === null ? 0 : d.radialN / c.radialN;
  return axial ** c.interactionExponent + radial ** c.interactionExponent;
}
