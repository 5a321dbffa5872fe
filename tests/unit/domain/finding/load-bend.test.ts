import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { BoltFacts } from "@/lib/domain/finding/evidence";
import type { OnsetBasis, Use } from "@/lib/domain/vocabulary";
import { BENT_ROD, choosing, found, group, inRock, levelOf, placement } from "@/tests/support/evidence";

const onset = (
  bendOnsetKn: number,
  bendOnsetBasis: OnsetBasis = "tested",
  high = bendOnsetKn,
): Partial<BoltFacts> => ({
  bendOnsetKn,
  bendOnsetHighKn: high,
  bendOnsetBasis,
});
const bend = (use: Use, bolt: Partial<BoltFacts>) => levelOf(choosing(use, { bolt }), "load.bend");

// Bounds and demand: common practice, written down as this register's rules. Highline 6/12 kN, rope access
// 6/15, protection 8/20 (peak: strength only), belay 6/12, lower-off 3/8, abseil 3/12.
describe("load.bend with a tested onset, one bolt carrying all", () => {
  it.each<[Use, number, string | null]>([
    ["highline", 11.9, "stop"],
    ["highline", 12, "limit"],
    ["highline", 17.9, "limit"],
    ["highline", 18, null],
    ["rope_access", 5.9, "stop"],
    ["rope_access", 6, "limit"],
    ["rope_access", 22.4, "limit"],
    ["rope_access", 22.5, null],
    ["protection", 2.9, "stop"],
    ["protection", 3, "limit"],
    ["protection", 7.9, "limit"],
    ["protection", 8, null],
    ["directional", 7.9, "limit"],
    ["belay", 2.9, "stop"],
    ["belay", 5.9, "limit"],
    ["belay", 6, "note"],
    ["belay", 11.9, "note"],
    ["belay", 12, null],
    ["lower_off", 2.9, "stop"],
    ["lower_off", 3, "note"],
    ["lower_off", 8, null],
    ["abseil", 11.9, "note"],
    ["abseil", 12, null],
  ])("%s, onset %d kN: %s", (use, kn, level) => {
    expect(bend(use, onset(kn))).toBe(level);
    expect(bend(use, onset(kn, "maker"))).toBe(level);
  });

  it("judges a scatter of tests by its low end", () => {
    expect(bend("highline", onset(11, "tested", 30))).toBe("stop");
  });

  it("adds pull-out and pull across linearly, taking the rated axial strength where no axial onset is known", () => {
    // 12 kN at 60° from the axis: 6 out, 10.39 across; 6/15 + 10.39/X = 1 at X = 17.32 (arithmetic).
    const at = (bendOnsetKn: number, axial: number | null = null) =>
      levelOf(
        choosing("highline", {
          bolt: { ...onset(bendOnsetKn), bendOnsetAxialKn: axial },
          demand: { workingKn: 6, peakKn: 12, angleFromAxisDeg: 60, origin: "typed" },
        }),
        "load.bend",
      );
    expect(at(17.3)).toBe("stop");
    expect(at(17.4)).toBe("limit");
    expect(at(17.4, 10)).toBe("stop");
    expect(at(17.4, 60)).toBe("limit");
  });

  it("does not count a push into the rock as pull-out", () => {
    const demand = { workingKn: 6, peakKn: 12, angleFromAxisDeg: 150, origin: "typed" };
    expect(levelOf(choosing("highline", { bolt: onset(9), demand }), "load.bend")).toBeNull();
  });
});

describe("load.bend with an estimated onset", () => {
  it("takes a single estimate as both ends: it stops a highline above and limits it below", () => {
    expect(bend("highline", onset(11.9, "estimate"))).toBe("stop");
    expect(bend("highline", onset(12, "estimate"))).toBe("limit");
    expect(bend("highline", onset(100, "estimate"))).toBe("limit");
  });

  it("asks where the load lies between the ends", () => {
    expect(bend("highline", onset(8, "estimate", 14))).toBe("ask");
    expect(bend("rope_access", onset(8, "estimate", 14.9))).toBe("stop");
    expect(bend("rope_access", onset(8, "estimate", 15))).toBe("ask");
  });

  it("only limits or notes the other uses", () => {
    expect(bend("protection", onset(2, "estimate"))).toBe("limit");
    expect(bend("protection", onset(8, "estimate"))).toBe("note");
    expect(bend("belay", onset(100, "estimate"))).toBe("note");
  });

  it("treats a number of unknown origin as an estimate, never as a test", () => {
    expect(bend("highline", onset(100, "unknown"))).toBe("limit");
  });

  it("estimates a bent rod itself: 0.84 to 3.41 kN for two 8 mm rods of 1.4401 on 20 mm", () => {
    const finding = found(choosing("highline", { bolt: BENT_ROD }), "load.bend");
    // Section statics: 2·200·π8³/32/(20+4) and 2·400·8³/6/20 in N and mm.
    expect(finding?.numbers["onsetKn"]).toBeCloseTo((2 * 200 * Math.PI * 8 ** 3) / 32 / 24 / 1000, 6);
    expect(finding?.numbers["onsetHighKn"]).toBeCloseTo((2 * 400 * 8 ** 3) / 6 / 20 / 1000, 6);
    expect(finding?.level).toBe("stop");
    expect(finding?.text).toContain("never a rating");
  });

  it("uses the table for titanium at both ends, as cold bending does not strengthen it alike", () => {
    const finding = found(choosing("highline", { bolt: { ...BENT_ROD, metal: "ti-5" } }), "load.bend");
    // ASTM B348 grade 5: 828 MPa.
    expect(finding?.numbers["onsetHighKn"]).toBeCloseTo((2 * 828 * 8 ** 3) / 6 / 20 / 1000, 6);
  });

  it("estimates nothing without metal, diameter or lever, for one rod, or for another form", () => {
    for (const bolt of [
      { metal: null },
      { metal: "1.4306" },
      { rodDiameterMm: null },
      { leverMm: null },
      { rodCount: 1 },
      { form: "glued_eye" as const },
    ]) {
      expect(levelOf(choosing("highline", { bolt: { ...BENT_ROD, ...bolt } }), "load.bend")).toBeNull();
      expect(levelOf(choosing("highline", { bolt: { ...BENT_ROD, ...bolt } }), "load.unknown")).toBe("ask");
    }
  });
});

describe("load.bend in the rock, between the bounds of sharing", () => {
  const of = (use: Use, bolt: Partial<BoltFacts>, mainCount: number) =>
    levelOf(inRock(use, { bolt, group: group({ mainCount }) }), "load.bend");

  it("stops only what fails even in an equal share, and asks when only one-carries-all fails", () => {
    expect(of("highline", onset(3.9), 3)).toBe("stop");
    expect(of("highline", onset(4), 3)).toBe("ask");
    expect(of("highline", onset(4), 2)).toBe("stop");
    expect(of("rope_access", onset(3), 2)).toBe("ask");
    expect(of("highline", onset(12), 3)).toBe("limit");
    expect(of("highline", onset(18), 3)).toBeNull();
  });

  it("lets a stop for an onset under 3 kN stand, whatever the share", () => {
    expect(of("belay", onset(2.9), 4)).toBe("stop");
  });

  it("gives protection, directionals and rows no friendlier share", () => {
    expect(of("protection", onset(2.9), 4)).toBe("stop");
    const row = group({ mainCount: 8, isRow: true });
    expect(levelOf(inRock("rope_access", { bolt: onset(5), group: row }), "load.bend")).toBe("stop");
  });

  it("shares a backup's load among the backups", () => {
    const of3 = (backupCount: number) =>
      levelOf(
        inRock("highline", {
          bolt: onset(7),
          group: group({ mainCount: 3, backupCount }),
          placement: placement({ role: "backup" }),
        }),
        "load.bend",
      );
    expect(of3(1)).toBe("stop");
    expect(of3(2)).toBe("ask");
  });

  it("says nothing about a bolt at an edge, which carries no load of the use", () => {
    const e = inRock("highline", { bolt: onset(1), placement: placement({ role: "edge" }) });
    expect(levelOf(e, "load.bend")).toBeNull();
    expect(levelOf(e, "load.unknown")).toBeNull();
  });
});

describe("what clears load.bend", () => {
  const number = (words: string | null | undefined, before: string) =>
    Number(new RegExp(`${before} ([0-9.]+) kN`).exec(words ?? "")?.[1] ?? NaN);

  it("names an onset that clears it, computed for every use, load and angle", () => {
    fc.assert(
      fc.property(
        fc.constantFrom<Use>("highline", "rope_access", "protection", "belay", "lower_off", "abseil"),
        fc.double({ min: 0.1, max: 20, noNaN: true }),
        fc.double({ min: 0.5, max: 30, noNaN: true }),
        fc.integer({ min: 45, max: 135 }),
        (use, lowKn, peakKn, angleFromAxisDeg) => {
          const demand = { workingKn: peakKn / 2, peakKn, angleFromAxisDeg, origin: "typed" };
          const finding = found(choosing(use, { bolt: onset(lowKn), demand }), "load.bend");
          const needed = number(finding?.clearsWhen, "at least");
          if (finding === null || Number.isNaN(needed)) return;
          expect(needed).toBeGreaterThan(lowKn);
          expect(levelOf(choosing(use, { bolt: onset(needed), demand }), "load.bend")).toBeNull();
        },
      ),
    );
  });

  it("names a load that clears it", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 3, max: 20, noNaN: true }),
        fc.double({ min: 1, max: 30, noNaN: true }),
        (lowKn, peakKn) => {
          const at = (kn: number) =>
            found(
              choosing("highline", {
                bolt: onset(lowKn),
                demand: { workingKn: 0, peakKn: kn, angleFromAxisDeg: 90, origin: "typed" },
              }),
              "load.bend",
            );
          const finding = at(peakKn);
          if (finding === null) return;
          const allowed = number(finding.clearsWhen, "brings at most");
          expect(allowed).toBeLessThan(peakKn);
          expect(at(allowed)).toBeNull();
          expect(at(allowed + 0.11)).not.toBeNull();
        },
      ),
    );
  });
});
