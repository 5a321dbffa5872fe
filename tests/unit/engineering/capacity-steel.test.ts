import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { estimateRodEye, estimateStud, stressAreaM2, utilisation } from "@/lib/engineering";
import type { Capacity } from "@/lib/engineering";
import { workedCase } from "@/tests/support/cases";
import { expectClose } from "@/tests/support/expect-close";

function mode(capacities: readonly Capacity[], wanted: Capacity["mode"]): Capacity {
  const found = capacities.find((one) => one.mode === wanted);
  if (found === undefined) throw new Error(`no ${wanted}`);
  return found;
}

describe("estimateRodEye", () => {
  it.each(["D1", "D2", "D3"])("agrees with worked case %s (closed form and fibre integration)", (id) => {
    const { input, output } = workedCase(id);
    const found = estimateRodEye({
      rodDiaM: input("rodDiaM"),
      rods: input("rods"),
      leverM: input("leverM"),
      fyPa: input("fyPa"),
      fuPa: input("fuPa"),
      fixityD: input("fixityD"),
    });
    const onset = mode(found, "bend-onset");
    expectClose(onset.lowN, output("onsetElasticN"));
    expectClose(onset.highN, output("onsetPlasticN"));
    expectClose(onset.axialN, output("axialYieldN"));
    const broken = mode(found, "steel-break");
    expectClose(broken.lowN, output("breakLeverN"));
    expectClose(broken.highN, output("breakShearN"));
    expectClose(broken.axialN, output("axialBreakN"));
  });

  it("adds pull-out and pull across as worked case D4 does (stress scan over the section)", () => {
    const { input, output } = workedCase("D4");
    const [onset] = estimateRodEye({
      rodDiaM: input("rodDiaM"),
      rods: input("rods"),
      leverM: input("leverM"),
      fyPa: input("fyPa"),
      fuPa: input("fyPa"),
      fixityD: input("fixityD"),
    });
    if (onset === undefined) throw new Error("no onset");
    expectClose(
      utilisation({ axialN: input("axialN"), radialN: input("radialN") }, onset),
      output("utilisation"),
    );
  });

  // Arithmetic on the EN 1992-4 form with M12 A4-70 (stress area 84.3 mm², ISO 898-1; Rm 700 MPa, ISO
  // 3506-1).
  it("breaks an M12 A4-70 at 9.16 kN on a lever of 10 mm", () => {
    const rodDiaM = Math.sqrt((4 * 84.27e-6) / Math.PI);
    const found = estimateRodEye({ rodDiaM, rods: 1, leverM: 0.01, fyPa: 450e6, fuPa: 700e6, fixityD: 0 });
    expectClose(mode(found, "steel-break").lowN, 9160, 1e-3);
  });

  // Common practice, no published source: thin double rods begin to bend near 4 kN and break near 40 kN.
  it("lands where riggers know an 8 mm double rod to bend and break", () => {
    const found = estimateRodEye({ rodDiaM: 0.008, rods: 2, leverM: 0.016, fyPa: 400e6, fuPa: 650e6 });
    const onset = mode(found, "bend-onset");
    expect(onset.lowN).toBeLessThan(4000);
    expect(onset.highN).toBeGreaterThan(4000);
    expectClose(mode(found, "steel-break").highN, 40_000, 0.05);
  });

  it("says more than shear can bear of no lever however short", () => {
    const [onset] = estimateRodEye({
      rodDiaM: 0.01,
      rods: 1,
      leverM: 0,
      fyPa: 200e6,
      fuPa: 500e6,
      fixityD: 0,
    });
    expectClose(onset?.radialN, 0.6 * 200e6 * Math.PI * 0.005 ** 2);
  });

  const rod = fc.record({
    rodDiaM: fc.double({ min: 0.004, max: 0.02, noNaN: true }),
    rods: fc.integer({ min: 1, max: 4 }),
    leverM: fc.double({ min: 0.002, max: 0.08, noNaN: true }),
    fyPa: fc.double({ min: 150e6, max: 900e6, noNaN: true }),
    fuPa: fc.double({ min: 900e6, max: 1200e6, noNaN: true }),
  });

  it("keeps elastic at or under plastic, and plastic at or under shear", () => {
    fc.assert(
      fc.property(rod, (i) => {
        const onset = mode(estimateRodEye(i), "bend-onset");
        const shearN = (0.6 * i.fyPa * i.rods * Math.PI * i.rodDiaM ** 2) / 4;
        expect(onset.lowN ?? NaN).toBeLessThanOrEqual((onset.highN ?? NaN) * (1 + 1e-12));
        expect(onset.highN ?? NaN).toBeLessThanOrEqual(shearN * (1 + 1e-12));
      }),
    );
  });

  it("goes with the square when every length is scaled", () => {
    fc.assert(
      fc.property(rod, fc.double({ min: 0.5, max: 3, noNaN: true }), (i, k) => {
        const small = estimateRodEye(i);
        const large = estimateRodEye({ ...i, rodDiaM: i.rodDiaM * k, leverM: i.leverM * k });
        small.forEach((one, index) => {
          expectClose(large[index]?.radialN, (one.radialN ?? NaN) * k ** 2, 1e-9);
          expectClose(large[index]?.axialN, (one.axialN ?? NaN) * k ** 2, 1e-9);
        });
      }),
    );
  });
});

describe("estimateStud", () => {
  it.each(["D5", "D6"])("agrees with worked case %s", (id) => {
    const { input, output } = workedCase(id);
    const found = estimateStud({
      stressAreaM2: input("asM2"),
      gapM: input("gapM"),
      fyPa: input("fyPa"),
      fuPa: input("fuPa"),
    });
    expectClose(mode(found, "bend-onset").axialN, output("axialYieldN"));
    expectClose(mode(found, "bend-onset").radialN, output("radialOnsetN"));
    expectClose(mode(found, "steel-break").axialN, output("axialBreakN"));
    expectClose(mode(found, "steel-break").radialN, output("radialBreakN"));
  });

  // ISO 898-1, class 8.8: ultimate / proof load of M10 46.4 / 33.7 kN and M12 67.4 / 48.9 kN (stress area ×
  // 800 / 580).
  it.each([
    ["M10", 58.0e-6, 800e6, 46_400],
    ["M10 proof", 58.0e-6, 580e6, 33_700],
    ["M12", 84.3e-6, 800e6, 67_400],
    ["M12 proof", 84.3e-6, 580e6, 48_900],
  ])("pulls %s of class 8.8 at the load ISO 898-1 tabulates", (_, stressAreaM2, fuPa, newton) => {
    const found = estimateStud({ stressAreaM2, gapM: 0, fyPa: fuPa, fuPa });
    expectClose(mode(found, "steel-break").axialN, newton, 0.002);
  });

  // ISO 898-1 tabulates stress areas in mm², to three figures.
  it.each([
    [8, 1.25, 36.6, 0.05],
    [10, 1.5, 58.0, 0.05],
    [12, 1.75, 84.3, 0.05],
    [16, 2, 157, 0.5],
  ])("starts from the stress area ISO 898-1 tabulates for M%d", (d, pitch, areaMm2, halfDigit) => {
    const found = stressAreaM2({ diaM: d / 1000, pitchM: pitch / 1000 }) * 1e6;
    expect(Math.abs(found - areaMm2)).toBeLessThanOrEqual(halfDigit);
  });

  // ISO 3506-1: class 50 Rm 500, above which the shear factor of EN 1992-4 drops from 0.6 to 0.5 (from
  // memory).
  it("takes the lower shear factor only above 500 MPa", () => {
    const shear = (fuPa: number) =>
      mode(estimateStud({ stressAreaM2: 58e-6, gapM: 0, fyPa: 210e6, fuPa }), "steel-break").radialN;
    expectClose(shear(500e6), 0.6 * 500e6 * 58e-6);
    expectClose(shear(700e6), 0.5 * 700e6 * 58e-6);
  });
});
