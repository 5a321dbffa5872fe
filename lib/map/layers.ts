import type {
  CircleLayerSpecification,
  ExpressionSpecification,
  LineLayerSpecification,
  SymbolLayerSpecification,
} from "maplibre-gl";
import { MARK_SHAPES, type Mark, MARKS } from "@/lib/map/marks";
import type { Palette } from "@/lib/map/palette";
import { metresPerPixel } from "@/lib/map/scale-bar";
import { byZoom, LABEL_FACE } from "@/lib/map/style";

export const CLUSTER_LAYER = "anchor-groups";
export const ANCHOR_LAYER = "anchor-marks";
export const PLACE_LAYER = "soft-place-marks";
export const SPAN_LAYERS = ["span-lines", "span-lines-out-of-use"] as const;

/** Groups dissolve here at the latest: marks that still meet lie on one rock face. */
export const CLUSTER_MAX_ZOOM = 16;
export const CLUSTER_RADIUS_PX = 44;

type Layer<T extends { source: string }> = Omit<T, "source">;

/** What a group keeps of its members: how many of each mark, and the highest rank among them. */
export const CLUSTER_PROPERTIES: Readonly<Record<string, ExpressionSpecification>> = {
  worst: ["max", ["get", "rank"]],
  ...Object.fromEntries(
    MARKS.map((mark): [string, ExpressionSpecification] => [
      mark,
      ["+", ["case", ["==", ["get", "mark"], mark], 1, 0]],
    ]),
  ),
};

/** `mark|day|out_of_use`: the picture of a single anchor. */
export function markImageId(scheme: Palette["scheme"], mark: Mark): string {
  return `mark|${scheme}|${mark}`;
}

/** The pictures a layer asks for, read back from their names. */
export type ImageRequest =
  | { kind: "mark"; scheme: string; mark: Mark }
  | { kind: "tag"; scheme: string; counts: Record<Mark, number> }
  | { kind: "brackets"; scheme: string };

/** Null: not one of ours. */
export function readImageId(id: string): ImageRequest | null {
  const [kind, scheme = "", ...rest] = id.split("|");
  if (kind === "brackets") return { kind, scheme };
  if (kind === "mark") {
    const mark = MARKS.find((name) => name === rest[0]);
    return mark ? { kind, scheme, mark } : null;
  }
  if (kind !== "tag" || rest.length !== MARKS.length) return null;
  const [in_service = 0, check_first = 0, out_of_use = 0, not_enough_known = 0, removed = 0] =
    rest.map(Number);
  return {
    kind,
    scheme,
    counts: { in_service, check_first, out_of_use, not_enough_known, removed },
  };
}

/** Groups: a tag with the worst mark inside, the count, and the split; named by what it shows. */
export function clusterLayer({ scheme }: Palette): Layer<SymbolLayerSpecification> {
  return {
    id: CLUSTER_LAYER,
    type: "symbol",
    filter: ["has", "point_count"],
    layout: {
      "icon-image": [
        "concat",
        `tag|${scheme}`,
        ...MARKS.flatMap((mark): ["|", ExpressionSpecification] => ["|", ["to-string", ["get", mark]]]),
      ],
      "icon-allow-overlap": true,
      "icon-ignore-placement": true,
      "symbol-sort-key": ["get", "worst"],
    },
  };
}

export function anchorLayer(palette: Palette): Layer<SymbolLayerSpecification> {
  return {
    id: ANCHOR_LAYER,
    type: "symbol",
    filter: ["!", ["has", "point_count"]],
    layout: {
      "icon-image": ["concat", `mark|${palette.scheme}|`, ["get", "mark"]],
      "icon-size": byZoom(9, 0.85, 14, 1, 18, 1.25),
      "icon-allow-overlap": true,
      "icon-ignore-placement": true,
      "symbol-sort-key": ["get", "rank"],
      "text-field": ["step", ["zoom"], "", 13.5, ["get", "code"]],
      "text-font": [LABEL_FACE],
      "text-size": 12,
      "text-anchor": "left",
      "text-offset": [1.1, 0],
      "text-optional": true,
    },
    paint: { "text-color": palette.ink, "text-halo-color": palette.paper, "text-halo-width": 1.8 },
  };
}

/** The chosen anchor: brackets around its mark, drawn even where a group hides the mark itself. */
export function chosenLayers(palette: Palette): Layer<SymbolLayerSpecification>[] {
  const overlap = { "icon-allow-overlap": true, "icon-ignore-placement": true } as const;
  return [
    {
      id: "chosen-mark",
      type: "symbol",
      layout: { "icon-image": ["concat", `mark|${palette.scheme}|`, ["get", "mark"]], ...overlap },
    },
    {
      id: "chosen-brackets",
      type: "symbol",
      layout: {
        "icon-image": `brackets|${palette.scheme}`,
        ...overlap,
        "text-field": ["get", "code"],
        "text-font": [LABEL_FACE],
        "text-size": 14,
        "text-anchor": "left",
        "text-offset": [1.7, 0],
        "text-allow-overlap": true,
      },
      paint: { "text-color": palette.ink, "text-halo-color": palette.paper, "text-halo-width": 2 },
    },
  ];
}

/** Spans as dimensions are drawn: a line, its length along it; dashed where an end is out of use. */
export function spanLayers(
  palette: Palette,
): [...Layer<LineLayerSpecification>[], Layer<SymbolLayerSpecification>] {
  const broken: ExpressionSpecification = ["==", ["get", "mark"], "out_of_use"];
  return [
    {
      id: "span-casing",
      type: "line",
      layout: { "line-cap": "butt" },
      paint: { "line-color": palette.paper, "line-width": byZoom(9, 3, 15, 6), "line-opacity": 0.9 },
    },
    {
      id: SPAN_LAYERS[0],
      type: "line",
      filter: ["!", broken],
      paint: {
        "line-color": ["match", ["get", "mark"], "check_first", palette.warn, palette.ink],
        "line-width": byZoom(9, 1.2, 15, 2.2),
      },
    },
    {
      id: SPAN_LAYERS[1],
      type: "line",
      filter: broken,
      paint: {
        "line-color": toneOf(palette, "out_of_use"),
        "line-width": byZoom(9, 1.4, 15, 2.6),
        "line-dasharray": [3, 2],
      },
    },
    {
      id: "span-lengths",
      type: "symbol",
      minzoom: 13,
      layout: {
        "symbol-placement": "line-center",
        "text-field": ["get", "length"],
        "text-font": [LABEL_FACE],
        "text-size": byZoom(13, 12, 17, 15),
        "text-offset": [0, -0.75],
        "text-allow-overlap": true,
        "text-ignore-placement": true,
      },
      paint: { "text-color": palette.ink, "text-halo-color": palette.paper, "text-halo-width": 2 },
    },
  ];
}

/** How far a rounded point may lie from the place: half the diagonal of a cell of 0.01°, and some. */
const SOFT_RADIUS_M = 1100;

/** A sensitive site: a soft circle that says it is one, wide enough to hold the true place. */
export function placeLayers(
  palette: Palette,
  latDeg: number,
): [Layer<CircleLayerSpecification>, Layer<SymbolLayerSpecification>] {
  const radius = (zoom: number) => SOFT_RADIUS_M / metresPerPixel(latDeg, zoom);
  return [
    {
      id: "soft-place-circles",
      type: "circle",
      paint: {
        "circle-radius": ["interpolate", ["exponential", 2], ["zoom"], 0, radius(0), 22, radius(22)],
        "circle-color": palette.info,
        "circle-opacity": 0.16,
        "circle-blur": 0.35,
        "circle-stroke-color": palette.info,
        "circle-stroke-width": 1,
        "circle-stroke-opacity": 0.35,
      },
    },
    {
      id: PLACE_LAYER,
      type: "symbol",
      layout: {
        "icon-image": ["concat", `mark|${palette.scheme}|`, ["get", "mark"]],
        "icon-allow-overlap": true,
        "text-field": [
          "step",
          ["zoom"],
          "",
          9.5,
          [
            "concat",
            ["get", "name"],
            "\n",
            ["to-string", ["get", "count"]],
            " anchors within about 1\u202fkm",
          ],
        ],
        "text-font": [LABEL_FACE],
        "text-size": 12,
        "text-anchor": "top",
        "text-offset": [0, 1],
        "text-optional": true,
      },
      paint: { "text-color": palette.ink, "text-halo-color": palette.paper, "text-halo-width": 1.8 },
    },
  ];
}

export function gridLayer(palette: Palette): Layer<LineLayerSpecification> {
  return {
    id: "graticule-lines",
    type: "line",
    paint: { "line-color": palette.lineStrong, "line-width": 0.6, "line-opacity": 0.35 },
  };
}

function toneOf(palette: Palette, mark: Mark): string {
  return palette[MARK_SHAPES[mark].tone];
}
