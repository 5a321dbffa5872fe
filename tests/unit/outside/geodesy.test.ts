import { distance } from "@turf/turf";
import geodesic from "geographiclib-geodesic";
import { describe, expect, it } from "vitest";

/** Degrees, minutes, seconds as printed in the source. */
const dms = (d: number, m: number, s: number) => Math.sign(d) * (Math.abs(d) + m / 60 + s / 3600);

// Geoscience Australia's test line on GRS80 (Flinders Peak to Buninyong): 54,972.271 m.
const FLINDERS = { lat: dms(-37, 57, 3.7203), lon: dms(144, 25, 29.5244) };
const BUNINYONG = { lat: dms(-37, 39, 10.1561), lon: dms(143, 55, 35.3839) };

describe("distances on the ellipsoid", () => {
  it("geographiclib meets the published Geoscience Australia line to 1 mm", () => {
    const line = geodesic.Geodesic.WGS84.Inverse(FLINDERS.lat, FLINDERS.lon, BUNINYONG.lat, BUNINYONG.lon);
    expect(Math.abs((line.s12 ?? NaN) - 54_972.271)).toBeLessThan(0.001);
  });

  it("a great circle differs from that line by the published amount, so spans never use it", () => {
    // A sphere of 6,371,008.8 m gives 54,925.51 m on the same line (arithmetic on the haversine formula).
    const metres = distance([FLINDERS.lon, FLINDERS.lat], [BUNINYONG.lon, BUNINYONG.lat], {
      units: "meters",
    });
    expect(metres).toBeCloseTo(54_925.51, 1);
  });
});
