import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { BoltFacts } from "@/lib/domain/finding/evidence";
import type { Use } from "@/lib/domain/vocabulary";
import { BENT_ROD, choosing, found, group, inRock, levelOf } from "@/tests/support/evidence";

const rated = (ratedRadialKn: number | null, ratedAxialKn: number | null = 15): Partial<BoltFacts> => ({
  ratedRadialKn,
  ratedAxialKn,
  standard: null,
});

// Margins of 2.5 on the working and 1.25 on the peak case: common practice.
describe("load.strength, one bolt carrying all", () => {
  it.each<[Use, number, string | null]>([
    ["highline", 11.9, "stop"],
    ["highline", 12, "limit"],
    ["highline", 14.9, "limit"],
    ["highline", 15, null],
    ["protection", 19.9, "stop"],
    ["protection", 20, "limit"],
    ["protection", 24.9, "limit"],
    ["protection", 25, null],
    ["rope_access", 14.9, "stop"],
    ["rope_access", 18.7, "limit"],
    ["rope_access", 18.75, null],
    ["lower_off", 7.9, "stop"],
    ["lower_off", 9.9, "limit"],
    ["lower_off", 10, null],
    ["abseil", 14.9, "limit"],
    ["abseil", 15, null],
  ])("%s, rated %d kN across: %s", (use, kn, level) => {
    expect(levelOf(choosing(use, { bolt: rated(kn) }), "load.strength")).toBe(level);
  });

  it("holds a belay against a redirected fall of 20 kN and 5 kN straight out, unless the loads were typed", () => {
    expect(levelOf(choosing("belay", { bolt: rated(19.9) }), "load.strength")).toBe("stop");
    expect(levelOf(choosing("belay", { bolt: rated(24.9) }), "load.strength")).toBe("limit");
    expect(levelOf(choosing("belay", { bolt: rated(25, 4.9) }), "load.strength")).toBe("stop");
    const demand = { workingKn: 3, peakKn: 9, angleFromAxisDeg: 90, origin: "typed" };
    expect(levelOf(choosing("belay", { bolt: rated(19.9, 4.9), demand }), "load.strength")).toBeNull();
  });

  it("interacts with exponent 2: 12 kN at 45° needs sqrt sum, not sum", () => {
    // (8.485/15)² + (8.485/X)² = 1 at X = 10.29 (arithmetic).
    const demand = { workingKn: 1, peakKn: 12, angleFromAxisDeg: 45, origin: "typed" };
    expect(levelOf(choosing("highline", { bolt: rated(10.2), demand }), "load.strength")).toBe("stop");
    expect(levelOf(choosing("highline", { bolt: rated(10.4), demand }), "load.strength")).toBe("limit");
  });

  // EN 959:2018, 4.3.1 and 4.3.2: 15 kN axial, 25 kN radial. UIAA 123: 20 kN axial.
  it("lets a claimed EN 959 or UIAA 123 stand in for a rating that is missing, and no other name", () => {
    const claimed = (standard: string | null) =>
      found(choosing("highline", { bolt: { ...rated(null, null), standard } }), "load.unknown")?.text ?? "";
    expect(claimed("EN 959:2007")).not.toContain("rated strength");
    expect(claimed("UIAA 123")).not.toContain("rated strength");
    expect(claimed("EN 12275")).toContain("rated strength");
    expect(claimed(null)).toContain("rated strength");
  });

  it("keeps 2.5 times the working case where the peak is no larger", () => {
    const demand = { workingKn: 6, peakKn: 6, angleFromAxisDeg: 90, origin: "typed" };
    expect(levelOf(choosing("highline", { bolt: rated(14.9), demand }), "load.strength")).toBe("limit");
    expect(levelOf(choosing("highline", { bolt: rated(15), demand }), "load.strength")).toBeNull();
  });

  it("never reads a rating of zero as a pass", () => {
    expect(levelOf(choosing("protection", { bolt: rated(0) }), "load.strength")).toBe("stop");
    expect(levelOf(choosing("belay", { bolt: rated(25, 0) }), "load.strength")).toBe("stop");
  });

  it("names a rating that clears it", () => {
    fc.assert(
      fc.property(
        fc.constantFrom<Use>("highline", "protection", "abseil"),
        fc.double({ min: 1, max: 24, noNaN: true }),
        fc.double({ min: 1, max: 30, noNaN: true }),
        fc.integer({ min: 60, max: 120 }),
        (use, radial, peakKn, angleFromAxisDeg) => {
          const demand = { workingKn: peakKn / 3, peakKn, angleFromAxisDeg, origin: "typed" };
          const finding = found(choosing(use, { bolt: rated(radial, 30), demand }), "load.strength");
          if (finding === null) return;
          const needed = Number(/at least ([0-9.]+) kN across/.exec(finding.clearsWhen ?? "")?.[1]);
          expect(levelOf(choosing(use, { bolt: rated(needed, 30), demand }), "load.strength")).toBeNull();
        },
      ),
    );
  });
});

describe("load.strength in the rock, between the bounds of sharing", () => {
  const of = (use: Use, kn: number, mainCount: number) =>
    levelOf(inRock(use, { bolt: rated(kn), group: group({ mainCount }) }), "load.strength");

  it("stops only what an equal share breaks too; else asks in serious uses and limits in others", () => {
    expect(of("highline", 5.9, 2)).toBe("stop");
    expect(of("highline", 6, 2)).toBe("ask");
    expect(of("abseil", 5.9, 2)).toBe("stop");
    expect(of("abseil", 6, 2)).toBe("limit");
  });

  it("lets one bolt carry all while a type is being chosen, also for an anchor of three", () => {
    const e = inRock("highline", { bolt: rated(11), group: group({ mainCount: 3 }) });
    expect(levelOf(e, "load.strength")).toBe("ask");
    expect(levelOf({ ...e, context: "choosing" }, "load.strength")).toBe("stop");
  });

  it("sends a redirected belay fall through one bolt however many there are", () => {
    expect(of("belay", 19.9, 3)).toBe("stop");
  });
});

describe("load.unknown", () => {
  const noOnset = { bendOnsetKn: null, bendOnsetHighKn: null, bendOnsetBasis: "unknown" } as const;
  const level = (use: Use, bolt: Partial<BoltFacts>) => levelOf(choosing(use, { bolt }), "load.unknown");

  it("asks in every use when neither rating nor standard is known", () => {
    for (const use of [
      "highline",
      "protection",
      "belay",
      "lower_off",
      "abseil",
      "rope_access",
      "directional",
    ] as const) {
      expect(level(use, rated(null, null))).toBe("ask");
    }
  });

  it("asks for the axial rating only where something pulls along the axis", () => {
    expect(level("protection", { ...rated(25, null) })).toBeNull();
    expect(level("belay", { ...rated(25, null) })).toBe("ask");
    const demand = { workingKn: 2, peakKn: 5, angleFromAxisDeg: 60, origin: "typed" };
    expect(levelOf(choosing("protection", { bolt: rated(25, null), demand }), "load.unknown")).toBe("ask");
  });

  it("asks for an onset in serious uses, limits a belay on a bent rod, and notes it elsewhere", () => {
    expect(level("highline", noOnset)).toBe("ask");
    expect(level("rope_access", noOnset)).toBe("ask");
    expect(level("belay", { ...BENT_ROD, leverMm: null })).toBe("limit");
    expect(level("belay", noOnset)).toBe("note");
    expect(level("protection", noOnset)).toBe("note");
    expect(level("lower_off", { ...BENT_ROD, leverMm: null })).toBe("note");
  });

  it("is silent when an estimate can be made", () => {
    expect(level("highline", BENT_ROD)).toBeNull();
  });
});
