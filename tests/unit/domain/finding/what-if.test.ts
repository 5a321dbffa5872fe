import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DEFAULT_POLICY } from "@/lib/domain/policy";
import type { WhatIfInput } from "@/lib/domain/finding/what-if";
import { whatIf } from "@/lib/domain/finding/what-if";
import { FORMS, LEVELS, RULE_CODES, SOURCE_MARKS, USES, VERDICTS } from "@/lib/domain/vocabulary";

/** The example of the API's description: an 8 mm bent rod for a highline, 80 m from the sea, never washed. */
const EXAMPLE: WhatIfInput = {
  use: "highline",
  bolt: {
    form: "glued_bent_rod",
    metal: "1.4401",
    rodDiameterMm: 8,
    leverMm: 20,
    ratedRadialKn: 25,
    ratedAxialKn: 15,
    bendOnsetKn: null,
    bendOnsetBasis: "unknown",
    method: "epoxy",
    embedmentMm: 100,
    holeDiameterMm: 16,
    installedOn: "2019-05-04",
    standard: "EN 959:2007",
    batch: null,
  },
  place: {
    seaDistanceM: 80,
    coast: "other",
    washing: "none",
    so2: "low",
    saltedRoadDistanceM: null,
    warmDry: false,
  },
  rock: { ucsMpa: 90 },
  demand: { workingKn: 6, peakKn: 12, angleFromAxisDeg: 90 },
  onDate: "2026-06-01",
};

const ask = (input: WhatIfInput) => whatIf(input, DEFAULT_POLICY);

describe("whatIf", () => {
  it("refuses the thin bent rod by the sea with the published factor and class", () => {
    const answer = ask(EXAMPLE);
    expect(answer.verdict).toBe("do_not_use");
    // EN 1993-1-4 Annex A: -15 - 7 = -22, class V.
    expect(answer.placeClass).toEqual({ f1: -15, f2: 0, f3: -7, crf: -22, crc: "V" });
    expect(answer.findings).toContainEqual(
      expect.objectContaining({
        code: "metal.stress-corrosion",
        level: "stop",
        source: expect.objectContaining({ mark: "published" }),
      }),
    );
    expect(answer.engine).toBe("1.0.0");
    expect(answer.caution).toContain("certifies nothing");
    expect(Object.keys(answer).sort()).toEqual(["caution", "engine", "findings", "placeClass", "verdict"]);
  });

  it("finds nothing against an ordinary stainless bolt in every use that does not forbid a bend", () => {
    for (const use of ["protection", "belay", "lower_off", "abseil", "directional"] as const) {
      for (const form of ["expansion_stud_hanger", "screw_hanger", "sleeve_hanger"] as const) {
        const answer = ask({
          use,
          bolt: {
            form,
            metal: "1.4401",
            hangerMetal: "1.4301",
            ratedRadialKn: 25,
            ratedAxialKn: 15,
            standard: "EN 959",
            shankDiameterMm: 10,
            embedmentMm: 60,
            installedOn: "2018-04-01",
          },
          place: { seaDistanceM: 6_000, washing: "rain" },
          rock: { ucsMpa: 150 },
          onDate: "2026-06-01",
        });
        expect([use, form, answer.verdict]).toEqual([use, form, "nothing_against"]);
      }
    }
  });

  it("can find nothing against a highline bolt: a tested titanium eye", () => {
    const answer = ask({
      use: "highline",
      bolt: {
        form: "glued_eye",
        metal: "ti-5",
        rodDiameterMm: 14,
        ratedRadialKn: 40,
        ratedAxialKn: 30,
        bendOnsetKn: 20,
        bendOnsetBasis: "tested",
        standard: "EN 959",
        method: "epoxy",
        embedmentMm: 100,
        holeDiameterMm: 16,
      },
      place: { seaDistanceM: 80, washing: "none" },
      rock: { ucsMpa: 120 },
      onDate: "2026-06-01",
    });
    expect(answer.findings).toEqual([]);
    expect(answer.verdict).toBe("nothing_against");
  });

  it("never finds nothing against a bolt of which only the form is known", () => {
    for (const use of USES) {
      for (const form of FORMS) {
        const answer = ask({ use, bolt: { form }, onDate: "2026-06-01" });
        expect(answer.verdict).toBe("not_enough_known");
        expect(answer.placeClass).toBeNull();
      }
    }
  });

  it("treats null and missing alike", () => {
    const bare = ask({ use: "belay", bolt: { form: "glued_eye" }, onDate: "2026-06-01" });
    const nulls = ask({
      use: "belay",
      bolt: { form: "glued_eye", metal: null, ratedRadialKn: null, bendOnsetBasis: null, installedOn: null },
      place: { seaDistanceM: null, coast: null, washing: null, so2: null, warmDry: null },
      rock: { ucsMpa: null },
      demand: { workingKn: null, peakKn: null, angleFromAxisDeg: null },
      onDate: "2026-06-01",
    });
    expect(nulls).toEqual(bare);
    expect(
      ask({
        use: "belay",
        bolt: { form: "glued_eye" },
        place: null,
        rock: null,
        demand: null,
        onDate: "2026-06-01",
      }),
    ).toEqual(bare);
  });

  it("takes the area's loads when none are typed and says whose they are", () => {
    const { demand, ...rest } = EXAMPLE;
    expect(demand).toBeDefined();
    const bend = ask(rest).findings.find((found) => found.code === "load.bend");
    expect(bend?.numbers["peakKn"]).toBe(12);
    expect(bend?.assumed).toContain("loads: area policy, version 1");
  });

  it("keeps care, one-lost and direction silent", () => {
    for (const found of ask(EXAMPLE).findings) {
      expect(["care", "load.one-lost", "load.direction"]).not.toContain(found.code);
      expect(found.code.startsWith("care.")).toBe(false);
    }
  });

  const nullable = <T>(arb: fc.Arbitrary<T>) => fc.option(arb, { nil: null });
  const size = fc.oneof(
    fc.constant(0),
    fc.double({ min: 0, max: 300, noNaN: true }),
    fc.double({ min: 0, max: 1.7e308, noNaN: true }),
  );
  const anyInput: fc.Arbitrary<WhatIfInput> = fc.record({
    use: fc.constantFrom(...USES),
    bolt: fc.record({
      form: fc.constantFrom(...FORMS),
      metal: nullable(
        fc.constantFrom(
          "1.4301",
          "1.4404",
          "1.4547",
          "ti-2",
          "zinc-plated",
          "hot-dip-galvanised",
          "nonsense",
        ),
      ),
      hangerMetal: nullable(fc.constantFrom("1.4301", "zinc-plated", "ti-5")),
      linkMetal: nullable(fc.constantFrom("1.4404", "zinc-plated")),
      rodCount: nullable(fc.integer({ min: 0, max: 3 })),
      rodDiameterMm: nullable(size),
      leverMm: nullable(size),
      shankDiameterMm: nullable(size),
      ratedRadialKn: nullable(size),
      ratedAxialKn: nullable(size),
      bendOnsetKn: nullable(size),
      bendOnsetHighKn: nullable(size),
      bendOnsetAxialKn: nullable(size),
      bendOnsetBasis: nullable(
        fc.constantFrom("tested" as const, "maker" as const, "estimate" as const, "unknown" as const),
      ),
      method: nullable(
        fc.constantFrom("mechanical" as const, "epoxy" as const, "mechanical_and_glue" as const),
      ),
      embedmentMm: nullable(size),
      holeDiameterMm: nullable(size),
      coatingThicknessUm: nullable(size),
      bondMpa: nullable(size),
      installedOn: nullable(fc.constantFrom("1980-02-29", "2005-01-01", "2026-06-01", "2030-01-01")),
      installedOnPrecision: nullable(
        fc.constantFrom("day" as const, "month" as const, "year" as const, "before" as const),
      ),
      adhesiveExpiresOn: nullable(fc.constantFrom("2004-01-01", "2027-01-01")),
      standard: nullable(fc.constantFrom("EN 959", "UIAA 123", "none")),
    }),
    place: fc.record({
      seaDistanceM: nullable(fc.oneof(fc.constant(0), fc.double({ min: 0, max: 1e6, noNaN: true }))),
      coast: nullable(
        fc.constantFrom("other" as const, "strict" as const, "baltic_or_german_north_sea" as const),
      ),
      washing: nullable(fc.constantFrom("rain" as const, "cleaned" as const, "none" as const)),
      so2: nullable(fc.constantFrom("low" as const, "high" as const)),
      saltedRoadDistanceM: nullable(size),
      warmDry: fc.boolean(),
    }),
    rock: fc.record({ ucsMpa: nullable(size) }),
    demand: nullable(
      fc.record({
        workingKn: nullable(size),
        peakKn: nullable(size),
        angleFromAxisDeg: nullable(fc.double({ min: 0, max: 180, noNaN: true })),
      }),
    ),
    onDate: fc.constant("2026-06-01"),
  });

  it("answers anything a request may hold, in words and finite numbers, with a source for every reason", () => {
    fc.assert(
      fc.property(anyInput, (input) => {
        const answer = ask(input);
        expect(VERDICTS).toContain(answer.verdict);
        const codes: readonly string[] = RULE_CODES;
        const bad = answer.findings.filter((found) => {
          const words = [
            found.title,
            found.text,
            found.clearsWhen ?? "-",
            found.source.name,
            ...found.assumed,
          ];
          const numbers = Object.values(found.numbers).filter((value) => typeof value === "number");
          return (
            !codes.includes(found.code) ||
            !LEVELS.includes(found.level) ||
            !SOURCE_MARKS.includes(found.source.mark) ||
            found.title.endsWith(".") ||
            words.some((text) => text === "" || /NaN|Infinity|undefined|null|\bsafe\b|\bOK\b/.test(text)) ||
            !numbers.every(Number.isFinite)
          );
        });
        expect(bad).toEqual([]);
        expect(new Set(answer.findings.map((found) => found.code)).size).toBe(answer.findings.length);
      }),
      { numRuns: 300 },
    );
  }, 30_000);

  it("names what clears every reason that is more than a note, where anything can", () => {
    fc.assert(
      fc.property(anyInput, (input) => {
        for (const found of ask(input).findings) {
          if (found.level === "note" || found.code === "rock.method") continue;
          expect([found.code, found.clearsWhen === null]).toEqual([found.code, false]);
        }
      }),
    );
  });
});
