import { validateStyleMin } from "@maplibre/maplibre-gl-style-spec";
import { describe, expect, it } from "vitest";
import {
  anchorLayer,
  chosenLayers,
  CLUSTER_PROPERTIES,
  clusterLayer,
  gridLayer,
  markImageId,
  placeLayers,
  readImageId,
  spanLayers,
} from "@/lib/map/layers";
import { MARKS } from "@/lib/map/marks";
import type { Palette } from "@/lib/map/palette";
import { groundStyle } from "@/lib/map/style";

const colour = "rgb(1, 2, 3)";
const palette: Palette = {
  scheme: "day",
  sea: colour,
  land: colour,
  waterline: colour,
  water: colour,
  ink: colour,
  muted: colour,
  line: colour,
  lineStrong: colour,
  paper: colour,
  focus: colour,
  calm: colour,
  warn: colour,
  stop: colour,
  info: colour,
};
const ground = groundStyle(palette, {
  world: "http://127.0.0.1/tiles/land.geojson",
  island: "http://127.0.0.1/tiles/tarrow.geojson",
  textFont: "http://127.0.0.1/fonts/a.woff2",
  labelFont: "http://127.0.0.1/fonts/b.woff2",
});

describe("the style of the map", () => {
  it("with all its layers passes the style specification's own validator", () => {
    const none = { type: "FeatureCollection" as const, features: [] };
    const errors = validateStyleMin({
      ...ground,
      sources: {
        ...ground.sources,
        anchors: { type: "geojson", data: none, cluster: true, clusterProperties: CLUSTER_PROPERTIES },
        spans: { type: "geojson", data: none },
        places: { type: "geojson", data: none },
        grid: { type: "geojson", data: none },
      },
      layers: [
        ...ground.layers,
        { ...gridLayer(palette), source: "grid" },
        ...placeLayers(palette, 46.9).map((layer) => ({ ...layer, source: "places" })),
        ...spanLayers(palette).map((layer) => ({ ...layer, source: "spans" })),
        { ...anchorLayer(palette), source: "anchors" },
        { ...clusterLayer(palette), source: "anchors" },
        ...chosenLayers(palette).map((layer) => ({ ...layer, source: "places" })),
      ],
    });
    expect(errors.map((error) => error.message)).toEqual([]);
  });

  it("fetches nothing from elsewhere: no glyphs, no sprites, every address the page's own", () => {
    expect(ground.glyphs).toBeUndefined();
    expect(ground.sprite).toBeUndefined();
    const addresses = [...JSON.stringify(ground).matchAll(/https?:\/\/[^/"]+/g)].map(([host]) => host);
    expect(new Set(addresses)).toEqual(new Set(["http://127.0.0.1"]));
  });

  it("draws the land over the lines that follow its shore", () => {
    const ids = ground.layers.map((layer) => layer.id);
    const lastWaterline = Math.max(...ids.map((id, index) => (id.startsWith("waterline") ? index : -1)));
    expect(lastWaterline).toBeGreaterThan(0);
    expect(ids.indexOf("island-land")).toBeGreaterThan(lastWaterline);
  });
});

describe("the pictures layers ask for", () => {
  it("are read back from their names", () => {
    for (const mark of MARKS) {
      expect(readImageId(markImageId("night", mark))).toEqual({ kind: "mark", scheme: "night", mark });
    }
    expect(readImageId("brackets|day")).toEqual({ kind: "brackets", scheme: "day" });
  });

  it("a tag's counts stand in the order of the marks", () => {
    expect(readImageId("tag|day|1|2|3|4|5")).toEqual({
      kind: "tag",
      scheme: "day",
      counts: { in_service: 1, check_first: 2, out_of_use: 3, not_enough_known: 4, removed: 5 },
    });
    expect(MARKS).toEqual(["in_service", "check_first", "out_of_use", "not_enough_known", "removed"]);
  });

  it("a foreign name is left alone", () => {
    expect(readImageId("")).toBeNull();
    expect(readImageId("mark|day|fine")).toBeNull();
    expect(readImageId("tag|day|1|2")).toBeNull();
  });
});
