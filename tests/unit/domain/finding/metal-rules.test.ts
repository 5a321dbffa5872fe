import { describe, expect, it } from "vitest";
import type { BoltFacts, PlaceFacts } from "@/lib/domain/finding/evidence";
import { found, inRock, levelOf, NO_CARE } from "@/tests/support/evidence";

type Washing = PlaceFacts["washing"];
const at = (seaDistanceM: number | null, washing: Washing, more: Partial<PlaceFacts> = {}) => ({
  seaDistanceM,
  washing,
  ...more,
});
const of = (metal: string | null, place: Partial<PlaceFacts>, bolt: Partial<BoltFacts> = {}) =>
  inRock("protection", { bolt: { metal, hangerMetal: metal, ...bolt }, place });

describe("metal.class", () => {
  const level = (metal: string, place: Partial<PlaceFacts>, bolt: Partial<BoltFacts> = {}) =>
    levelOf(of(metal, place, bolt), "metal.class");

  // Classes by EN 1993-1-4 Annex A: 100 m unwashed V, 100 m washed IV, 500 m washed III, 5 km washed II.
  it.each([
    ["1.4401", at(100, "none"), "stop"],
    ["1.4462", at(100, "none"), "limit"],
    ["1.4547", at(100, "none"), "note"],
    ["ti-2", at(100, "none"), null],
    ["1.4301", at(100, "rain"), "stop"],
    ["1.4401", at(100, "rain"), "limit"],
    ["1.4462", at(100, "rain"), "note"],
    ["1.4301", at(500, "rain"), "limit"],
    ["1.4401", at(500, "rain"), "note"],
    ["1.4301", at(5_000, "rain"), "note"],
    ["1.4401", at(5_000, "rain"), null],
  ])("%s at %o: %s", (metal, place, expected) => {
    expect(level(metal, place)).toBe(expected);
  });

  it("asks for distance and washing only where the answer could change", () => {
    expect(level("1.4401", at(null, "rain"))).toBe("ask");
    expect(level("1.4301", at(5_000, null))).toBe("ask");
    expect(level("1.4401", at(5_000, null))).toBe("note");
    expect(level("1.4401", at(500, null))).toBe("note");
    expect(level("ti-2", at(null, null))).toBeNull();
    expect(level("1.4547", at(null, null))).toBe("note");
  });

  it("takes the near side of a distance that is doubtful", () => {
    expect(level("1.4401", at(300, "rain"))).toBe("note");
    expect(level("1.4401", at(300, "rain", { seaDistanceErrorM: 60 }))).toBe("limit");
  });

  it("judges the worst part and says which", () => {
    const finding = found(of("ti-2", at(100, "none"), { hangerMetal: "1.4301" }), "metal.class");
    expect(finding).toMatchObject({ level: "stop", numbers: { part: "hanger", metal: "1.4301" } });
  });

  it("lets a replaceable link limit, not stop", () => {
    expect(level("ti-2", at(100, "none"), { linkMetal: "1.4301" })).toBe("limit");
  });

  it("names metals that suit the place", () => {
    const clears = found(of("1.4401", at(100, "none")), "metal.class")?.clearsWhen ?? "";
    for (const metal of ["1.4529", "1.4547", "1.4565", "titanium"]) expect(clears).toContain(metal);
    for (const metal of ["1.4401", "1.4462", "1.4539"]) expect(clears).not.toContain(metal);
  });
});

describe("metal.stress-corrosion", () => {
  const level = (metal: string, place: Partial<PlaceFacts>, bolt: Partial<BoltFacts> = {}) =>
    levelOf(of(metal, place, bolt), "metal.stress-corrosion");

  it.each([
    ["1.4301", at(10_000, "none"), "stop"],
    ["1.4301", at(10_001, "none"), null],
    ["1.4301", at(9_000, "cleaned"), "stop"],
    ["1.4401", at(1_000, "none"), "stop"],
    ["1.4401", at(1_001, "none"), "limit"],
    ["1.4462", at(100, "none"), "limit"],
    ["1.4301", at(1_000, "rain"), "limit"],
    ["1.4401", at(50, "rain"), null],
    ["1.4547", at(0, "none"), null],
    ["1.4401", at(50_000, "none", { warmDry: true }), "note"],
    ["1.4301", at(null, "none"), "ask"],
    ["1.4301", at(500, null), "ask"],
    ["1.4401", at(null, "rain"), null],
  ])("%s at %o: %s", (metal, place, expected) => {
    expect(level(metal, place)).toBe(expected);
  });

  it("still limits a grade that meets the class: 1.4462 unwashed, 1.1 km from the sea", () => {
    expect(levelOf(of("1.4462", at(1_100, "none")), "metal.class")).toBeNull();
    expect(level("1.4462", at(1_100, "none"))).toBe("limit");
  });

  it("stops a link too: cracking is not seen", () => {
    expect(level("ti-2", at(100, "none"), { linkMetal: "1.4401" })).toBe("stop");
  });

  it("stops a grade at the whole site after one confirmed fracture, and no other grade", () => {
    const care = { ...NO_CARE, fracturedMetals: ["1.4404"] };
    const after = (metal: string) =>
      levelOf({ ...of(metal, at(50_000, "rain")), care }, "metal.stress-corrosion");
    expect(after("1.4404")).toBe("stop");
    expect(after("1.4401")).toBeNull();
  });
});

describe("metal.plated", () => {
  const level = (place: Partial<PlaceFacts>, bolt: Partial<BoltFacts> = {}) =>
    levelOf(of("zinc-plated", place, { installedOn: "2025-01-01", ...bolt }), "metal.plated");

  it("takes the place of metal.class", () => {
    expect(levelOf(of("zinc-plated", at(100, "none")), "metal.class")).toBeNull();
  });

  it("limits anywhere outdoors, stops up to 1 km from the sea", () => {
    expect(level(at(50_000, "rain"))).toBe("limit");
    expect(level(at(1_001, "rain"))).toBe("limit");
    expect(level(at(1_000, "rain"))).toBe("stop");
  });

  it("stops at rust grade 3", () => {
    expect(level(at(50_000, "rain"), { rustGrade: 2 })).toBe("limit");
    expect(level(at(50_000, "rain"), { rustGrade: 3 })).toBe("stop");
  });

  it("stops a tenth of the section by computation: M10 in C3 between 26 and 27 years", () => {
    // Zinc 8 µm at 2.1 µm/yr linear 3.81 yr (ISO 9223 C3); steel 50 µm first year, ISO 9224: depth for a
    // tenth of 10 mm is 256.6 µm = 239.6 + 6.27 (t − 20), t = 22.7 years; together 26.5 years (arithmetic).
    expect(level(at(50_000, "rain"), { installedOn: "2000-06-01" })).toBe("limit");
    expect(level(at(50_000, "rain"), { installedOn: "1999-06-01" })).toBe("stop");
    const years = found(of("zinc-plated", at(50_000, "rain")), "metal.plated")?.numbers[
      "yearsUntilTenPercentLost"
    ];
    expect(years).toBeCloseTo(3.81 + 22.7, 1);
  });

  it("gives hot-dip its 50 µm, and a measured coating what was measured", () => {
    const years = (metal: string, coatingThicknessUm: number | null) =>
      Number(
        found(of(metal, at(50_000, "rain"), { coatingThicknessUm }), "metal.plated")?.numbers[
          "yearsUntilTenPercentLost"
        ],
      );
    expect(years("hot-dip-galvanised", null) - years("zinc-plated", null)).toBeCloseTo(42 / 2.1, 6);
    // 5 µm at the C3 upper rate: 2.38 years, linear (ISO 9223).
    expect(years("zinc-plated", 5) - years("zinc-plated", 8)).toBeCloseTo(2.38 - 3.81, 2);
  });

  it("asks for a date that matters, and takes 'before' as the least age", () => {
    expect(level(at(50_000, "rain"), { installedOn: null })).toBe("ask");
    expect(level(at(500, "rain"), { installedOn: null })).toBe("stop");
    expect(level(at(50_000, "rain"), { installedOn: "1995-01-01", installedOnPrecision: "before" })).toBe(
      "stop",
    );
    expect(level(at(50_000, "rain"), { installedOn: "2015-01-01", installedOnPrecision: "before" })).toBe(
      "ask",
    );
  });

  it("asks for the distance to the sea and for a diameter that matters", () => {
    expect(level(at(null, "rain"))).toBe("ask");
    const unsized = { shankDiameterMm: null, holeDiameterMm: null };
    expect(level(at(50_000, "rain"), { ...unsized, installedOn: "2002-01-01" })).toBe("ask");
    expect(level(at(50_000, "rain"), unsized)).toBe("limit");
  });

  it("lets a plated link limit where a bolt would stop", () => {
    expect(levelOf(of("ti-2", at(100, "rain"), { linkMetal: "zinc-plated" }), "metal.plated")).toBe("limit");
    expect(levelOf(of("ti-2", at(null, "rain"), { linkMetal: "zinc-plated" }), "metal.plated")).toBe("limit");
    expect(levelOf(of("ti-2", at(100, "rain"), { hangerMetal: "zinc-plated" }), "metal.plated")).toBe("stop");
  });
});

describe("metal.mixed", () => {
  const level = (metal: string, hangerMetal: string | null, place = at(50_000, "rain"), bolt = {}) =>
    levelOf(of(metal, place, { hangerMetal, ...bolt }), "metal.mixed");

  it("limits stainless with plated anywhere", () => {
    expect(level("1.4401", "zinc-plated")).toBe("limit");
    expect(level("hot-dip-galvanised", "1.4301")).toBe("limit");
  });

  it("limits any two families up to 1 km from the sea and notes them beyond", () => {
    expect(level("ti-2", "1.4401", at(1_000, "rain"))).toBe("limit");
    expect(level("ti-2", "1.4401", at(1_001, "rain"))).toBe("note");
    expect(level("ti-2", "1.4401", at(null, "rain"))).toBe("limit");
  });

  it("says nothing of two grades of one family", () => {
    expect(level("1.4401", "1.4301", at(100, "rain"))).toBeNull();
  });

  it("notes a link of another family and a hanger that is not on record", () => {
    expect(level("1.4401", "1.4401", at(100, "rain"), { linkMetal: "zinc-plated" })).toBe("note");
    expect(level("1.4401", null)).toBe("note");
    expect(level("1.4401", null, at(50_000, "rain"), { form: "glued_eye" })).toBeNull();
  });
});

describe("metal.unknown", () => {
  const level = (place: Partial<PlaceFacts>, bolt: Partial<BoltFacts> = {}) =>
    levelOf(of(null, place, bolt), "metal.unknown");

  it("asks when nothing narrows it", () => {
    expect(level(at(50_000, "rain"))).toBe("ask");
    expect(level(at(100, "none"))).toBe("ask");
    expect(level(at(null, null))).toBe("ask");
  });

  it("takes a name that is in no table for not known", () => {
    expect(levelOf(of("1.9999", at(50_000, "rain")), "metal.unknown")).toBe("ask");
    expect(levelOf(of("V4A", at(50_000, "rain")), "metal.unknown")).toBe("ask");
  });

  it("lets magnet and rust narrow it to carbon steel, with the outcome of carbon steel", () => {
    const rusty = { magnetic: true, rustGrade: 2 };
    expect(level(at(500, "rain"), rusty)).toBe("stop");
    expect(level(at(50_000, "rain"), { ...rusty, installedOn: "2025-01-01" })).toBe("limit");
    expect(level(at(50_000, "rain"), { ...rusty, installedOn: null })).toBe("ask");
  });

  it("lets a magnet that does not stick clear it inland, where every such metal will do", () => {
    expect(level(at(50_000, "rain"), { magnetic: false })).toBe("note");
    expect(level(at(100, "none"), { magnetic: false })).toBe("ask");
  });

  it("is silent once the metal is on record", () => {
    expect(levelOf(of("1.4301", at(50_000, "rain")), "metal.unknown")).toBeNull();
  });
});
