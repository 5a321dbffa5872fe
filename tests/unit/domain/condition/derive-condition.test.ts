import { describe, expect, it } from "vitest";
import type { AnchorForCondition, BoltForCondition } from "@/lib/domain/condition/derive-condition";
import { deriveCondition } from "@/lib/domain/condition/derive-condition";
import { DEFAULT_POLICY } from "@/lib/domain/policy";
import { report } from "@/tests/support/evidence";

const BEFORE = "2026-04-01T10:00:00.000Z";
const EVENT = "2026-05-01T10:00:00.000Z";
const AFTER = "2026-05-02T10:00:00.000Z";
const LATER = "2026-05-03T10:00:00.000Z";

const bolt = (boltId: string, over: Partial<BoltForCondition> = {}): BoltForCondition => ({
  boltId,
  role: "main",
  removed: false,
  standsSince: null,
  openReports: [],
  curing: false,
  handCheckedAt: null,
  decided: null,
  ...over,
});
const BENT = { openReports: [report({ kind: "deformation", bendAngleDeg: 70, observedAt: EVENT })] };

function derive(bolts: BoltForCondition[], over: Partial<AnchorForCondition> = {}) {
  const result = deriveCondition(
    { uses: ["highline"], bolts, openReports: [], events: [], decided: null, ...over },
    DEFAULT_POLICY,
  );
  return {
    anchor: result.condition,
    bolts: result.bolts.map((one) => one.condition),
    result,
  };
}

describe("a permanent bend", () => {
  it("takes the bolt and the whole anchor out of use at once, and its neighbours wait for a check by hand", () => {
    const { anchor, bolts, result } = derive([bolt("1", BENT), bolt("2"), bolt("3"), bolt("4")]);
    expect(anchor).toBe("out_of_use");
    expect(bolts).toEqual(["out_of_use", "check_first", "check_first", "check_first"]);
    expect(result.outOfUseSince).toBe(EVENT);
    expect(result.bolts[0]?.outOfUseSince).toBe(EVENT);
    expect(result.why.join(" ")).toContain("3 of its bolts");
  });

  it("keeps the anchor out of use until every neighbour was checked, and a check before the event does not count", () => {
    const checked = { handCheckedAt: AFTER };
    expect(derive([bolt("1", BENT), bolt("2", checked), bolt("3", checked), bolt("4")]).anchor).toBe(
      "out_of_use",
    );
    const early = { handCheckedAt: BEFORE };
    expect(derive([bolt("1", BENT), bolt("2", checked), bolt("3", checked), bolt("4", early)]).anchor).toBe(
      "out_of_use",
    );
    const same = { handCheckedAt: EVENT };
    expect(derive([bolt("1", BENT), bolt("2", checked), bolt("3", checked), bolt("4", same)]).anchor).toBe(
      "out_of_use",
    );
  });

  it("makes it 'check first' once enough checked bolts remain for its use, and not with one too few", () => {
    const checked = { handCheckedAt: AFTER };
    const three = [bolt("2", checked), bolt("3", checked), bolt("4", checked)];
    // The default policy wants 3 sound main bolts on a highline.
    expect(derive([bolt("1", BENT), ...three]).anchor).toBe("check_first");
    expect(derive([bolt("1", BENT), ...three.slice(1)]).anchor).toBe("out_of_use");
    expect(derive([bolt("1", BENT), ...three.slice(1)], { uses: ["belay"] }).anchor).toBe("check_first");
    expect(derive([bolt("1", BENT), ...three.slice(1)], { uses: ["belay", "highline"] }).anchor).toBe(
      "out_of_use",
    );
    const backup = bolt("4", { ...checked, role: "backup" });
    expect(derive([bolt("1", BENT), ...three.slice(0, 2), backup]).anchor).toBe("out_of_use");
  });

  it("still waits for the neighbours when the bent bolt was replaced and its report answered", () => {
    const replaced = [bolt("new", { standsSince: AFTER }), bolt("2"), bolt("3")];
    const events = [{ observedAt: EVENT }];
    expect(derive(replaced, { events }).anchor).toBe("out_of_use");
    expect(derive(replaced, { events }).bolts).toEqual(["in_service", "check_first", "check_first"]);
    const checked = replaced.map((one) => ({ ...one, handCheckedAt: one.boltId === "new" ? null : LATER }));
    expect(derive(checked, { events }).anchor).toBe("in_service");
  });

  it("asks for a check by hand of the bolt itself when its report was answered and it stayed in the rock", () => {
    const events = [{ observedAt: EVENT }];
    const neighbours = [bolt("2", { handCheckedAt: AFTER }), bolt("3", { handCheckedAt: AFTER })];
    expect(derive([bolt("1"), ...neighbours], { events }).anchor).toBe("out_of_use");
    expect(derive([bolt("1", { handCheckedAt: AFTER }), ...neighbours], { events }).anchor).toBe(
      "in_service",
    );
  });

  it("counts although somebody later found it fine", () => {
    const fine = report({ kind: "routine_check", grade: 0, observedAt: LATER, depth: "pulled" });
    expect(
      derive([bolt("1", { openReports: [...BENT.openReports, fine], handCheckedAt: LATER })]).bolts,
    ).toEqual(["out_of_use"]);
  });

  it("means 'check first' when it came through a tag and nobody confirmed it", () => {
    const doubtful = { openReports: [report({ kind: "deformation", bendAngleDeg: 70, confirmed: false })] };
    const { anchor, bolts } = derive([bolt("1", doubtful), bolt("2"), bolt("3")]);
    expect(anchor).toBe("check_first");
    expect(bolts).toEqual(["check_first", "in_service", "in_service"]);
  });
});

describe("other evidence", () => {
  it("leaves an anchor without anything open in service", () => {
    expect(derive([bolt("1"), bolt("2"), bolt("3")]).anchor).toBe("in_service");
    expect(derive([]).anchor).toBe("in_service");
  });

  it("keeps a bolt out of use while its glue cures, and the anchor with it unless enough others are sound", () => {
    const curing = bolt("1", { curing: true });
    expect(derive([curing, bolt("2")])).toMatchObject({
      anchor: "out_of_use",
      bolts: ["out_of_use", "in_service"],
    });
    expect(derive([curing, bolt("2"), bolt("3"), bolt("4")]).anchor).toBe("check_first");
    expect(derive([curing], { uses: ["protection"] }).anchor).toBe("out_of_use");
  });

  it("asks for a look first at grade 3 and above and at loose parts, not at grade 2", () => {
    const of = (over: Parameters<typeof report>[0]) =>
      derive([bolt("1", { openReports: [report(over)] })]).bolts[0];
    expect(of({ kind: "corrosion", grade: 4 })).toBe("check_first");
    expect(of({ kind: "corrosion", grade: 3 })).toBe("check_first");
    expect(of({ kind: "nut_loose" })).toBe("check_first");
    expect(of({ kind: "corrosion", grade: 2 })).toBe("in_service");
  });

  it("takes the whole anchor out of use for a new crack in its rock, until that report is answered", () => {
    const crack = report({ kind: "rock", crackNew: true, observedAt: EVENT });
    const checked = ["1", "2", "3", "4"].map((id) => bolt(id, { handCheckedAt: AFTER }));
    expect(derive(checked, { openReports: [crack] }).anchor).toBe("out_of_use");
  });

  it("calls an anchor removed when every bolt is, and ignores removed bolts otherwise", () => {
    const gone = { removed: true };
    expect(derive([bolt("1", gone), bolt("2", gone)]).anchor).toBe("removed");
    expect(
      derive([
        bolt("1", { ...gone, ...BENT }),
        bolt("2", { handCheckedAt: AFTER }),
        bolt("3", { handCheckedAt: AFTER }),
      ]).anchor,
    ).toBe("in_service");
  });
});

describe("a steward's decision", () => {
  const decided = (condition: "in_service" | "check_first" | "out_of_use", at = LATER) => ({ condition, at });

  it("is kept beside what the evidence says", () => {
    const { result } = derive([bolt("1")], { decided: decided("out_of_use") });
    expect(result).toMatchObject({ condition: "out_of_use", derived: "in_service", decided: "out_of_use" });
  });

  it("never puts back what the evidence takes out of use", () => {
    const { result } = derive([bolt("1", { ...BENT, decided: decided("in_service") })], {
      decided: decided("in_service"),
    });
    expect(result).toMatchObject({ condition: "out_of_use", derived: "out_of_use", decided: "in_service" });
    expect(result.bolts[0]?.condition).toBe("out_of_use");
  });

  it("settles a lesser report until something newer is seen", () => {
    const loose = [report({ kind: "nut_loose", observedAt: AFTER })];
    const of = (at: string) =>
      derive([bolt("1", { openReports: loose, decided: decided("in_service", at) })]).bolts[0];
    expect(of(LATER)).toBe("in_service");
    expect(of(EVENT)).toBe("check_first");
  });
});
