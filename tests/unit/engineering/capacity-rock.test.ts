import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { edgeBreakoutN, estimateBond, estimateRockCone, groupFactor } from "@/lib/engineering";
import { record, workedCase } from "@/tests/support/cases";
import { expectClose } from "@/tests/support/expect-close";

describe("estimateBond", () => {
  it("agrees with worked case D7", () => {
    const { input, output } = workedCase("D7");
    const i = {
      holeDiaM: input("holeDiaM"),
      barDiaM: 0.01,
      embedM: input("hefM"),
      tauHolePa: input("tauPa"),
    };
    expectClose(estimateBond(i).axialN, output("pulloutN"));
  });

  // Arithmetic on π d h τ.
  it("holds 30.16 kN in a 12 × 100 mm hole at 8 MPa", () => {
    expectClose(
      estimateBond({ holeDiaM: 0.012, barDiaM: 0.01, embedM: 0.1, tauHolePa: 8e6 }).axialN,
      30_159,
      1e-4,
    );
  });

  it("takes the weaker of hole wall and bar", () => {
    const i = { holeDiaM: 0.014, barDiaM: 0.01, embedM: 0.09, tauHolePa: 8e6 };
    expectClose(estimateBond({ ...i, tauBarPa: 8e6 }).axialN, Math.PI * 0.01 * 0.09 * 8e6);
    expect(estimateBond({ ...i, tauBarPa: 80e6 }).axialN).toBe(estimateBond(i).axialN);
  });
});

describe("estimateRockCone", () => {
  it("agrees with worked case D8 (also in inch-pound units)", () => {
    const { input, output } = workedCase("D8");
    const found = estimateRockCone({
      embedM: input("hefM"),
      ucsPa: input("ucsPa"),
      quality: input("quality"),
      k: input("k"),
      ucsCapPa: input("ucsCapPa"),
    });
    expectClose(found.axialN, output("coneN"));
    expectClose(found.lowN, output("coneN") / 2);
    expectClose(found.highN, output("coneN") * 2);
  });

  it("gains nothing from rock stronger than the concrete it was calibrated on", () => {
    const at = (ucsPa: number) => estimateRockCone({ embedM: 0.1, ucsPa, quality: 0.5 }).axialN;
    expect(at(200e6)).toBe(at(55e6));
    expect(at(54e6) ?? NaN).toBeLessThan(at(55e6) ?? NaN);
  });
});

describe("groupFactor", () => {
  it("agrees with worked case D9 (coordinate sweep and inclusion-exclusion)", () => {
    const { input, output, raw } = workedCase("D9");
    const points = record(raw)["pointsM"];
    if (!Array.isArray(points)) throw new Error("no points");
    const pointsM = points.map((point: unknown): readonly [number, number] => {
      if (!Array.isArray(point)) throw new Error("no point");
      return [Number(point[0]), Number(point[1])];
    });
    const found = groupFactor({ pointsM, embedM: input("hefM"), edges: { vMinM: -0.1 } });
    expectClose(found.areaRatio, output("areaRatio"));
    expectClose(found.psiEdge, output("psiEdge"));
    expectClose(found.perBoltFactor, output("perBoltFactor"));
    expectClose(found.perBoltFactor * 3, output("groupFactor"));
  });

  // ACI 318-19 design guide: 4 × 4 group, h 5.75 in, spacings 9 and 6 in, one edge at 8 in; recomputed
  // within 0.03 %.
  it("reproduces the projected areas of the ACI 318-19 worked example", () => {
    const inch = 0.0254;
    const pointsM = [0, 1, 2, 3].flatMap((i) =>
      [0, 1, 2, 3].map((j): readonly [number, number] => [9 * i * inch, 6 * j * inch]),
    );
    const found = groupFactor({ pointsM, embedM: 5.75 * inch, edges: { vMinM: -8 * inch } });
    expectClose(found.areaRatio * 9 * 5.75 ** 2, 1532.16, 3e-4);
    expectClose(found.psiEdge, 0.978, 3e-4);
    const nbLb = 21 * Math.sqrt(4000) * 5.75 ** 1.5;
    expectClose(nbLb, 18_313, 3e-4);
    expectClose(nbLb * found.areaRatio * found.psiEdge, 92_221, 3e-4);
  });

  // Arithmetic on 3 h: 160 mm and 240 mm at h 80 mm.
  it.each([
    [0.16, 5 / 3],
    [0.24, 2],
    [0.5, 2],
    [0, 1],
  ])("gives a pair %d m apart at h 80 mm an area ratio of %d", (apartM, ratio) => {
    expectClose(
      groupFactor({
        pointsM: [
          [0, 0],
          [apartM, 0],
        ],
        embedM: 0.08,
      }).areaRatio,
      ratio,
      1e-9,
    );
  });

  it("gives a pair the same factor however the face was measured", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 0.5, noNaN: true }),
        fc.double({ min: 0, max: 6.3, noNaN: true }),
        (apartM, turn) => {
          const straight = groupFactor({
            pointsM: [
              [0, 0],
              [apartM, 0],
            ],
            embedM: 0.1,
          });
          const turned = groupFactor({
            pointsM: [
              [1, 1],
              [1 + apartM * Math.cos(turn), 1 + apartM * Math.sin(turn)],
            ],
            embedM: 0.1,
          });
          expectClose(turned.areaRatio, straight.areaRatio, 1e-9);
        },
      ),
    );
  });

  it("keeps the area ratio between 1 and the number of bolts", () => {
    const point = fc.tuple(
      fc.double({ min: -1, max: 1, noNaN: true }),
      fc.double({ min: -1, max: 1, noNaN: true }),
    );
    fc.assert(
      fc.property(fc.array(point, { minLength: 1, maxLength: 6 }), (pointsM) => {
        const { areaRatio } = groupFactor({ pointsM, embedM: 0.1 });
        expect(areaRatio).toBeGreaterThanOrEqual(1 - 1e-9);
        expect(areaRatio).toBeLessThanOrEqual(pointsM.length + 1e-9);
      }),
    );
  });
});

describe("edgeBreakoutN", () => {
  it("agrees with worked case D11 (direct and logarithmic form)", () => {
    const { input, output } = workedCase("D11");
    const found = edgeBreakoutN({
      boltDiaM: input("diaM"),
      embedM: input("hefM"),
      edgeM: input("edgeM"),
      ucsPa: input("ucsPa"),
      quality: input("quality"),
      k9: input("k9"),
    });
    expectClose(found, output("shearN"));
  });
});
