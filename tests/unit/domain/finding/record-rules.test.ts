import { describe, expect, it } from "vitest";
import type { BoltFacts, CareFacts, OpenReportFacts, WarningFacts } from "@/lib/domain/finding/evidence";
import { careClosure } from "@/lib/domain/finding/rules/care-closure";
import { careReportOpen } from "@/lib/domain/finding/rules/care-report-open";
import { fittingWear } from "@/lib/domain/finding/rules/fitting-wear";
import { isOutOfUseAtOnce } from "@/lib/domain/finding/out-of-use";
import type { Use } from "@/lib/domain/vocabulary";
import {
  anchor,
  BENT_ROD,
  choosing,
  inRock,
  levelOf,
  NO_CARE,
  report,
  TODAY,
} from "@/tests/support/evidence";

describe("record.missing", () => {
  const level = (use: Use, bolt: Partial<BoltFacts>) => levelOf(inRock(use, { bolt }), "record.missing");

  it("asks for date and glue in serious uses and belays, and notes them elsewhere", () => {
    for (const use of ["highline", "rope_access", "belay"] as const) {
      expect(level(use, { installedOn: null })).toBe("ask");
      expect(level(use, { ...BENT_ROD, method: null })).toBe("ask");
    }
    expect(level("protection", { installedOn: null })).toBe("note");
    expect(level("belay", {})).toBeNull();
  });

  it("reads the method of a bolt that expands from its form", () => {
    expect(level("belay", { method: null })).toBeNull();
  });

  it("does not repeat the date that metal.plated asks for", () => {
    expect(
      level("belay", { installedOn: null, metal: "zinc-plated", hangerMetal: "zinc-plated" }),
    ).toBeNull();
  });

  it("takes a date known as 'before' for a date", () => {
    expect(level("belay", { installedOn: "2005-01-01", installedOnPrecision: "before" })).toBeNull();
  });

  it("is silent while a type is being chosen", () => {
    expect(levelOf(choosing("belay", { bolt: { installedOn: null } }), "record.missing")).toBeNull();
  });
});

describe("record.curing", () => {
  const level = (usableFrom: string | null, onDate = TODAY, atUtc?: string) =>
    levelOf(inRock("protection", { bolt: { usableFrom }, onDate, atUtc }), "record.curing");

  it("stops a bolt whose glue is not hard when the day begins", () => {
    expect(level("2026-06-01T00:00:01Z")).toBe("stop");
    expect(level("2026-06-01T00:00:00Z")).toBeNull();
    expect(level("2026-05-31T23:00:00Z")).toBeNull();
  });

  it("asked about now, stops until the very minute", () => {
    expect(level("2026-06-01T14:00:00Z", TODAY, "2026-06-01T13:59:59Z")).toBe("stop");
    expect(level("2026-06-01T14:00:00Z", TODAY, "2026-06-01T14:00:00Z")).toBeNull();
  });

  it("notes a torque re-check from the day it is due", () => {
    const due = (recheckDueOn: string) =>
      levelOf(inRock("protection", { bolt: { recheckDueOn } }), "record.curing");
    expect(due("2026-06-01")).toBe("note");
    expect(due("2026-06-02")).toBeNull();
  });
});

describe("record.glue-expired", () => {
  const level = (installedOn: string, installedOnPrecision: BoltFacts["installedOnPrecision"] = "day") =>
    levelOf(
      inRock("protection", { bolt: { adhesiveExpiresOn: "2024-03-31", installedOn, installedOnPrecision } }),
      "record.glue-expired",
    );

  it("limits glue used after its last day", () => {
    expect(level("2024-03-31")).toBeNull();
    expect(level("2024-04-01")).toBe("limit");
  });

  it("takes the latest day a loose date may stand for", () => {
    expect(level("2024-03-01", "month")).toBeNull();
    expect(level("2024-01-01", "year")).toBe("limit");
    expect(level("2024-04-01", "before")).toBeNull();
  });
});

describe("record.warning", () => {
  const level = (...warnings: Pick<WarningFacts, "says" | "match">[]) =>
    levelOf(
      inRock("protection", {
        care: {
          ...NO_CARE,
          warnings: warnings.map((one, index) => ({ warningId: `w${index}`, title: "Batch", ...one })),
        },
      }),
      "record.warning",
    );

  it("says what the warning says, asks for a batch not recorded, and notes relatives", () => {
    expect(level({ says: "stop", match: "exact" })).toBe("stop");
    expect(level({ says: "inspect", match: "exact" })).toBe("limit");
    expect(level({ says: "stop", match: "batch_unknown" })).toBe("ask");
    expect(level({ says: "stop", match: "related" })).toBe("note");
    expect(level()).toBeNull();
  });

  it("lets the worst of several speak", () => {
    expect(level({ says: "stop", match: "related" }, { says: "inspect", match: "exact" })).toBe("limit");
  });
});

describe("record.standard", () => {
  const level = (use: Use, bolt: Partial<BoltFacts>) => levelOf(inRock(use, { bolt }), "record.standard");

  // EN 959:2018, 4.3.1 and 4.3.2.
  it("limits a rating below 25 kN across or 15 kN along the axis", () => {
    expect(level("protection", { ratedRadialKn: 24.9 })).toBe("limit");
    expect(level("protection", { ratedAxialKn: 14.9 })).toBe("limit");
    expect(level("protection", { ratedRadialKn: 25, ratedAxialKn: 15 })).toBeNull();
    expect(levelOf(choosing("protection", { bolt: { ratedRadialKn: 24.9 } }), "record.standard")).toBe(
      "limit",
    );
  });

  it("notes a standard that nobody claimed where people belay or hang", () => {
    expect(level("belay", { standard: null })).toBe("note");
    expect(level("highline", { standard: null })).toBe("note");
    expect(level("protection", { standard: null })).toBeNull();
    expect(levelOf(choosing("belay", { bolt: { standard: null } }), "record.standard")).toBeNull();
  });
});

describe("care.overdue", () => {
  const level = (use: Use, lastCheckOn: string | null, installedOn: string | null) =>
    levelOf(inRock(use, { bolt: { installedOn }, care: { ...NO_CARE, lastCheckOn } }), "care.overdue");

  // Interval of a highline in the default policy: 12 months (EN 365 through BS 7883).
  it("notes one interval passed and limits two; the last day is in time", () => {
    expect(level("highline", "2025-06-01", null)).toBeNull();
    expect(level("highline", "2025-05-31", null)).toBe("note");
    expect(level("highline", "2024-06-01", null)).toBe("note");
    expect(level("highline", "2024-05-31", null)).toBe("limit");
  });

  it("counts months to the last day of a shorter one: from 31 August, 6 months end on 28 February", () => {
    const on = (onDate: string) =>
      levelOf(
        inRock("rope_access", {
          bolt: { installedOn: null },
          care: { ...NO_CARE, lastCheckOn: "2024-08-31" },
          onDate,
        }),
        "care.overdue",
      );
    expect(on("2025-02-28")).toBeNull();
    expect(on("2025-03-01")).toBe("note");
  });

  it("counts an install as a check", () => {
    expect(level("highline", null, "2026-01-01")).toBeNull();
    expect(level("highline", "2020-01-01", "2026-01-01")).toBeNull();
  });

  it("asks for a check that was never made in serious uses, and notes it elsewhere", () => {
    expect(level("highline", null, null)).toBe("ask");
    expect(level("rope_access", null, null)).toBe("ask");
    expect(level("protection", null, null)).toBe("note");
  });
});

describe("care.report-open", () => {
  const level = (...openReports: Partial<OpenReportFacts>[]) =>
    careReportOpen({ care: { ...NO_CARE, openReports: openReports.map((one) => report(one)) } })?.level ??
    null;

  it.each<[Partial<OpenReportFacts>, string | null]>([
    [{ kind: "deformation", bendAngleDeg: 70 }, "stop"],
    [{ kind: "deformation" }, "stop"],
    [{ kind: "deformation", bendAngleDeg: 0 }, "note"],
    [{ kind: "glue_in_moves" }, "stop"],
    [{ kind: "corrosion", metalCracked: true }, "stop"],
    [{ kind: "rock", crackNew: true }, "stop"],
    [{ kind: "rock", crackMoves: true }, "stop"],
    [{ kind: "rock", soundsHollow: true }, "stop"],
    [{ kind: "rock", crackNew: false, crackMoves: false }, "note"],
    [{ kind: "missing" }, "stop"],
    [{ kind: "corrosion", grade: 4 }, "stop"],
    [{ kind: "corrosion", grade: 3 }, "limit"],
    [{ kind: "nut_loose" }, "limit"],
    [{ kind: "hanger_spins" }, "limit"],
    [{ kind: "stud_turns" }, "limit"],
    [{ kind: "wear", grade: 2 }, "note"],
    [{ kind: "wear", grade: 1 }, "note"],
    [{ kind: "routine_check", grade: 0 }, null],
  ])("%o: %s", (one, expected) => {
    expect(level(one)).toBe(expected);
  });

  it("asks, and does not stop, on a tag's report that nobody confirmed", () => {
    expect(level({ kind: "deformation", bendAngleDeg: 70, confirmed: false })).toBe("ask");
  });

  it("keeps a bend whatever is seen later, and lets a newer clean check by hand supersede lesser things", () => {
    const clean = { kind: "routine_check", grade: 0, observedAt: "2026-05-20T10:00:00.000Z" } as const;
    expect(level({ kind: "deformation", bendAngleDeg: 10 }, clean)).toBe("stop");
    expect(level({ kind: "nut_loose" }, clean)).toBeNull();
    expect(level({ kind: "nut_loose" }, { ...clean, depth: "seen" })).toBe("limit");
    expect(level({ kind: "nut_loose" }, { ...clean, confirmed: false })).toBe("limit");
    expect(level({ kind: "nut_loose", observedAt: "2026-05-25T10:00:00.000Z" }, clean)).toBe("limit");
  });
});

describe("isOutOfUseAtOnce", () => {
  it("does not take a bolt out of use for rust, wear or a loose nut", () => {
    for (const kind of [
      "corrosion",
      "wear",
      "nut_loose",
      "hanger_spins",
      "stud_turns",
      "routine_check",
    ] as const) {
      expect(isOutOfUseAtOnce(report({ kind, grade: 4 }))).toBe(false);
    }
  });

  it("takes it out for a bend mentioned in any kind of report", () => {
    expect(isOutOfUseAtOnce(report({ kind: "other", bendAngleDeg: 5 }))).toBe(true);
  });
});

describe("care.closure", () => {
  const level = (...closures: Partial<CareFacts["closures"][number]>[]) =>
    careClosure({
      ...anchor({
        care: {
          ...NO_CARE,
          closures: closures.map((one) => ({
            closureId: "c",
            reason: "Nesting",
            startsOn: "2026-02-01",
            endsOn: "2026-07-31",
            ...one,
          })),
        },
      }),
      use: "highline",
    })?.level ?? null;

  it("stops on the first day, the last day and between, and on an open end", () => {
    expect(level({})).toBe("stop");
    expect(level({ startsOn: TODAY })).toBe("stop");
    expect(level({ endsOn: TODAY })).toBe("stop");
    expect(level({ endsOn: null })).toBe("stop");
    expect(level({ endsOn: "2026-05-31" })).toBeNull();
  });

  it("announces one that begins within 30 days", () => {
    expect(level({ startsOn: "2026-07-01", endsOn: null })).toBe("note");
    expect(level({ startsOn: "2026-07-02", endsOn: null })).toBeNull();
  });
});

describe("fitting.wear", () => {
  const level = (diameterMm: number | null, diameterLeftMm: number | null, kind: "ring" | "sling" = "ring") =>
    fittingWear({
      ...anchor({
        fittings: [{ fittingId: "f", kind, metal: null, diameterMm, diameterLeftMm, replaceable: true }],
      }),
      use: "highline",
    })?.level ?? null;

  // EN 818-6 discards chain at 10 % (from memory); 30 % is common practice.
  it.each([
    [12, 10.81, null],
    [12, 10.8, "limit"],
    [12, 8.41, "limit"],
    [12, 8.4, "stop"],
    [10, 9, "limit"],
    [10, 7, "stop"],
    [10, 0, "stop"],
    [null, 8, null],
    [12, null, null],
  ])("%s mm when new, %s mm left: %s", (diameterMm, leftMm, expected) => {
    expect(level(diameterMm, leftMm)).toBe(expected);
  });

  it("does not measure slings by diameter", () => {
    expect(level(12, 6, "sling")).toBeNull();
  });
});
