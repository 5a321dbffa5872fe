import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { compassPoint, directionOnFace } from "@/components/anchor/face-projection";

describe("a direction in the frame of the face", () => {
  // Geometry anybody can check with a hand on a wall: facing a wall that looks south, you look north, east is right.
  it.each([
    {
      what: "east, on a wall that looks south",
      azimuthDeg: 90,
      elevationDeg: 0,
      face: 180,
      x: 1,
      y: 0,
      out: 0,
    },
    {
      what: "south, on a wall that looks south",
      azimuthDeg: 180,
      elevationDeg: 0,
      face: 180,
      x: 0,
      y: 0,
      out: 1,
    },
    { what: "straight up", azimuthDeg: 0, elevationDeg: 90, face: 180, x: 0, y: 1, out: 0 },
    {
      what: "north, on a wall that looks west",
      azimuthDeg: 0,
      elevationDeg: 0,
      face: 270,
      x: -1,
      y: 0,
      out: 0,
    },
  ])("$what", ({ azimuthDeg, elevationDeg, face, x, y, out }) => {
    const seen = directionOnFace({ azimuthDeg, elevationDeg }, { azimuthDeg: face, dipDeg: 90 });
    expect(seen.x).toBeCloseTo(x, 9);
    expect(seen.y).toBeCloseTo(y, 9);
    expect(seen.out).toBeCloseTo(out, 9);
  });

  it("pulls out of a flat slab only upward", () => {
    const up = directionOnFace({ azimuthDeg: 0, elevationDeg: 90 }, { azimuthDeg: 10, dipDeg: 0 });
    expect(up.out).toBeCloseTo(1, 9);
  });

  it("keeps its length whatever the face", () => {
    const angle = fc.double({ min: -360, max: 720, noNaN: true });
    fc.assert(
      fc.property(angle, fc.double({ min: -90, max: 90, noNaN: true }), angle, angle, (a, e, f, dip) => {
        const { x, y, out } = directionOnFace(
          { azimuthDeg: a, elevationDeg: e },
          { azimuthDeg: f, dipDeg: dip },
        );
        expect(Math.hypot(x, y, out)).toBeCloseTo(1, 9);
      }),
    );
  });
});

it("names the eight points of the compass, and comes round", () => {
  expect([0, 45, 143, 359, -90, 382].map(compassPoint)).toEqual(["N", "NE", "SE", "N", "W", "N"]);
});
