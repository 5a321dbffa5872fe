import { describe, expect, it } from "vitest";
import {
  coatingLifeYears,
  corrosionDepthM,
  cureRow,
  edgeBreakoutN,
  estimateBond,
  estimateRockCone,
  estimateRodEye,
  estimateStud,
  groupFactor,
  remainingRod,
  utilisation,
} from "@/lib/engineering";

type Numbers = Record<string, number>;

/** Each function with good numbers, and which of them must be above zero or may be zero. */
const FUNCTIONS = [
  {
    name: "estimateRodEye",
    call: (n: Numbers) =>
      estimateRodEye({ rodDiaM: 0.01, rods: 2, leverM: 0.02, fyPa: 2e8, fuPa: 5e8, ...n }),
    positive: ["rodDiaM", "rods", "fyPa", "fuPa"],
    notNegative: ["leverM", "fixityD"],
  },
  {
    name: "estimateStud",
    call: (n: Numbers) => estimateStud({ stressAreaM2: 58e-6, gapM: 0, fyPa: 2e8, fuPa: 5e8, ...n }),
    positive: ["stressAreaM2", "fyPa", "fuPa"],
    notNegative: ["gapM"],
  },
  {
    name: "estimateBond",
    call: (n: Numbers) => estimateBond({ holeDiaM: 0.014, barDiaM: 0.01, embedM: 0.1, tauHolePa: 8e6, ...n }),
    positive: ["holeDiaM", "barDiaM", "embedM", "tauHolePa", "tauBarPa"],
    notNegative: [],
  },
  {
    name: "estimateRockCone",
    call: (n: Numbers) => estimateRockCone({ embedM: 0.1, ucsPa: 5e7, quality: 0.5, ...n }),
    positive: ["embedM", "ucsPa", "quality", "k", "ucsCapPa"],
    notNegative: [],
  },
  {
    name: "edgeBreakoutN",
    call: (n: Numbers) =>
      edgeBreakoutN({ boltDiaM: 0.012, embedM: 0.1, edgeM: 0.1, ucsPa: 5e7, quality: 0.5, ...n }),
    positive: ["boltDiaM", "embedM", "edgeM", "ucsPa", "quality", "k9"],
    notNegative: [],
  },
  {
    name: "groupFactor",
    call: (n: Numbers) => groupFactor({ pointsM: [[0, 0]], embedM: 0.1, ...n }),
    positive: ["embedM"],
    notNegative: [],
  },
  {
    name: "corrosionDepthM",
    call: (n: Numbers) => corrosionDepthM({ firstYearM: 5e-5, exponent: 0.5, years: 10, ...n }),
    positive: ["firstYearM", "exponent"],
    notNegative: ["years"],
  },
  {
    name: "remainingRod",
    call: (n: Numbers) => remainingRod({ rodDiaM: 0.01, depthM: 0, ...n }),
    positive: ["rodDiaM"],
    notNegative: ["depthM"],
  },
  {
    name: "coatingLifeYears",
    call: (n: Numbers) => coatingLifeYears({ thicknessM: 8e-6, firstYearM: 2e-6, exponent: 0.8, ...n }),
    positive: ["thicknessM", "firstYearM", "exponent"],
    notNegative: [],
  },
];

describe.each(FUNCTIONS)("$name", ({ call, positive, notNegative }) => {
  it("answers good numbers", () => {
    expect(() => call({})).not.toThrow();
  });

  it.each([...positive, ...notNegative])("refuses NaN, infinity and a negative %s by name", (parameter) => {
    for (const bad of [NaN, Infinity, -1]) {
      expect(() => call({ [parameter]: bad })).toThrowError(RangeError);
      expect(() => call({ [parameter]: bad })).toThrowError(new RegExp(`^${parameter} must be`));
    }
  });

  if (positive.length > 0) {
    it.each(positive)("refuses a %s of 0", (parameter) => {
      expect(() => call({ [parameter]: 0 })).toThrowError(new RegExp(`^${parameter} must be`));
    });
  }

  if (notNegative.length > 0) {
    it.each(notNegative)("accepts a %s of 0", (parameter) => {
      expect(() => call({ [parameter]: 0 })).not.toThrow();
    });
  }
});

describe("bounds that are not about sign", () => {
  it("refuse half a rod, a quality above 1, a bar thicker than its hole, a point beyond an edge", () => {
    const eye = { rodDiaM: 0.01, leverM: 0.02, fyPa: 2e8, fuPa: 5e8 };
    expect(() => estimateRodEye({ ...eye, rods: 1.5 })).toThrowError(
      /^rods must be a whole number of 1 or more/,
    );
    expect(() => estimateRockCone({ embedM: 0.1, ucsPa: 5e7, quality: 1.01 })).toThrowError(/at most 1/);
    expect(() => estimateRockCone({ embedM: 0.1, ucsPa: 5e7, quality: 1 })).not.toThrow();
    expect(() => estimateBond({ holeDiaM: 0.01, barDiaM: 0.012, embedM: 0.1, tauHolePa: 8e6 })).toThrowError(
      /^barDiaM must be at most holeDiaM/,
    );
    expect(() => groupFactor({ pointsM: [[0, 0]], embedM: 0.1, edges: { uMaxM: -0.1 } })).toThrowError(
      /^edges/,
    );
    expect(() => groupFactor({ pointsM: [], embedM: 0.1 })).toThrowError(/^pointsM must hold at least 1/);
    expect(() => cureRow([], NaN)).toThrowError(/^tempC must be a finite number/);
  });

  it("refuse a demand or a capacity that says nothing", () => {
    const capacity = {
      mode: "bond",
      axialN: null,
      radialN: null,
      source: "estimate",
      interactionExponent: 1.5,
    } as const;
    expect(() => utilisation({ axialN: 1, radialN: 1 }, capacity)).toThrowError(/^capacity must give/);
    expect(() => utilisation({ axialN: 1, radialN: -1 }, { ...capacity, axialN: 5 })).toThrowError(
      /^radialN/,
    );
    expect(() => utilisation({ axialN: NaN, radialN: 1 }, { ...capacity, axialN: 5 })).toThrowError(
      /^axialN/,
    );
  });
});
