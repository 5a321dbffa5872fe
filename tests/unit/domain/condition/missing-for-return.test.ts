import { describe, expect, it } from "vitest";
import { type BoltForReturn, missingForReturn } from "@/lib/domain/condition/missing-for-return";

const rule = { secondPerson: false, returnedBy: "anna", anchorReportsOpen: 0 };
const bolt = (more: Partial<BoltForReturn> = {}): BoltForReturn => ({
  placementNumber: 2,
  outOfUse: false,
  newerThanEvent: false,
  check: { byUserId: "anna", hasPhoto: true },
  ...more,
});

describe("what is missing before an anchor comes back", () => {
  it("is nothing when every bolt that carried the event was checked with a photo", () => {
    expect(missingForReturn([bolt(), bolt({ placementNumber: 3 })], rule)).toEqual([]);
  });

  it("names the bolt that was not checked, and the check without a photo", () => {
    const missing = missingForReturn(
      [bolt({ check: null }), bolt({ placementNumber: 3, check: { byUserId: "anna", hasPhoto: false } })],
      rule,
    );
    expect(missing.map(({ path }) => path)).toEqual(["placements.2", "placements.3"]);
  });

  it("spares a bolt that is out of use or was set after the event", () => {
    expect(
      missingForReturn(
        [bolt({ outOfUse: true, check: null }), bolt({ newerThanEvent: true, check: null })],
        rule,
      ),
    ).toEqual([]);
  });

  it("asks for a second person where the area does", () => {
    const two = { ...rule, secondPerson: true };
    expect(missingForReturn([bolt()], two)).toHaveLength(1);
    expect(missingForReturn([bolt({ check: { byUserId: "ben", hasPhoto: true } })], two)).toEqual([]);
  });

  it("waits for the answer to a report about the whole anchor", () => {
    expect(missingForReturn([bolt()], { ...rule, anchorReportsOpen: 1 })).toMatchObject([
      { path: "reports" },
    ]);
  });
});
