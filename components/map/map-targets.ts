import type { Map as MapLibreMap, MapGeoJSONFeature } from "maplibre-gl";
import { ANCHOR_LAYER, CLUSTER_LAYER, PLACE_LAYER, SPAN_LAYERS } from "@/lib/map/layers";
import { MAP_MARK_WORDS, readCounts, splitInWords } from "@/lib/map/map-anchor";
import { MARKS } from "@/lib/map/marks";

/** Something on the map that answers to hand or pointer. */
export type Target =
  | { kind: "group"; clusterId: number; lon: number; lat: number; count: number; split: string }
  | { kind: "anchor"; lon: number; lat: number; code: string; label: string; state: string }
  | { kind: "place"; site: string; name: string; count: number }
  | { kind: "span"; name: string; length: string };

/** Half of what a finger covers. */
const REACH_PX = 22;

/** The target nearest to a point on the screen; marks before lines. */
export function nearestTarget(
  map: MapLibreMap,
  { x, y }: { x: number; y: number },
  reachPx: number = REACH_PX,
): Target | null {
  const layers = [CLUSTER_LAYER, ANCHOR_LAYER, PLACE_LAYER, ...SPAN_LAYERS].filter((id) => map.getLayer(id));
  const found = map.queryRenderedFeatures(
    [
      [x - reachPx, y - reachPx],
      [x + reachPx, y + reachPx],
    ],
    { layers },
  );
  const distance = (feature: MapGeoJSONFeature) => {
    // Behind every mark; a finite number, because two infinities cannot be compared by their difference.
    if (feature.geometry.type !== "Point") return Number.MAX_SAFE_INTEGER;
    const [lon = 0, lat = 0] = feature.geometry.coordinates;
    const at = map.project([lon, lat]);
    return Math.hypot(at.x - x, at.y - y);
  };
  const [nearest] = [...found].sort((a, b) => distance(a) - distance(b));
  return nearest ? targetOf(nearest) : null;
}

function targetOf(feature: MapGeoJSONFeature): Target {
  const [lon = 0, lat = 0] = feature.geometry.type === "Point" ? feature.geometry.coordinates : [];
  const p: Record<string, unknown> = feature.properties;
  const text = (key: string) => String(p[key] ?? "");
  switch (feature.layer.id) {
    case CLUSTER_LAYER:
      return {
        kind: "group",
        clusterId: Number(p.cluster_id),
        lon,
        lat,
        count: Number(p.point_count),
        split: splitInWords(readCounts(p)),
      };
    case ANCHOR_LAYER: {
      const mark = MARKS.find((name) => name === p.mark);
      return {
        kind: "anchor",
        lon,
        lat,
        code: text("code"),
        label: text("label"),
        state: mark ? MAP_MARK_WORDS[mark] : "",
      };
    }
    case PLACE_LAYER:
      return { kind: "place", site: text("site"), name: text("name"), count: Number(p.count) };
    default:
      return { kind: "span", name: text("name"), length: text("length") };
  }
}

/** What the reading line says of it. */
export function describeFeature(target: Target): string {
  switch (target.kind) {
    case "group":
      return `Group of ${target.count}: ${target.split}`;
    case "anchor":
      return `${target.code} ${target.label}: ${target.state}`;
    case "place":
      return `${target.name}: ${target.count} anchors; the exact place is known to members only`;
    case "span":
      return `Span ${target.name}, ${target.length}`;
  }
}
