import type { ExpressionSpecification, LayerSpecification, StyleSpecification } from "maplibre-gl";
import type { Palette } from "@/lib/map/palette";

/** Names of the faces that are drawn on the map; the files are the ones the pages use. */
const TEXT_FACE = "Atkinson Hyperlegible Next";
export const LABEL_FACE = "Archivo";

/**
 * Distances of the lines that follow the shore, in pixels, as engravers drew the sea: each one is a wide
 * stroke under the land with a narrower stroke of the sea's own colour on top of it.
 */
const WATERLINES = [5, 11, 19, 30] as const;

export interface GroundPlaces {
  /** Addresses of the two GeoJSON files and of the font files; absolute, because the worker fetches them. */
  world: string;
  island: string;
  textFont: string;
  labelFont: string;
}

/** The ground of the map: sea, land, shore, streams, ways and names. Anchors are laid on top by the page. */
export function groundStyle(palette: Palette, places: GroundPlaces): StyleSpecification {
  return {
    version: 8,
    name: "Byssus ground",
    "font-faces": { [TEXT_FACE]: places.textFont, [LABEL_FACE]: places.labelFont },
    sources: {
      world: { type: "geojson", data: places.world, tolerance: 0.6 },
      island: { type: "geojson", data: places.island, tolerance: 0.2 },
    },
    layers: [
      { id: "sea", type: "background", paint: { "background-color": palette.sea } },
      ...waterlines(palette),
      {
        id: "world-land",
        type: "fill",
        source: "world",
        paint: { "fill-color": palette.land, "fill-outline-color": palette.lineStrong },
      },
      {
        id: "island-land",
        type: "fill",
        source: "island",
        filter: ofKind("land"),
        paint: { "fill-color": palette.land },
      },
      ...ways(palette),
      {
        id: "island-shore",
        type: "line",
        source: "island",
        filter: ofKind("land"),
        layout: { "line-join": "round" },
        paint: { "line-color": palette.ink, "line-width": byZoom(7, 0.6, 11, 1.3, 17, 2.2) },
      },
      ...seaNames(palette),
      ...landNames(palette),
    ],
  };
}

function waterlines(palette: Palette): LayerSpecification[] {
  return [...WATERLINES].reverse().flatMap((distance, index) => {
    const faint = 1 - index / WATERLINES.length;
    const stroke = (name: string, colour: string, widthPx: number): LayerSpecification => ({
      id: `waterline-${distance}-${name}`,
      type: "line",
      source: "island",
      filter: ofKind("land"),
      minzoom: 8,
      layout: { "line-join": "round", "line-cap": "round" },
      paint: { "line-color": colour, "line-width": grown(widthPx) },
    });
    const line = stroke("line", palette.waterline, 2 * distance + 1.6 - 0.9 * faint);
    return [line, stroke("sea", palette.sea, 2 * distance)];
  });
}

/** Full width from zoom 11 on, a fifth of it at zoom 8. */
function grown(widthPx: number) {
  return byZoom(8, widthPx / 5, 11, widthPx);
}

function ways(palette: Palette): LayerSpecification[] {
  const base = { type: "line", source: "island" } as const;
  const round = { "line-join": "round", "line-cap": "round" } as const;
  return [
    {
      ...base,
      id: "streams",
      filter: ofKind("stream"),
      minzoom: 9,
      layout: round,
      paint: {
        "line-color": palette.water,
        "line-opacity": 0.55,
        "line-width": byZoom(9, 0.6, 13, 1.4, 17, 3),
      },
    },
    {
      ...base,
      id: "roads-edge",
      filter: ofKind("road"),
      minzoom: 9,
      layout: round,
      paint: { "line-color": palette.lineStrong, "line-width": byZoom(9, 1.4, 13, 4, 17, 9) },
    },
    {
      ...base,
      id: "roads",
      filter: ofKind("road"),
      minzoom: 9,
      layout: round,
      paint: { "line-color": palette.land, "line-width": byZoom(9, 0.4, 13, 2.4, 17, 6.5) },
    },
    {
      ...base,
      id: "paths",
      filter: ofKind("path"),
      minzoom: 10,
      layout: round,
      paint: {
        "line-color": palette.muted,
        "line-width": byZoom(10, 1.4, 14, 2, 17, 2.6),
        "line-dasharray": [0.1, 2.6],
      },
    },
  ];
}

function seaNames(palette: Palette): LayerSpecification[] {
  const base = { type: "symbol", source: "island" } as const;
  return [
    {
      ...base,
      id: "sea-names",
      filter: ["in", ["get", "kind"], ["literal", ["bay", "headland"]]],
      minzoom: 9.4,
      layout: {
        "text-field": ["get", "name"],
        "text-font": [TEXT_FACE],
        "text-size": byZoom(9, 11, 13, 15),
        "text-letter-spacing": 0.12,
        "text-max-width": 6,
      },
      paint: {
        "text-color": palette.water,
        "text-halo-color": palette.sea,
        "text-halo-width": 1.4,
      },
    },
    {
      ...base,
      id: "island-name",
      filter: ["all", ofKind("land"), ["==", ["get", "name"], "Isle of Tarrow"]],
      minzoom: 4,
      maxzoom: 9.4,
      layout: {
        "text-field": ["get", "name"],
        "text-font": [LABEL_FACE],
        "text-size": 15,
        "text-offset": [0, 2.6],
        "text-allow-overlap": true,
      },
      paint: { "text-color": palette.ink, "text-halo-color": palette.sea, "text-halo-width": 1.4 },
    },
  ];
}

function landNames(palette: Palette): LayerSpecification[] {
  const halo = { "text-halo-color": palette.land, "text-halo-width": 1.6 } as const;
  const base = { type: "symbol", source: "island" } as const;
  return [
    {
      ...base,
      id: "land-names",
      filter: ["in", ["get", "kind"], ["literal", ["settlement", "summit", "moor"]]],
      minzoom: 9.6,
      layout: {
        "text-field": [
          "match",
          ["get", "kind"],
          "summit",
          ["concat", "△ ", ["get", "name"]],
          "settlement",
          ["concat", "◻ ", ["get", "name"]],
          ["get", "name"],
        ],
        "text-font": [LABEL_FACE],
        "text-size": byZoom(9, 11, 13, 14),
        "text-max-width": 8,
      },
      paint: { "text-color": palette.muted, ...halo },
    },
    {
      ...base,
      id: "way-names",
      filter: ["in", ["get", "kind"], ["literal", ["stream", "road", "path"]]],
      minzoom: 12,
      layout: {
        "symbol-placement": "line",
        "text-field": ["coalesce", ["get", "name"], ""],
        "text-font": [TEXT_FACE],
        "text-size": 12,
        "text-letter-spacing": 0.05,
      },
      paint: { "text-color": palette.muted, ...halo },
    },
  ];
}

function ofKind(kind: string): ExpressionSpecification {
  return ["==", ["get", "kind"], kind];
}

/** Linear between zoom levels: zoom, value, zoom, value… */
export function byZoom(...stops: readonly number[]): ExpressionSpecification {
  return ["interpolate", ["linear"], ["zoom"], ...stops];
}
