import { describe, expect, it } from "vitest";
import type { ReportInput, ReportTarget } from "@/lib/domain/report/draft-report";
import { draftReport } from "@/lib/domain/report/draft-report";
import { reportFacts } from "@/lib/domain/report/report-facts";
import { REPORT_MEASUREMENTS } from "@/lib/domain/report/report-measurements";
import { REPORT_KINDS } from "@/lib/domain/vocabulary";

const NOW = "2026-06-01T12:00:00.000Z";
const TARGET: ReportTarget = { anchorId: "a", hasPoint: false, form: null, nominalDiameterMm: null };
const INPUT: ReportInput = {
  kind: "deformation",
  depth: "handled",
  observedAt: "2026-05-31T10:00:00.000Z",
  measured: { bendAngleDeg: 70, bendDirection: "down" },
  grade: 4,
};

const draft = (input: Partial<ReportInput> = {}, target: Partial<ReportTarget> = {}) =>
  draftReport({ ...INPUT, ...input }, { ...TARGET, ...target }, NOW);
const paths = (...args: Parameters<typeof draft>) => {
  const result = draft(...args);
  return result.ok ? [] : result.problems.map((problem) => problem.path);
};

describe("draftReport", () => {
  it("takes a 70° bend and says that it takes the bolt out of use", () => {
    const result = draft();
    expect(result).toMatchObject({ ok: true, draft: { outOfUseAtOnce: true, foundSound: false } });
  });

  it("takes every kind with nothing measured: a report filed with cold hands counts", () => {
    for (const kind of REPORT_KINDS) {
      expect([kind, paths({ kind, measured: {}, grade: null }, { hasPoint: true })]).toEqual([kind, []]);
    }
  });

  it("drops measurements that were left empty", () => {
    const result = draft({ measured: { bendAngleDeg: null, bendDirection: "up" } });
    expect(result.ok && result.draft.measured).toEqual({ bendDirection: "up" });
  });

  it("accepts both ends of every bound and refuses what lies beyond", () => {
    let checked = 0;
    for (const kind of REPORT_KINDS) {
      for (const measurement of REPORT_MEASUREMENTS[kind]) {
        if (measurement.type !== "number") continue;
        const { key, min, max } = measurement;
        const at = (value: number) =>
          paths({ kind, grade: null, measured: { [key]: value } }, { hasPoint: true });
        expect([kind, key, at(max)]).toEqual([kind, key, []]);
        if (key !== "bendAngleDeg") expect([kind, key, at(min)]).toEqual([kind, key, []]);
        expect(at(max + 1)).toEqual([`measured.${key}`]);
        expect(at(min - 1)).toEqual([`measured.${key}`]);
        expect(at(NaN)).toEqual([`measured.${key}`]);
        checked += 1;
      }
    }
    expect(checked).toBeGreaterThan(10);
  });

  it("refuses a measurement of the wrong sort, or one this kind does not ask for", () => {
    expect(paths({ measured: { bendAngleDeg: "70" } })).toEqual(["measured.bendAngleDeg"]);
    expect(paths({ measured: { bendDirection: "sideways" } })).toEqual(["measured.bendDirection"]);
    expect(paths({ measured: { metalCracked: 1 } })).toEqual(["measured.metalCracked"]);
    expect(paths({ measured: { crackLengthMm: 5 } })).toEqual(["measured.crackLengthMm"]);
    expect(paths({ kind: "corrosion", measured: { rustGrade: 2.5 } })).toEqual(["measured.rustGrade"]);
  });

  it("refuses the future, a time that is none, and a time before there were bolts", () => {
    expect(paths({ observedAt: "2026-06-01T12:09:00.000Z" })).toEqual([]);
    expect(paths({ observedAt: "2026-06-01T12:11:00.000Z" })).toEqual(["observedAt"]);
    expect(paths({ observedAt: "yesterday" })).toEqual(["observedAt"]);
    expect(paths({ observedAt: "1949-12-31T00:00:00.000Z" })).toEqual(["observedAt"]);
  });

  it("refuses a grade that is not one of five", () => {
    for (const grade of [-1, 5, 2.5, NaN]) expect(paths({ grade })).toEqual(["grade"]);
    for (const grade of [0, 4, null]) expect(paths({ grade })).toEqual([]);
  });

  it("refuses what cannot happen to this bolt", () => {
    expect(paths({ kind: "glue_in_moves", measured: {} }, { form: "screw_hanger" })).toEqual(["kind"]);
    expect(paths({ kind: "glue_in_moves", measured: {} }, { form: "glued_eye" })).toEqual([]);
    expect(paths({ kind: "nut_loose", measured: {} }, { form: "glued_eye" })).toEqual(["kind"]);
    expect(paths({ kind: "hanger_spins", measured: {} }, { form: "glued_bent_rod" })).toEqual(["kind"]);
    expect(paths({ depth: "torqued" }, { form: "glued_bent_rod" })).toEqual(["depth"]);
    expect(paths({ measured: { bendAngleDeg: 0 } })).toEqual(["measured.bendAngleDeg"]);
    const wear = { kind: "wear" as const, measured: { diameterLeftMm: 11 }, grade: null };
    expect(paths(wear, { nominalDiameterMm: 10 })).toEqual(["measured.diameterLeftMm"]);
    expect(paths(wear, { nominalDiameterMm: 12 })).toEqual([]);
  });

  it("wants to know where, and a point for what is not registered", () => {
    expect(paths({}, { anchorId: null })).toEqual(["anchorId"]);
    expect(paths({}, { anchorId: null, hasPoint: true })).toEqual([]);
    expect(paths({ kind: "not_in_register", measured: {} })).toEqual(["point"]);
  });

  it("tells every problem at once", () => {
    expect(paths({ observedAt: "never", grade: 9, measured: { x: 1 } }, { anchorId: null })).toEqual([
      "observedAt",
      "grade",
      "measured.x",
      "anchorId",
    ]);
  });

  it("takes a clean check by hand for proof of soundness, but not a look from below", () => {
    const sound = (over: Partial<ReportInput>) => {
      const result = draft({ kind: "routine_check", measured: {}, grade: 0, ...over });
      return result.ok && result.draft.foundSound;
    };
    expect(sound({})).toBe(true);
    expect(sound({ depth: "seen" })).toBe(false);
    expect(sound({ grade: 1 })).toBe(false);
    expect(sound({ grade: null })).toBe(false);
  });
});

describe("reportFacts", () => {
  const base = {
    reportId: "r",
    kind: "corrosion",
    depth: "seen",
    observedAt: NOW,
    grade: 1,
    confirmed: true,
  } as const;

  it("gives the rules what was measured, and takes the worse of grade and rust grade", () => {
    expect(reportFacts({ ...base, measured: { rustGrade: 3, metalCracked: true, note: "x" } })).toEqual({
      ...base,
      grade: 3,
      bendAngleDeg: null,
      crackMoves: null,
      crackNew: null,
      soundsHollow: null,
      metalCracked: true,
    });
    expect(reportFacts({ ...base, grade: null, measured: {} }).grade).toBeNull();
  });
});
