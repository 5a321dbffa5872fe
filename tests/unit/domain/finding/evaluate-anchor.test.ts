import { describe, expect, it } from "vitest";
import { DEFAULT_POLICY } from "@/lib/domain/policy";
import type { AnchorEvidence, GroupFacts } from "@/lib/domain/finding/evidence";
import { diffFindings } from "@/lib/domain/finding/diff-findings";
import { evaluateAnchor } from "@/lib/domain/finding/evaluate-anchor";
import { evaluateBolt } from "@/lib/domain/finding/evaluate-bolt";
import { loadOneLost } from "@/lib/domain/finding/rules/load-one-lost";
import { verdictOf } from "@/lib/domain/finding/verdict-of";
import type { Use } from "@/lib/domain/vocabulary";
import { anchor, findingsOf, group, inRock, NO_CARE, placement, report } from "@/tests/support/evidence";

const evaluate = (over: Partial<AnchorEvidence> = {}) => evaluateAnchor(anchor(over), DEFAULT_POLICY);

describe("load.one-lost", () => {
  const level = (use: Use, over: Partial<GroupFacts>) =>
    loadOneLost({ ...anchor({ group: group(over) }), use }, DEFAULT_POLICY)?.level ?? null;

  it("stops a single placement where people hang or belay and limits it where they lower off or abseil", () => {
    for (const use of ["highline", "rope_access", "belay"] as const)
      expect(level(use, { mainCount: 1 })).toBe("stop");
    for (const use of ["lower_off", "abseil"] as const) expect(level(use, { mainCount: 1 })).toBe("limit");
    for (const use of ["protection", "directional"] as const) expect(level(use, { mainCount: 1 })).toBeNull();
    expect(level("belay", { mainCount: 1, isRow: true })).toBeNull();
  });

  it("asks of a highline on two placements whose geometry is missing", () => {
    expect(level("highline", { mainCount: 2 })).toBe("ask");
    expect(level("highline", { mainCount: 2, hasGeometry: true })).toBeNull();
    expect(level("highline", { mainCount: 3 })).toBeNull();
    expect(level("belay", { mainCount: 2 })).toBeNull();
  });

  it("counts a backup as what is left", () => {
    expect(level("belay", { mainCount: 1, backupCount: 1 })).toBeNull();
    expect(level("highline", { mainCount: 1, backupCount: 1 })).toBe("ask");
    expect(level("highline", { mainCount: 2, backupCount: 1 })).toBeNull();
  });
});

describe("evaluateAnchor", () => {
  it("finds nothing against a sound anchor, with its use of the best bolt onset on record", () => {
    const result = evaluate();
    expect(result.verdict).toBe("nothing_against");
    // 12 kN on an onset of 20 kN with one bolt carrying all.
    expect(result.utilisation).toBeCloseTo(0.6, 9);
    expect(result.placeClass?.crc).toBe("II");
    expect(result.helpMost).toBeNull();
  });

  it("is as bad as its worst bolt", () => {
    const bent = inRock("highline", {
      group: group({ mainCount: 3 }),
      care: { ...NO_CARE, openReports: [report({ kind: "deformation", bendAngleDeg: 70 })] },
    });
    const result = evaluate({
      bolts: [
        { boltId: "b1", placementNumber: 1, evidence: inRock("highline") },
        { boltId: "b2", placementNumber: 2, evidence: bent },
      ],
    });
    expect(result.verdict).toBe("do_not_use");
    expect(result.bolts.map((bolt) => bolt.verdict)).toEqual(["nothing_against", "do_not_use"]);
    expect(result.codes).toContain("care.report-open");
  });

  it("is closed with its site while its bolts stay as they are", () => {
    const closures = [{ closureId: "c", reason: "Nesting", startsOn: "2026-05-01", endsOn: null }];
    const result = evaluate({ care: { ...NO_CARE, closures } });
    expect(result.verdict).toBe("do_not_use");
    expect(result.bolts[0]?.verdict).toBe("nothing_against");
  });

  it("tells a reason of several uses once, with all of them", () => {
    const place = { seaDistanceM: 500 };
    const bolt = { metal: "1.4301", hangerMetal: "1.4301" };
    const result = evaluate({
      uses: ["highline", "abseil"],
      bolts: (["highline", "abseil"] as const).map((use) => ({
        boltId: "b1",
        placementNumber: 1,
        evidence: inRock(use, { bolt, place, group: group({ mainCount: 3 }) }),
      })),
    });
    const classes = result.bolts[0]?.findings.filter((found) => found.code === "metal.class") ?? [];
    expect(classes.map((found) => found.uses)).toEqual([["highline", "abseil"]]);
    expect(result.bolts).toHaveLength(1);
  });

  it("asks of an anchor on which nothing is recorded, but not of one on trees", () => {
    expect(evaluate({ bolts: [] }).verdict).toBe("not_enough_known");
    const trees = group({
      mainCount: 2,
      hasGeometry: true,
      placements: [placement({ kind: "tree" }), placement({ kind: "tree" })],
    });
    expect(evaluate({ bolts: [], group: trees }).verdict).toBe("nothing_against");
  });

  it("names the one fact that settles most, over all its bolts", () => {
    const bolts = ["b1", "b2"].map((boltId, index) => ({
      boltId,
      placementNumber: index + 1,
      evidence: inRock("highline", {
        place: { seaDistanceM: null },
        group: group({ mainCount: 3 }),
        bolt: { embedmentMm: index === 0 ? null : 65 },
      }),
    }));
    const result = evaluate({ bolts });
    expect(result.verdict).toBe("not_enough_known");
    expect(result.helpMost?.fact).toBe("place.seaDistanceM");
    expect(result.helpMost?.label).toBe("the distance to the sea");
  });
});

describe("helpMost", () => {
  const fact = (e: Parameters<typeof evaluateBolt>[0]) =>
    evaluateBolt(e, DEFAULT_POLICY).helpMost?.fact ?? null;

  it("names the fact whose values settle the question", () => {
    expect(fact(inRock("belay", { bolt: { embedmentMm: null } }))).toBe("bolt.embedmentMm");
    expect(fact(inRock("highline", { rock: { ucsMpa: null } }))).toBe("rock.ucsMpa");
    expect(fact(inRock("protection", { bolt: { metal: null } }))).toBe("bolt.metal");
    expect(fact(inRock("belay", { bolt: { ratedRadialKn: null, ratedAxialKn: null, standard: null } }))).toBe(
      "bolt.rating",
    );
    expect(fact(inRock("highline", { bolt: { bendOnsetKn: null, bendOnsetBasis: "unknown" } }))).toBe(
      "bolt.bendOnsetKn",
    );
  });

  it("names the geometry when only the share is open, and the report when it is not confirmed", () => {
    expect(fact(inRock("highline", { bolt: { bendOnsetKn: 5 }, group: group({ mainCount: 3 }) }))).toBe(
      "group.geometry",
    );
    const doubtful = [report({ kind: "deformation", bendAngleDeg: 40, confirmed: false })];
    expect(fact(inRock("protection", { care: { ...NO_CARE, openReports: doubtful } }))).toBe("care.report");
  });

  it("names nothing when the verdict does not ask", () => {
    expect(fact(inRock("protection"))).toBeNull();
  });
});

describe("verdictOf", () => {
  it("is the worst level present; notes and nothing are the same", () => {
    const of = (...levels: ("note" | "limit" | "ask" | "stop")[]) =>
      verdictOf(levels.map((level) => ({ level })));
    expect(of()).toBe("nothing_against");
    expect(of("note")).toBe("nothing_against");
    expect(of("note", "limit")).toBe("within_limits");
    expect(of("ask", "limit")).toBe("not_enough_known");
    expect(of("limit", "stop", "ask")).toBe("do_not_use");
  });
});

describe("diffFindings", () => {
  const short = inRock("protection", { bolt: { embedmentMm: 40 } });

  it("tells what appeared, what cleared and what changed its level", () => {
    const before = findingsOf(short);
    const worse = findingsOf(inRock("protection", { bolt: { embedmentMm: 20, ratedRadialKn: 22 } }));
    const diff = diffFindings(before, worse);
    expect(diff.changed.map(({ before: b, after: a }) => [a.code, b.level, a.level])).toEqual([
      ["rock.embedment", "limit", "stop"],
    ]);
    expect(diff.appeared.map((found) => found.code).sort()).toEqual(["load.strength", "record.standard"]);
    expect(
      diffFindings(worse, before)
        .cleared.map((found) => found.code)
        .sort(),
    ).toEqual(["load.strength", "record.standard"]);
  });

  it("finds no difference between equal evidence", () => {
    expect(diffFindings(findingsOf(short), findingsOf(short))).toEqual({
      appeared: [],
      cleared: [],
      changed: [],
    });
  });
});
