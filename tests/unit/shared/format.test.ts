import { describe, expect, it } from "vitest";
import {
  formatBearingDeg,
  formatCount,
  formatDistanceM,
  formatInstant,
  formatKn,
  formatList,
  formatNumber,
  formatPastDate,
  formatQuantity,
  formatRuns,
} from "@/lib/shared/format";

/** U+202F narrow no-break space, U+2212 minus: as the International System of Units asks a unit to be set apart. */
const thin = "\u202f";
const minus = "\u2212";

describe("numbers with a unit", () => {
  it("stand before their unit with a space that cannot break (SI Brochure 5.4.3)", () => {
    expect(formatQuantity(12.4, "kN")).toBe(`12.4${thin}kN`);
    expect(formatKn(4)).toBe(`4.0${thin}kN`);
  });

  it("have no space before the degree sign of an angle (SI Brochure 5.4.3, the exception)", () => {
    expect(formatQuantity(-3.2, "°")).toBe(`${minus}3.2°`);
    expect(formatQuantity(21, "°C")).toBe(`21${thin}°C`);
  });

  it("have a true minus, and no sign when they round to zero", () => {
    expect(formatNumber(-3.25)).toBe(`${minus}3.25`);
    expect(formatNumber(-0.001)).toBe("0");
    expect(formatNumber(-0.04, { digits: 1 })).toBe("0.0");
    expect(formatNumber(2, { signed: true })).toBe("+2");
  });

  it("keep the noughts that count and drop those that do not", () => {
    expect(formatNumber(100)).toBe("100");
    expect(formatNumber(1.5)).toBe("1.5");
    expect(formatNumber(1.5, { digits: 2 })).toBe("1.50");
  });

  it("are grouped in threes by a thin space, four digits not (SI Brochure 5.4.4)", () => {
    expect(formatNumber(1234)).toBe("1234");
    expect(formatNumber(43279.168)).toBe(`43${thin}279.17`);
  });

  it("refuse what is not a number", () => {
    expect(() => formatNumber(NaN)).toThrow(RangeError);
    expect(() => formatNumber(Infinity)).toThrow(RangeError);
  });
});

describe("distances and bearings", () => {
  it("change from metres to kilometres", () => {
    expect([2.34, 80.4, 999.6, 2400, 480_000].map(formatDistanceM)).toEqual([
      `2.3${thin}m`,
      `80${thin}m`,
      `1.0${thin}km`,
      `2.4${thin}km`,
      `480${thin}km`,
    ]);
  });

  it("have three digits", () => {
    expect([0, 62.4, 359.7, -90].map(formatBearingDeg)).toEqual(["000°", "062°", "000°", "270°"]);
  });
});

describe("dates of the past", () => {
  it("say as much as is known and no more", () => {
    expect(formatPastDate("2019-05-04")).toBe("4 May 2019");
    expect(formatPastDate("2019-05-01", "month")).toBe("May 2019");
    expect(formatPastDate("2019-01-01", "year")).toBe("2019");
    expect(formatPastDate("2005-01-01", "before")).toBe("before 2005");
    expect(formatPastDate("2005-06-15", "before")).toBe("before 15 June 2005");
  });

  it("tell a moment in the time of the place, over a change of the day", () => {
    expect(formatInstant("2026-06-01T23:05:00Z", "Atlantic/Azores")).toBe("1 June 2026, 23:05");
    expect(formatInstant("2026-12-31T23:30:00Z", "Europe/Berlin")).toBe("1 January 2027, 00:30");
  });
});

it("lists and counts read as sentences", () => {
  expect(formatList(["1", "2", "3"])).toBe("1, 2 and 3");
  expect(formatList(["1"])).toBe("1");
  expect(formatList([])).toBe("");
  expect([formatCount(1, "bolt"), formatCount(3, "bolt")]).toEqual(["1 bolt", "3 bolts"]);
});

describe("numbers of holes", () => {
  it("are joined to runs of three and more", () => {
    expect(formatRuns([3, 1, 2, 5])).toBe("1–3, 5");
    expect(formatRuns([1, 2])).toBe("1, 2");
    expect(formatRuns([4, 4])).toBe("4");
    expect(formatRuns([])).toBe("");
  });
});
