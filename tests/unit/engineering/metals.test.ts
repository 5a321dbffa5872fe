import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { metalAgainstClass, metalAgainstStressCorrosion, RESISTANCE_CLASSES } from "@/lib/engineering";
import type { Place, ResistanceClass } from "@/lib/engineering";

/** Grades by class: EN 1993-1-4:2006+A1:2015, Annex A, table A.3, as restated by independent papers. */
const TABLE: Readonly<Record<ResistanceClass, string>> = {
  I: "1.4003 1.4016 1.4512",
  II: "1.4301 1.4306 1.4307 1.4311 1.4318 1.4482 1.4541 1.4567",
  III: "1.4401 1.4404 1.4429 1.4432 1.4435 1.4571 1.4578 1.4062 1.4162 1.4362 1.4662",
  IV: "1.4439 1.4462 1.4539",
  V: "1.4410 1.4501 1.4507 1.4529 1.4547 1.4565",
};

describe("metalAgainstClass", () => {
  it.each(RESISTANCE_CLASSES)("accepts every grade of class %s there and below, and none above", (crc) => {
    const at = RESISTANCE_CLASSES.indexOf(crc);
    for (const metal of TABLE[crc].split(" ")) {
      RESISTANCE_CLASSES.forEach((wanted, index) => {
        const { accepted, reason, metalClass } = metalAgainstClass(metal, wanted);
        expect([metal, wanted, accepted, metalClass]).toEqual([metal, wanted, index <= at, crc]);
        expect(reason).toBe(index <= at ? "class-met" : "class-short");
      });
    }
  });

  it("passes titanium everywhere, also where the place is not known", () => {
    for (const metal of ["ti-1", "ti-2", "ti-3", "ti-4", "ti-5"]) {
      expect(metalAgainstClass(metal, "V")).toEqual({
        accepted: true,
        reason: "class-met",
        metalClass: "beyond",
      });
      expect(metalAgainstClass(metal, null).accepted).toBe(true);
    }
  });

  it("never accepts plated steel by class", () => {
    for (const metal of ["zinc-plated", "hot-dip-galvanised"]) {
      for (const crc of [...RESISTANCE_CLASSES, null]) {
        expect(metalAgainstClass(metal, crc)).toEqual({
          accepted: false,
          reason: "plated",
          metalClass: null,
        });
      }
    }
  });

  it("accepts nothing that is not known", () => {
    expect(metalAgainstClass(null, "I")).toMatchObject({ accepted: false, reason: "unknown-metal" });
    expect(metalAgainstClass("1.9999", "I")).toMatchObject({ accepted: false, reason: "unknown-metal" });
    expect(metalAgainstClass("ti-6", "I")).toMatchObject({ accepted: false, reason: "unknown-metal" });
    expect(metalAgainstClass("1.4404", null)).toEqual({
      accepted: false,
      reason: "place-unknown",
      metalClass: "III",
    });
  });
});

describe("metalAgainstStressCorrosion", () => {
  const at = (seaDistanceM: number | null, washing: Place["washing"], over: Partial<Place> = {}): Place => ({
    seaDistanceM,
    washing,
    coast: "other",
    saltedRoadDistanceM: null,
    so2: "low",
    ...over,
  });
  const level = (metal: string | null, place: Place) => metalAgainstStressCorrosion(metal, place).level;

  // Distances: common practice; accepted grades: EN 13451-1:2011.
  const A = "1.4301 1.4306 1.4307 1.4311 1.4318 1.4541 1.4567".split(" ");
  const B = "1.4401 1.4404 1.4429 1.4432 1.4435 1.4571 1.4578".split(" ");
  const OTHER = "1.4462 1.4539 1.4507 1.4410 1.4501 1.4016 1.4362".split(" ");
  const ACCEPTED = "1.4529 1.4547 1.4565 ti-1 ti-2 ti-5".split(" ");

  it.each(A)("stops %s unwashed up to 10 km and limits it washed up to 1 km", (metal) => {
    expect(level(metal, at(10_000, "none"))).toBe("stop");
    expect(level(metal, at(10_001, "none"))).toBe("ok");
    expect(level(metal, at(1_000, "rain"))).toBe("limit");
    expect(level(metal, at(1_001, "rain"))).toBe("ok");
  });

  it.each(B)("stops %s unwashed up to 1 km and limits it up to 10 km", (metal) => {
    expect(level(metal, at(1_000, "none"))).toBe("stop");
    expect(level(metal, at(1_001, "none"))).toBe("limit");
    expect(level(metal, at(10_000, "none"))).toBe("limit");
    expect(level(metal, at(10_001, "none"))).toBe("ok");
    expect(level(metal, at(0, "rain"))).toBe("ok");
  });

  it.each(OTHER)("limits %s, which is stainless but not accepted, unwashed up to 10 km", (metal) => {
    expect(level(metal, at(0, "none"))).toBe("limit");
    expect(level(metal, at(10_000, "none"))).toBe("limit");
    expect(level(metal, at(10_001, "none"))).toBe("ok");
  });

  it.each(ACCEPTED)("finds nothing against %s anywhere, even with place and washing not known", (metal) => {
    expect(level(metal, at(0, "none"))).toBe("ok");
    expect(level(metal, at(null, null, { warmDry: true }))).toBe("ok");
  });

  it("does not take a cleaning regime for rain", () => {
    expect(level("1.4301", at(5_000, "cleaned"))).toBe("stop");
  });

  it("notes warm and dry shelter from 10 to 100 km", () => {
    expect(level("1.4401", at(10_001, "none", { warmDry: true }))).toBe("note");
    expect(level("1.4401", at(100_000, "none", { warmDry: true }))).toBe("note");
    expect(level("1.4401", at(100_001, "none", { warmDry: true }))).toBe("ok");
    expect(level("1.4401", at(50_000, "rain", { warmDry: true }))).toBe("ok");
  });

  it("leaves plated steel to its own rule", () => {
    expect(level("zinc-plated", at(0, "none"))).toBe("ok");
  });

  it("asks when a fact is missing and could change the answer, and names it", () => {
    expect(metalAgainstStressCorrosion("1.4301", at(null, "none"))).toMatchObject({
      level: "ask",
      reason: "Not known: the distance to the sea.",
    });
    expect(level("1.4301", at(500, null))).toBe("ask");
    expect(level(null, at(500, "none"))).toBe("ask");
    expect(level("1.9999", at(500, "none"))).toBe("ask");
  });

  it("does not ask when every plausible value gives one answer", () => {
    expect(level("1.4404", at(null, "rain"))).toBe("ok");
    expect(level("1.4301", at(50_000, null))).toBe("ok");
    expect(level(null, at(50_000, "rain"))).toBe("ok");
    expect(level("1.4401", at(50_000, null, { warmDry: true }))).toBe("note");
  });

  it("never gets milder nearer to the sea or out of the rain", () => {
    const order = ["ok", "note", "limit", "stop"];
    fc.assert(
      fc.property(
        fc.constantFrom(...A, ...B, ...OTHER, ...ACCEPTED),
        fc.double({ min: 0, max: 200_000, noNaN: true }),
        fc.double({ min: 0, max: 200_000, noNaN: true }),
        fc.boolean(),
        (metal, a, b, warmDry) => {
          const near = level(metal, at(Math.min(a, b), "none", { warmDry }));
          expect(order.indexOf(near)).toBeGreaterThanOrEqual(
            order.indexOf(level(metal, at(Math.max(a, b), "none", { warmDry }))),
          );
          expect(order.indexOf(near)).toBeGreaterThanOrEqual(
            order.indexOf(level(metal, at(Math.min(a, b), "rain", { warmDry }))),
          );
        },
      ),
    );
  });

  it("refuses a negative distance by name", () => {
    expect(() => metalAgainstStressCorrosion("1.4401", at(-5, "rain"))).toThrowError(/^seaDistanceM/);
  });
});
