import { describe, expect, it } from "vitest";
import { anchorPoints, boundsOf, softPlaces, spanLines } from "@/lib/map/features";
import type { MapAnchor } from "@/lib/map/map-anchor";

const anchor = (code: string, change: Partial<MapAnchor> = {}): MapAnchor => ({
  code,
  label: code,
  siteSlug: "undercroft",
  siteName: "The Undercroft",
  rowName: null,
  uses: ["protection"],
  condition: "in_service",
  verdict: "nothing_against",
  exact: true,
  point: { coordinates: [-34.14, 46.77] },
  seaDistanceM: null,
  hardware: [],
  ...change,
});

describe("what the map draws", () => {
  const open = anchor("A");
  const hidden = [anchor("B", { exact: false }), anchor("C", { exact: false, condition: "out_of_use" })];

  it("draws no mark of its own for an anchor whose place is rounded", () => {
    expect(anchorPoints([open, ...hidden]).features.map((f) => f.properties.code)).toEqual(["A"]);
  });

  it("draws one soft circle for a sensitive site, with its number of anchors and the worst of them", () => {
    const { features } = softPlaces([open, ...hidden]);
    expect(features.map((f) => f.properties)).toEqual([
      { site: "undercroft", name: "The Undercroft", count: 2, mark: "out_of_use" },
    ]);
  });

  it("gives a span the worse of its two ends, and the length as it is written elsewhere", () => {
    const span = (aCode: string, bCode: string) => ({
      name: "Span",
      lengthM: 118.2,
      aCode,
      bCode,
      coordinates: [
        [-34.1, 46.7],
        [-34.2, 46.7],
      ] as const,
    });
    const ends = [open, anchor("D", { condition: "check_first" })];
    expect(spanLines([span("A", "D")], ends).features[0]?.properties).toEqual({
      name: "Span",
      length: "118\u202fm",
      mark: "check_first",
    });
  });

  it("a span with an end the reader may not see is not drawn as a good one", () => {
    const span = {
      name: "Span",
      lengthM: 50,
      aCode: "A",
      bCode: "elsewhere",
      coordinates: [
        [0, 0],
        [1, 1],
      ] as const,
    };
    expect(spanLines([span], [open]).features[0]?.properties.mark).toBe("not_enough_known");
  });

  it("puts the bounds around every point", () => {
    const far = anchor("E", { point: { coordinates: [-34.5, 47.01] } });
    expect(boundsOf([open, far])).toEqual([-34.5, 46.77, -34.14, 47.01]);
    expect(boundsOf([])).toBeNull();
  });
});
