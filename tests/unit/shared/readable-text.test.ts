import { describe, expect, it } from "vitest";
import { readableText } from "@/lib/shared/readable-text";

const thin = "\u202f";

describe("a stored sentence", () => {
  it("is shown with numbers that hold on to their unit", () => {
    expect(readableText("12.0 kN across, 27 mm deep, 91 % of it, 2.4 km away, 20 m/s, 4 °C")).toBe(
      `12.0${thin}kN across, 27${thin}mm deep, 91${thin}% of it, 2.4${thin}km away, 20${thin}m/s, 4${thin}°C`,
    );
  });

  it("leaves words alone that only begin like a unit", () => {
    expect(readableText("4 main bolts, 3 months, 2 kNives")).toBe("4 main bolts, 3 months, 2 kNives");
  });

  it("says days in words, and leaves moments and codes as they are", () => {
    expect(readableText("Last checked on 2013-08-03; batch 2013-08-031.")).toBe(
      "Last checked on 3 August 2013; batch 2013-08-031.",
    );
    expect(readableText("2026-10-24T10:20:00.000Z")).toBe("2026-10-24T10:20:00.000Z");
  });
});
