import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { formatDegrees, frameTicks, graticuleStepMin, graticuleValues } from "@/lib/map/graticule";
import { parseCamera, writeCamera } from "@/lib/map/map-params";
import { metresPerPixel, scaleBar } from "@/lib/map/scale-bar";

describe("the scale bar", () => {
  // Metres per pixel at the equator, tiles of 256 pixels, zoom 0: 156 543.03 (OGC 17-083r4, annex D,
  // WebMercatorQuad: cell size 156543.033928041). Tiles of 512 pixels are one zoom step finer.
  it("agrees with the published cell size of the web's Mercator tiles", () => {
    expect(metresPerPixel(0, 0) * 2).toBeCloseTo(156_543.033928041, 3);
    expect(metresPerPixel(0, 17) * 2).toBeCloseTo(1.194_328_566, 6);
  });

  it("is half as long at 60° of latitude: the cosine is a half", () => {
    expect(metresPerPixel(60, 10)).toBeCloseTo(metresPerPixel(0, 10) / 2, 6);
  });

  it("is always 1, 2 or 5 times a power of ten, and never wider than its room", () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 1e5, noNaN: true }), (perPixelM) => {
        const { lengthM, widthPx } = scaleBar(perPixelM, 104);
        const digit = lengthM / 10 ** Math.floor(Math.log10(lengthM) + 1e-9);
        expect([1, 2, 5].some((d) => Math.abs(digit - d) < 1e-6)).toBe(true);
        expect(widthPx).toBeLessThanOrEqual(104 * (1 + 1e-9));
        expect(widthPx).toBeGreaterThan(104 * 0.39);
      }),
      { seed: 46, numRuns: 300 },
    );
  });
});

describe("the degrees in the margin", () => {
  it("are written with the hemisphere, tenths of a minute only where the step asks for them", () => {
    expect(formatDegrees(46.9, "lat", 5)).toBe("46°54′N");
    expect(formatDegrees(-34.2, "lon", 1)).toBe("34°12′W");
    expect(formatDegrees(-34 - 0.2 / 60, "lon", 0.1)).toBe("34°00.2′W");
    expect(formatDegrees(0, "lat", 60)).toBe("0°");
    expect(formatDegrees(10, "lon", 300)).toBe("10°E");
  });

  it("carry a rounded-up minute into the degree", () => {
    expect(formatDegrees(46.99999, "lat", 1)).toBe("47°00′N");
  });

  it("stand at whole multiples of the step", () => {
    expect(graticuleValues(46.76, 47.05, 5).map((v) => Math.round(v * 60))).toEqual([2810, 2815, 2820]);
    expect(graticuleStepMin(0.29, 4)).toBe(5);
    expect(graticuleStepMin(Number.NaN, 4)).toBe(1800);
  });

  it("stand where the map draws them: the middle parallel of the projection is in the middle", () => {
    const { left, top } = frameTicks([-1, -1, 1, 1], { widthPx: 300, heightPx: 300 });
    expect(top.find((tick) => tick.label === "0°00′" || tick.label === "0°")?.atPx).toBeCloseTo(150);
    expect(left.find((tick) => tick.label === "0°00′" || tick.label === "0°")?.atPx).toBeCloseTo(150);
  });
});

describe("the camera in the address", () => {
  it("comes back as it was written, to about a metre", () => {
    expect(parseCamera(writeCamera({ lat: 46.912345, lon: -34.199996, zoom: 11.256 }))).toEqual({
      lat: 46.91235,
      lon: -34.2,
      zoom: 11.26,
    });
  });

  it.each(["", "46.9", "46.9,-34.2", "99,0,3", "0,200,3", "0,0,40", "a,b,c", "46.9,-34.2,11,2", "1e1,0,3"])(
    "is as good as absent when it reads %j",
    (text) => expect(parseCamera(text)).toBeNull(),
  );
});
