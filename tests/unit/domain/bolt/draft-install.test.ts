import { describe, expect, it } from "vitest";
import { type InstallFactsToCheck, installProblems } from "@/lib/domain/bolt/draft-install";

const rod = { name: "8 mm rod", form: "glued_bent_rod", allowedMethods: ["epoxy"] } as const;
const around = { type: rod, formerInstalledOn: "2019-04-01", today: "2026-06-01" };
const paths = (facts: InstallFactsToCheck, more: Partial<typeof around> | { type: null } = {}) =>
  installProblems(facts, { ...around, ...more }).map(({ path }) => path);

describe("an install that cannot be", () => {
  it("is not one that fits its type, glue and date", () => {
    expect(paths({ method: "epoxy", adhesiveId: "x", installedOn: "2026-06-01" })).toEqual([]);
  });

  it("has neither a type nor a build", () => {
    expect(paths({}, { type: null })).toEqual(["boltTypeId"]);
    expect(paths({ form: "sleeve_hanger" }, { type: null })).toEqual([]);
  });

  it("contradicts its type", () => {
    expect(paths({ form: "sleeve_hanger" })).toEqual(["form"]);
    expect(paths({ method: "polyester" })).toEqual(["method"]);
  });

  it("sets a glued build without glue, or a mechanical bolt with glue", () => {
    expect(paths({ form: "glued_eye", method: "mechanical" }, { type: null })).toEqual(["method"]);
    expect(paths({ form: "sleeve_hanger", method: "mechanical", adhesiveId: "x" }, { type: null })).toEqual([
      "adhesiveId",
    ]);
  });

  it("lies in the future or before the bolt it replaces", () => {
    expect(paths({ installedOn: "2026-06-02" })).toEqual(["installedOn"]);
    expect(paths({ installedOn: "2019-03-31" })).toEqual(["installedOn"]);
  });
});
