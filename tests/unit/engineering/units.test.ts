import { describe, expect, it } from "vitest";
import {
  degToRad,
  eaNFromKnPerPercent,
  ftToM,
  GRAVITY_MS2,
  knToN,
  lbfToN,
  mmToM,
  nToKn,
  radToDeg,
} from "@/lib/engineering";

describe("units", () => {
  // NIST SP 811, appendix B: exact conversion factors.
  it("converts pound-force, foot and gravity by the factors NIST publishes", () => {
    expect(lbfToN(1)).toBeCloseTo(4.4482216152605, 12);
    expect(ftToM(1)).toBe(0.3048);
    expect(GRAVITY_MS2).toBe(9.80665);
  });

  // Arithmetic on the factor above: 5000 × 4.4482216152605 N.
  it("makes 5000 lbf 22.2411 kN", () => {
    expect(nToKn(lbfToN(5000))).toBeCloseTo(22.2411, 4);
  });

  it("turns a stretch of 1 % at 4 kN into an EA of 400 kN", () => {
    expect(eaNFromKnPerPercent(4)).toBe(400_000);
  });

  it("goes there and back without loss", () => {
    expect(nToKn(knToN(12.5))).toBe(12.5);
    expect(radToDeg(degToRad(30))).toBeCloseTo(30, 12);
    expect(degToRad(180)).toBe(Math.PI);
    expect(mmToM(250)).toBe(0.25);
  });

  it("refuses what is not a finite number and names the parameter", () => {
    for (const [name, call] of [
      ["kn", () => knToN(NaN)],
      ["n", () => nToKn(Infinity)],
      ["d", () => degToRad(NaN)],
      ["r", () => radToDeg(-Infinity)],
      ["k", () => eaNFromKnPerPercent(NaN)],
      ["mm", () => mmToM(NaN)],
      ["lbf", () => lbfToN(NaN)],
      ["ft", () => ftToM(NaN)],
    ] as const) {
      expect(call).toThrowError(RangeError);
      expect(call).toThrowError(new RegExp(`^${name} must be a finite number`));
    }
  });
});
