import { describe, expect, it } from "vitest";
import { governing, utilisation } from "@/lib/engineering";
import type { Capacity } from "@/lib/engineering";
import { workedCase } from "@/tests/support/cases";
import { expectClose } from "@/tests/support/expect-close";

describe("utilisation", () => {
  const capacity = (axialN: number | null, radialN: number | null, exponent: 1 | 1.5 | 2): Capacity => ({
    mode: "steel-break",
    axialN,
    radialN,
    source: "rating",
    interactionExponent: exponent,
  });

  // Arithmetic: 0.6^1.5 + 0.5^1.5.
  it("adds 0.6 and 0.5 to 0.818 with exponent 1.5", () => {
    expectClose(utilisation({ axialN: 600, radialN: 500 }, capacity(1000, 1000, 1.5)), 0.818, 1e-3);
  });

  it("is exactly 1 at the directional capacity of worked case D10", () => {
    const { input, output } = workedCase("D10");
    const angle = (input("thetaDeg") * Math.PI) / 180;
    const loadN = output("capacityN");
    const demand = { axialN: loadN * Math.cos(angle), radialN: loadN * Math.sin(angle) };
    expectClose(utilisation(demand, capacity(input("axialN"), input("radialN"), 1.5)), 1);
  });

  it("counts a push into the rock as no pull-out", () => {
    expect(utilisation({ axialN: -9000, radialN: 500 }, capacity(1000, 1000, 1))).toBe(0.5);
  });

  it("does not hold a direction against a mode that does not limit it", () => {
    expect(utilisation({ axialN: 500, radialN: 9000 }, capacity(1000, null, 1))).toBe(0.5);
  });
});

describe("governing", () => {
  const one = (over: Partial<Capacity>): Capacity => ({
    mode: "steel-break",
    axialN: 15_000,
    radialN: 25_000,
    source: "rating",
    interactionExponent: 2,
    ...over,
  });
  const across = { axialN: 0, radialN: 5000 };

  it("lets a test silence a rating and a rating an estimate of the same mode", () => {
    const test = one({ source: "test", radialN: 30_000 });
    const estimate = one({ source: "estimate", radialN: 10_000 });
    expect(governing([estimate, one({})], across).source).toBe("rating");
    expect(governing([estimate, one({}), test], across).source).toBe("test");
  });

  it("takes the lowest mode, comparing loads and not interaction sums", () => {
    const bend = one({ mode: "bend-onset", source: "test", radialN: 4000, interactionExponent: 1 });
    expect(governing([one({}), bend], across)).toEqual({
      mode: "bend-onset",
      utilisation: 1.25,
      source: "test",
    });
    // 0.7 of the steel (0.49 as a sum) comes before 0.6 of the bend onset.
    const steel = one({ radialN: 5000 / 0.7 });
    const stiff = one({ mode: "bend-onset", radialN: 5000 / 0.6, interactionExponent: 1 });
    expect(governing([stiff, steel], across).mode).toBe("steel-break");
  });

  it("lets an estimate of bending lower what a rating for breaking says", () => {
    const bend = one({ mode: "bend-onset", source: "estimate", radialN: 3000, interactionExponent: 1 });
    expect(governing([one({}), bend], across)).toMatchObject({ mode: "bend-onset", source: "estimate" });
  });

  it("refuses an empty list", () => {
    expect(() => governing([], across)).toThrowError(/^capacities must hold at least 1/);
  });
});
