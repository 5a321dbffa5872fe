import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { placeClass } from "@/lib/engineering";
import type { Place } from "@/lib/engineering";

const base: Place = {
  seaDistanceM: 50_000,
  coast: "other",
  saltedRoadDistanceM: null,
  so2: "low",
  washing: "rain",
};
const place = (over: Partial<Place>): Place => ({ ...base, ...over });

describe("placeClass", () => {
  // Vectors of EN 1993-1-4:2006+A1:2015, Annex A: arithmetic on its published tables.
  const vectors: readonly [string, Partial<Place>, number, string][] = [
    ["indoor", { indoor: true }, 1, "I"],
    ["inland washed", {}, 0, "II"],
    ["inland sheltered, low SO2", { washing: "none" }, 0, "II"],
    ["inland, SO2 medium, sheltered", { so2: "medium", washing: "none" }, -12, "III"],
    ["5 km washed", { seaDistanceM: 5_000 }, -3, "II"],
    ["5 km sheltered", { seaDistanceM: 5_000, washing: "none" }, -10, "III"],
    ["5 km cleaned", { seaDistanceM: 5_000, washing: "cleaned" }, -5, "II"],
    ["0.5 km washed", { seaDistanceM: 500 }, -7, "III"],
    ["0.5 km sheltered", { seaDistanceM: 500, washing: "none" }, -14, "III"],
    ["0.5 km, SO2 medium, sheltered", { seaDistanceM: 500, so2: "medium", washing: "none" }, -19, "IV"],
    ["0.1 km washed", { seaDistanceM: 100 }, -15, "IV"],
    ["0.1 km cleaned", { seaDistanceM: 100, washing: "cleaned" }, -17, "IV"],
    ["0.1 km sheltered", { seaDistanceM: 100, washing: "none" }, -22, "V"],
    ["0.1 km Baltic washed", { seaDistanceM: 100, coast: "baltic-or-german-north-sea" }, -10, "III"],
    [
      "0.1 km Baltic sheltered",
      { seaDistanceM: 100, coast: "baltic-or-german-north-sea", washing: "none" },
      -17,
      "IV",
    ],
    ["salted tunnel, SO2 low", { saltTunnel: true, washing: "none" }, -17, "IV"],
    ["salted tunnel, SO2 medium", { saltTunnel: true, so2: "medium", washing: "none" }, -22, "V"],
    ["salted tunnel, SO2 high", { saltTunnel: true, so2: "high", washing: "none" }, -27, "V"],
    ["0.1 km, SO2 medium, washed: exactly -20", { seaDistanceM: 100, so2: "medium" }, -20, "IV"],
  ];
  it.each(vectors)("gives the published vector: %s", (_, over, crf, crc) => {
    expect(placeClass(place(over))).toMatchObject({ crf, crc });
  });

  it("reports the three factors of the example of 80 m, never washed", () => {
    expect(placeClass(place({ seaDistanceM: 80, washing: "none" }))).toEqual({
      f1: -15,
      f2: 0,
      f3: -7,
      crf: -22,
      crc: "V",
    });
  });

  // EN 1993-1-4 Annex A: upper ends belong to the harder band (inclusive end from memory).
  it.each([
    [10_000, -3],
    [10_000.1, 0],
    [1_000, -7],
    [1_000.1, -3],
    [250, -15],
    [250.1, -7],
    [0, -15],
  ])("puts a sea distance of %d m at F1 %d on an open coast", (seaDistanceM, f1) => {
    expect(placeClass(place({ seaDistanceM }))?.f1).toBe(f1);
  });

  // Southern-African adaptation, restated by a national stainless association.
  it.each([
    [250, -15],
    [251, -10],
    [500, -10],
    [501, -7],
    [5_000, -7],
    [5_001, -3],
    [10_000, -3],
    [10_001, 0],
  ])("puts a sea distance of %d m at F1 %d on a strict coast", (seaDistanceM, f1) => {
    expect(placeClass(place({ seaDistanceM, coast: "strict" }))?.f1).toBe(f1);
  });

  it.each([
    [10, -7],
    [10.1, -3],
    [100, -3],
    [100.1, 0],
    [null, 0],
  ])("puts a salted road at %s m at F1 %d", (saltedRoadDistanceM, f1) => {
    expect(placeClass(place({ saltedRoadDistanceM }))?.f1).toBe(f1);
  });

  it("takes the worse of sea and road", () => {
    expect(placeClass(place({ seaDistanceM: 5_000, saltedRoadDistanceM: 5 }))?.f1).toBe(-7);
    expect(placeClass(place({ seaDistanceM: 100, saltedRoadDistanceM: 5 }))?.f1).toBe(-15);
  });

  it("takes sulphur dioxide that is not known as low and washing that is not known as none", () => {
    const known = placeClass(place({ seaDistanceM: 500, washing: "none", so2: "low" }));
    expect(placeClass(place({ seaDistanceM: 500, washing: null, so2: null }))).toEqual(known);
  });

  it("has no answer for a sea distance that is not known, unless no distance could change it", () => {
    expect(placeClass(place({ seaDistanceM: null }))).toBeNull();
    expect(placeClass(place({ seaDistanceM: null, saltTunnel: true }))).toBeNull();
    expect(placeClass(place({ seaDistanceM: null, indoor: true }))?.crc).toBe("I");
    const baltic = place({ seaDistanceM: null, saltTunnel: true, coast: "baltic-or-german-north-sea" });
    expect(placeClass(baltic)?.f1).toBe(-10);
  });

  it("refuses a negative or endless distance by name", () => {
    expect(() => placeClass(place({ seaDistanceM: -1 }))).toThrowError(/^seaDistanceM must be 0 or more/);
    expect(() => placeClass(place({ seaDistanceM: NaN }))).toThrowError(RangeError);
    expect(() => placeClass(place({ saltedRoadDistanceM: Infinity }))).toThrowError(/^saltedRoadDistanceM/);
  });

  it("never asks for a milder class nearer to the sea", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 20_000, noNaN: true }),
        fc.double({ min: 0, max: 20_000, noNaN: true }),
        fc.constantFrom("other" as const, "strict" as const, "baltic-or-german-north-sea" as const),
        fc.constantFrom("rain" as const, "cleaned" as const, "none" as const),
        (a, b, coast, washing) => {
          const near = placeClass(place({ seaDistanceM: Math.min(a, b), coast, washing }));
          const far = placeClass(place({ seaDistanceM: Math.max(a, b), coast, washing }));
          expect(near?.crf ?? 1).toBeLessThanOrEqual(far?.crf ?? -99);
        },
      ),
    );
  });
});
