import { describe, expect, it } from "vitest";
import { z } from "zod";
import { lonLat } from "@/lib/schemas/fields";
import { formInput } from "@/lib/schemas/form-input";

describe("a point in an input", () => {
  it("is taken by name and as GeoJSON with the longitude first (RFC 7946, 3.1.1)", () => {
    expect(lonLat.parse({ lon: -34.2, lat: 46.9 })).toEqual({ lon: -34.2, lat: 46.9 });
    expect(lonLat.parse({ type: "Point", coordinates: [-34.2, 46.9] })).toEqual({ lon: -34.2, lat: 46.9 });
  });

  it("names the coordinate that lies off the globe, whichever way it was sent", () => {
    for (const sent of [
      { lon: 1, lat: 91 },
      { type: "Point", coordinates: [1, 91] },
    ]) {
      expect(lonLat.safeParse(sent).error?.issues.map((issue) => issue.path.join("."))).toEqual(["lat"]);
    }
  });

  it("comes from a form as text", () => {
    const form = formInput(z.strictObject({ point: lonLat.optional() }));
    expect(form.parse({ point: { lon: "-34,2", lat: "46.9" } })).toEqual({
      point: { lon: -34.2, lat: 46.9 },
    });
  });
});
