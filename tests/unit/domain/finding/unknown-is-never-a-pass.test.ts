import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DEFAULT_POLICY } from "@/lib/domain/policy";
import { evaluateBolt } from "@/lib/domain/finding/evaluate-bolt";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import type { RuleCode, Use } from "@/lib/domain/vocabulary";
import { BENT_ROD, inRock, ORDINARY_BOLT } from "@/tests/support/evidence";

/** A fact that may be forgotten, and the notes by which a use that must not turn grey still names the gap. */
interface Forgettable {
  fact: string;
  forget: (e: BoltEvidence) => BoltEvidence;
  named: readonly RuleCode[];
}

const boltFact = (fact: keyof BoltEvidence["bolt"], ...named: RuleCode[]): Forgettable => ({
  fact: `bolt.${fact}`,
  forget: (e) => ({ ...e, bolt: { ...e.bolt, [fact]: null } }),
  named,
});

const FACTS: readonly Forgettable[] = [
  boltFact("metal", "metal.unknown"),
  boltFact("hangerMetal", "metal.mixed"),
  boltFact("rodDiameterMm", "load.unknown", "eye.radius"),
  boltFact("leverMm", "load.unknown"),
  boltFact("ratedRadialKn", "load.unknown"),
  boltFact("ratedAxialKn", "load.unknown"),
  boltFact("bendOnsetKn", "load.unknown", "load.bend"),
  boltFact("method", "record.missing"),
  boltFact("embedmentMm", "rock.embedment"),
  boltFact("holeDiameterMm", "rock.embedment"),
  boltFact("shankDiameterMm", "rock.embedment"),
  boltFact("installedOn", "record.missing", "care.overdue"),
  {
    fact: "place.seaDistanceM",
    forget: (e) => ({ ...e, place: { ...e.place, seaDistanceM: null } }),
    named: [],
  },
  { fact: "place.washing", forget: (e) => ({ ...e, place: { ...e.place, washing: null } }), named: [] },
  { fact: "rock.ucsMpa", forget: (e) => ({ ...e, rock: { ucsMpa: null } }), named: ["rock.method"] },
];

const evidence: fc.Arbitrary<BoltEvidence> = fc
  .record({
    use: fc.constantFrom<Use>("highline", "rope_access", "belay", "protection", "lower_off", "abseil"),
    context: fc.constantFrom("choosing" as const, "in_rock" as const),
    build: fc.constantFrom(ORDINARY_BOLT, BENT_ROD, { ...BENT_ROD, form: "glued_eye" as const }),
    metal: fc.constantFrom("1.4301", "1.4401", "1.4462", "1.4547", "ti-2", "zinc-plated"),
    rodDiameterMm: fc.constantFrom(6, 8, 10, 12, 16),
    ratedRadialKn: fc.constantFrom(12, 20, 25, 40),
    bendOnsetKn: fc.constantFrom(null, 2, 5, 9, 14, 25),
    embedmentMm: fc.constantFrom(30, 45, 60, 75, 100, 130),
    installedOn: fc.constantFrom("1985-01-01", "2005-01-01", "2015-01-01", "2026-01-01"),
    seaDistanceM: fc.constantFrom(50, 400, 900, 4_000, 9_000, 40_000),
    washing: fc.constantFrom("rain" as const, "none" as const),
    ucsMpa: fc.constantFrom(3, 15, 35, 60, 150),
    mainCount: fc.constantFrom(1, 2, 3),
    angleFromAxisDeg: fc.constantFrom(45, 70, 90),
  })
  .map((c): BoltEvidence => {
    const e = inRock(c.use, {
      bolt: {
        ...c.build,
        metal: c.metal,
        hangerMetal: c.build.hangerMetal === null ? null : c.metal,
        rodDiameterMm: c.build.rodDiameterMm === null ? null : c.rodDiameterMm,
        ratedRadialKn: c.ratedRadialKn,
        standard: null,
        bendOnsetKn: c.bendOnsetKn,
        bendOnsetHighKn: c.bendOnsetKn,
        bendOnsetBasis: c.bendOnsetKn === null ? "unknown" : "tested",
        embedmentMm: c.embedmentMm,
        installedOn: c.installedOn,
      },
      place: { seaDistanceM: c.seaDistanceM, washing: c.washing },
      rock: { ucsMpa: c.ucsMpa },
    });
    return {
      ...e,
      context: c.context,
      demand: { ...e.demand, angleFromAxisDeg: c.angleFromAxisDeg },
      group: e.group && { ...e.group, mainCount: c.mainCount },
    };
  });

describe.each(FACTS)("forgetting $fact", ({ fact, forget, named }) => {
  it("never turns a verdict into 'nothing found against it' in silence", () => {
    fc.assert(
      fc.property(evidence, (e) => {
        const before = evaluateBolt(e, DEFAULT_POLICY);
        const after = evaluateBolt(forget(e), DEFAULT_POLICY);
        if (after.verdict !== "nothing_against" || before.verdict === "nothing_against") return;
        const codes = after.findings.map((found) => found.code);
        expect([fact, codes, named.some((code) => codes.includes(code))]).toEqual([fact, codes, true]);
      }),
      { numRuns: 400 },
    );
  }, 30_000);

  it("never makes a serious use better than it was", () => {
    fc.assert(
      fc.property(evidence, (e) => {
        if (e.use !== "highline" && e.use !== "rope_access") return;
        const before = evaluateBolt(e, DEFAULT_POLICY);
        const after = evaluateBolt(forget(e), DEFAULT_POLICY);
        if (after.verdict === "nothing_against")
          expect([fact, before.verdict]).toEqual([fact, "nothing_against"]);
      }),
      { numRuns: 400 },
    );
  }, 30_000);
});
