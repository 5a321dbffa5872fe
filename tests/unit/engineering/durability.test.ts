import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { coatingLifeYears, corrosionDepthM, cureRow, remainingRod } from "@/lib/engineering";
import { record, workedCase } from "@/tests/support/cases";

describe("corrosionDepthM and remainingRod", () => {
  it.each(["G1", "G2", "G3", "G4", "G5"])("agree with worked case %s (integration of the rate)", (id) => {
    const { input, output } = workedCase(id);
    const depthM = corrosionDepthM({
      firstYearM: input("rateMPerYear"),
      exponent: input("exponent"),
      years: input("years"),
    });
    expect(depthM).toBeCloseTo(output("depthM"), 12);
    const left = remainingRod({ rodDiaM: input("rodDiaM"), depthM });
    expect(left.diaM).toBeCloseTo(output("diaM"), 10);
    expect(left.tensionRatio).toBeCloseTo(output("tensionRatio"), 8);
    expect(left.bendingRatio).toBeCloseTo(output("bendingRatio"), 8);
  });

  // ISO 9223 C3 upper end 50 µm/yr, ISO 9224 exponent 0.523 (from memory): arithmetic.
  it("takes 239.6 µm of carbon steel in C3 in 20 years", () => {
    expect(corrosionDepthM({ firstYearM: 50e-6, exponent: 0.523, years: 20 }) * 1e6).toBeCloseTo(239.6, 1);
  });

  it("leaves nothing of a rod rusted through", () => {
    expect(remainingRod({ rodDiaM: 0.008, depthM: 0.004 })).toEqual({
      diaM: 0,
      tensionRatio: 0,
      bendingRatio: 0,
    });
    expect(remainingRod({ rodDiaM: 0.008, depthM: 0.02 }).diaM).toBe(0);
  });

  const law = {
    firstYearM: fc.double({ min: 1e-7, max: 7e-4, noNaN: true }),
    exponent: fc.double({ min: 0.4, max: 1, noNaN: true }),
  };

  it("never gives metal back, and slows down with the years", () => {
    fc.assert(
      fc.property(fc.record(law), fc.double({ min: 0, max: 60, noNaN: true }), (i, years) => {
        const at = (t: number) => corrosionDepthM({ ...i, years: t });
        expect(at(years + 1)).toBeGreaterThan(at(years));
        expect(at(years + 2) - at(years + 1)).toBeLessThanOrEqual((at(years + 1) - at(years)) * (1 + 1e-9));
      }),
    );
  });

  it("has no jump at 20 years", () => {
    fc.assert(
      fc.property(fc.record(law), (i) => {
        const before = corrosionDepthM({ ...i, years: 20 - 1e-7 });
        const after = corrosionDepthM({ ...i, years: 20 + 1e-7 });
        expect(Math.abs(after - before)).toBeLessThan(1e-9);
      }),
    );
  });
});

describe("coatingLifeYears", () => {
  it.each(["G6", "G7", "G8"])("agrees with worked case %s (bisection on depth)", (id) => {
    const { input, output } = workedCase(id);
    const found = coatingLifeYears({
      thicknessM: input("thicknessM"),
      firstYearM: input("rateMPerYear"),
      exponent: input("exponent"),
    });
    expect(found).toBeCloseTo(output("years"), 6);
  });

  // ISO 9224 power law with its straight line from 20 years on (form from memory): 12 µm in C2, upper end
  // 0.7 µm.
  it("gives 12 µm in C2 32.32 years, where the plain power law would give 32.96", () => {
    expect(coatingLifeYears({ thicknessM: 12e-6, firstYearM: 0.7e-6, exponent: 0.813 })).toBeCloseTo(
      32.32,
      2,
    );
    expect((12 / 0.7) ** (1 / 0.813)).toBeCloseTo(32.96, 2);
  });

  it("is corrosionDepthM turned round", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-6, max: 2e-4, noNaN: true }),
        fc.double({ min: 1e-7, max: 7e-4, noNaN: true }),
        fc.double({ min: 0.4, max: 1, noNaN: true }),
        (thicknessM, firstYearM, exponent) => {
          const years = coatingLifeYears({ thicknessM, firstYearM, exponent });
          const depthM = corrosionDepthM({ firstYearM, exponent, years });
          expect(Math.abs(depthM - thicknessM)).toBeLessThanOrEqual(1e-9 * thicknessM);
        },
      ),
    );
  });
});

describe("cureRow", () => {
  it.each(["H5", "H6", "H7", "H8", "H9", "H10"])("agrees with worked case %s", (id) => {
    const { input, output, raw } = workedCase(id);
    const rows = record(raw)["table"];
    if (!Array.isArray(rows)) throw new Error("no table");
    const table = rows.map((row: unknown) => ({
      minTempC: Number(record(row)["tMinC"]),
      workMin: Number(record(row)["workMin"]),
      cureMin: Number(record(row)["cureMin"]),
    }));
    for (const ordered of [table, [...table].reverse()]) {
      const found = cureRow(ordered, input("temperatureC"));
      expect(found?.cureMin ?? -1).toBe(output("cureMin"));
      expect(found?.workMin ?? -1).toBe(output("workMin"));
    }
  });

  it("has no row in an empty table", () => {
    expect(cureRow([], 20)).toBeNull();
  });
});
