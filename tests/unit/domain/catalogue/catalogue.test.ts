import { describe, expect, it } from "vitest";
import { catalogueMatrix } from "@/lib/domain/catalogue/catalogue-matrix";
import type { CatalogueType } from "@/lib/domain/catalogue/catalogue-matrix";
import { familyOf, metalName, METALS, strengthOf } from "@/lib/domain/catalogue/metals";
import { metalsThatPass } from "@/lib/domain/catalogue/metals-that-pass";
import { placeKinds } from "@/lib/domain/catalogue/place-kinds";
import { DEFAULT_POLICY } from "@/lib/domain/policy";
import type { Use } from "@/lib/domain/vocabulary";
import { USES } from "@/lib/domain/vocabulary";
import { MILD_PLACE, TODAY } from "@/tests/support/evidence";

const STUD: CatalogueType = {
  form: "expansion_stud_hanger",
  metal: "1.4401",
  hangerMetal: "1.4401",
  shankDiameterMm: 10,
  holeDiameterMm: 10,
  lengthMm: 90,
  ratedRadialKn: 25,
  ratedAxialKn: 15,
  standard: "EN 959:2018",
  allowedMethods: ["mechanical"],
};

const verdict = (type: CatalogueType, use: Use, place: string) =>
  catalogueMatrix(type, DEFAULT_POLICY, TODAY).cells.find((cell) => cell.use === use && cell.place === place)
    ?.verdict;

describe("catalogueMatrix", () => {
  it("holds one cell for every use and kind of place", () => {
    const { cells } = catalogueMatrix(STUD, DEFAULT_POLICY, TODAY);
    expect(cells).toHaveLength(USES.length * placeKinds.length);
    expect(new Set(cells.map((cell) => `${cell.use} ${cell.place}`)).size).toBe(cells.length);
  });

  it("finds nothing against an ordinary stainless stud inland, and refuses it sheltered by the sea", () => {
    expect(verdict(STUD, "protection", "inland_washed")).toBe("nothing_against");
    expect(verdict(STUD, "belay", "sea_5km_washed")).toBe("nothing_against");
    expect(verdict(STUD, "protection", "sea_500m_washed")).toBe("nothing_against");
    expect(verdict(STUD, "protection", "sea_100m_washed")).toBe("within_limits");
    expect(verdict(STUD, "protection", "sea_100m_sheltered")).toBe("do_not_use");
    expect(verdict(STUD, "protection", "sea_5km_sheltered")).toBe("within_limits");
  });

  it("asks for bend onset on a highline", () => {
    expect(verdict(STUD, "highline", "inland_washed")).toBe("not_enough_known");
    expect(verdict({ ...STUD, bendOnsetKn: 20, bendOnsetBasis: "tested" }, "highline", "inland_washed")).toBe(
      "nothing_against",
    );
  });

  it("judges plated steel as placed new: limits inland, refused by the sea", () => {
    const plated = { ...STUD, metal: "zinc-plated", hangerMetal: "zinc-plated" };
    expect(verdict(plated, "protection", "inland_washed")).toBe("within_limits");
    expect(verdict(plated, "protection", "sea_500m_washed")).toBe("do_not_use");
  });

  it("says what it takes for granted, and sees a type too short for the standard", () => {
    const { assumed, cells } = catalogueMatrix({ ...STUD, lengthMm: 30 }, DEFAULT_POLICY, TODAY);
    expect(assumed).toContain("set 30 mm deep");
    expect(cells.every((cell) => cell.verdict === "do_not_use")).toBe(true);
  });
});

describe("metals", () => {
  // ASTM B348 tabulates ksi: grade 2 40/50, grade 5 120/130 (1 ksi = 6.894757 MPa, NIST SP 811); its MPa
  // are rounded.
  it.each([
    ["ti-2", 40, 50],
    ["ti-5", 120, 130],
  ])("carries %s at the strengths of ASTM B348, to a rounded MPa", (metal, yieldKsi, ultimateKsi) => {
    const strength = strengthOf(metal);
    expect(Math.abs((strength?.yieldMpa ?? NaN) - yieldKsi * 6.894757)).toBeLessThan(1);
    expect(Math.abs((strength?.ultimateMpa ?? NaN) - ultimateKsi * 6.894757)).toBeLessThan(1.5);
  });

  // ISO 3506-1, class 50 (annealed): Rp0.2 210 MPa, Rm 500 MPa. Bar of the same grades may not claim more.
  it("does not credit annealed austenitic bar with more than ISO 3506-1 class 50 asks of it", () => {
    for (const metal of ["1.4301", "1.4307", "1.4401", "1.4404", "1.4571"]) {
      expect(strengthOf(metal)?.yieldMpa).toBeLessThanOrEqual(210);
      expect(strengthOf(metal)?.ultimateMpa).toBe(500);
    }
  });

  it("has no figure for a metal without a source, and none for plated steel", () => {
    expect(strengthOf("1.4306")).toBeNull();
    expect(strengthOf("zinc-plated")).toBeNull();
    expect(strengthOf(null)).toBeNull();
  });

  it("knows the family of every metal it offers, and of nothing else", () => {
    for (const metal of METALS) expect(familyOf(metal)).not.toBeNull();
    for (const metal of [null, "V4A", "316L", "ti-6", ""]) expect(familyOf(metal)).toBeNull();
  });

  it("names metals as people write them", () => {
    expect(metalName("ti-2")).toBe("titanium grade 2");
    expect(metalName("1.4404")).toBe("1.4404");
    expect(metalName(null)).toBe("metal not known");
  });

  it("offers for an unwashed place by the sea only what pool codes accept", () => {
    // EN 13451-1:2011: 1.4529, 1.4547, 1.4565.
    const words = metalsThatPass({ ...MILD_PLACE, seaDistanceM: 50, washing: "none" });
    expect(words).toBe("1.4529, 1.4547, 1.4565 and titanium");
    expect(metalsThatPass({ ...MILD_PLACE, seaDistanceM: null, washing: null })).toBe(words);
    expect(metalsThatPass(MILD_PLACE)).toContain("1.4301");
  });
});
