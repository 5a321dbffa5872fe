import { describe, expect, it } from "vitest";
import { closuresAround } from "@/lib/commands/evaluation/closures-around";
import { conditionInForce } from "@/lib/commands/evaluation/condition-in-force";
import { type BoltOfWarning, matchWarnings } from "@/lib/commands/evaluation/match-warnings";

const NOW = new Date("2026-06-01T12:00:00Z");
const audit = { createdAt: NOW, createdBy: null, updatedAt: NOW, updatedBy: null, version: 1, digest: null };

describe("a batch warning", () => {
  const bolt: BoltOfWarning = {
    areaId: "a",
    boltTypeId: "rod",
    adhesiveId: "glue",
    metals: ["1.4404", "1.4301"],
    batch: "L-204/7",
    adhesiveBatch: null,
    installedOn: "2019-05-04",
    installedOnPrecision: "day",
  };
  const warning = {
    ...audit,
    id: "w",
    areaId: null,
    title: "Welds",
    body: "",
    says: "stop" as const,
    boltTypeId: null,
    adhesiveId: null,
    metal: null,
    batchPattern: null,
    installedFrom: null,
    installedTo: null,
    source: null,
    publishedAt: NOW,
    closedAt: null,
  };
  const match = (more: Partial<typeof warning> | object, of: Partial<BoltOfWarning> = {}) =>
    matchWarnings({ ...bolt, ...of }, [{ ...warning, ...more }])[0]?.match ?? null;

  it("concerns its type, its metal on any part, its area, and nothing else", () => {
    expect(match({ boltTypeId: "rod" })).toBe("exact");
    expect(match({ boltTypeId: "stud" })).toBeNull();
    expect(match({ metal: "1.4301" })).toBe("exact");
    expect(match({ metal: "1.4462" })).toBeNull();
    expect(match({ areaId: "b" })).toBeNull();
  });

  it("asks for the batch where that is all that is not known", () => {
    expect(match({ boltTypeId: "rod", batchPattern: "L-2*" })).toBe("exact");
    expect(match({ boltTypeId: "rod", batchPattern: "l-204/7 " })).toBe("exact");
    expect(match({ boltTypeId: "rod", batchPattern: "L-3*" })).toBeNull();
    expect(match({ boltTypeId: "rod", batchPattern: "L-2*" }, { batch: null })).toBe("batch_unknown");
    expect(match({ adhesiveId: "glue", batchPattern: "L-2*" })).toBe("batch_unknown");
  });

  it("takes its pattern literally but for the star", () => {
    expect(match({ batchPattern: "L.204" }, { batch: "LX204" })).toBeNull();
    expect(match({ batchPattern: "(L)*" }, { batch: "(L)9" })).toBe("exact");
  });

  it("is not cleared by a date that may lie inside its period", () => {
    const period = { installedFrom: "2019-06-01", installedTo: "2020-12-31" };
    expect(match(period)).toBeNull();
    expect(match(period, { installedOnPrecision: "year" })).toBe("exact");
    expect(match(period, { installedOn: null })).toBe("exact");
    expect(match(period, { installedOn: "2019-06-01", installedOnPrecision: "before" })).toBeNull();
    expect(match(period, { installedOn: "2021-06-01", installedOnPrecision: "before" })).toBe("exact");
  });
});

describe("a yearly closure", () => {
  const row = {
    ...audit,
    id: "c",
    areaId: "a",
    siteId: null,
    anchorId: null,
    reason: "Nesting",
    startsOn: "2020-02-01",
    endsOn: "2020-07-15",
    yearly: true,
    source: null,
    liftedAt: null,
  };
  const at = (onDate: string, more: object = {}) =>
    closuresAround([{ ...row, ...more }], { areaId: "a", siteId: "s", anchorId: "x", onDate });

  it("comes back every year", () => {
    expect(at("2026-06-01")[0]).toMatchObject({ startsOn: "2026-02-01", endsOn: "2026-07-15" });
    expect(at("2026-08-01")[0]).toMatchObject({ startsOn: "2027-02-01" });
  });

  it("may run over the turn of the year", () => {
    const winter = { startsOn: "2020-11-01", endsOn: "2021-02-28" };
    expect(at("2026-01-10", winter)[0]).toMatchObject({ startsOn: "2025-11-01", endsOn: "2026-02-28" });
  });

  it("of another site or anchor is no matter here", () => {
    expect(at("2026-06-01", { siteId: "other" })).toEqual([]);
    expect(at("2026-06-01", { anchorId: "other" })).toEqual([]);
  });
});

describe("an anchor that an event took out of use", () => {
  const sound = {
    condition: "in_service",
    derived: "in_service",
    decided: null,
    why: [],
    outOfUseSince: null,
  } as const;

  it("stays out of use when the evidence alone says otherwise", () => {
    expect(conditionInForce({ outOfUseSince: NOW }, sound)).toEqual({
      condition: "out_of_use",
      derivedCondition: "in_service",
      outOfUseSince: NOW,
    });
    expect(conditionInForce({ outOfUseSince: null }, sound).condition).toBe("in_service");
  });

  it("is counted from its latest event", () => {
    const again = {
      ...sound,
      condition: "out_of_use",
      derived: "out_of_use",
      outOfUseSince: "2026-06-02T00:00:00.000Z",
    } as const;
    expect(conditionInForce({ outOfUseSince: NOW }, again).outOfUseSince?.toISOString()).toBe(
      again.outOfUseSince,
    );
  });
});
