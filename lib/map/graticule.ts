import type { FeatureCollection, LineString } from "geojson";
import type { Bounds } from "@/lib/map/features";

/** Steps of a chart's grid in minutes of arc: each a whole part of the next degree. */
const STEPS_MIN = [0.05, 0.1, 0.25, 0.5, 1, 2, 5, 10, 30, 60, 120, 300, 600, 900, 1800] as const;

/** The finest step that leaves at most `most` lines across the given span. */
export function graticuleStepMin(spanDeg: number, most: number): number {
  const coarsest = 1800;
  if (!(spanDeg > 0) || !(most >= 1)) return coarsest;
  return STEPS_MIN.find((step) => (spanDeg * 60) / step <= most) ?? coarsest;
}

/** Multiples of the step inside [from, to], in degrees. */
export function graticuleValues(from: number, to: number, stepMin: number): number[] {
  const first = Math.ceil((from * 60) / stepMin - 1e-9);
  const last = Math.floor((to * 60) / stepMin + 1e-9);
  const values: number[] = [];
  for (let n = first; n <= last; n += 1) values.push((n * stepMin) / 60);
  return values;
}

/** `46.9` → `46°54′N`; tenths of a minute only where the step asks for them. */
export function formatDegrees(valueDeg: number, axis: "lat" | "lon", stepMin: number): string {
  const digits = stepMin >= 1 ? 0 : stepMin >= 0.1 && stepMin !== 0.25 ? 1 : 2;
  const totalMin = Number((Math.abs(valueDeg) * 60).toFixed(digits));
  const degrees = Math.floor(totalMin / 60);
  const minutes = (totalMin - degrees * 60).toFixed(digits).padStart(digits === 0 ? 2 : digits + 3, "0");
  const side = axis === "lat" ? (valueDeg < 0 ? "S" : "N") : valueDeg < 0 ? "W" : "E";
  const plain = stepMin >= 60 ? `${degrees}°` : `${degrees}°${minutes}′`;
  return totalMin === 0 ? plain : plain + side;
}

/** Meridians and parallels across the bounds. */
export function graticuleLines(
  [west, south, east, north]: Bounds,
  step: { lon: number; lat: number },
): FeatureCollection<LineString> {
  const line = (coordinates: [number, number][]) =>
    ({ type: "Feature", geometry: { type: "LineString", coordinates }, properties: {} }) as const;
  return {
    type: "FeatureCollection",
    features: [
      ...graticuleValues(west, east, step.lon).map((lon) =>
        line([
          [lon, south],
          [lon, north],
        ]),
      ),
      ...graticuleValues(south, north, step.lat).map((lat) =>
        line([
          [west, lat],
          [east, lat],
        ]),
      ),
    ],
  };
}

/** A degree written in the margin, at its distance from the left or top edge. */
export interface Tick {
  label: string;
  atPx: number;
}

/** One label of a margin takes about this much room. */
const LABEL_ROOM_PX = 104;

/** The labels for the top and the left margin of a map that is not turned, and the steps they stand at. */
export function frameTicks(
  [west, south, east, north]: Bounds,
  size: { widthPx: number; heightPx: number },
): { top: Tick[]; left: Tick[]; step: { lon: number; lat: number } } {
  const step = {
    lon: graticuleStepMin(east - west, size.widthPx / LABEL_ROOM_PX),
    lat: graticuleStepMin(north - south, size.heightPx / LABEL_ROOM_PX),
  };
  const [low, high] = [mercator(south), mercator(north)];
  return {
    step,
    top: graticuleValues(west, east, step.lon).map((lon) => ({
      label: formatDegrees(lon, "lon", step.lon),
      atPx: ((lon - west) / (east - west)) * size.widthPx,
    })),
    left: graticuleValues(south, north, step.lat).map((lat) => ({
      label: formatDegrees(lat, "lat", step.lat),
      atPx: ((high - mercator(lat)) / (high - low)) * size.heightPx,
    })),
  };
}

/** Height of a parallel on the web's map, in radians of the equator. */
function mercator(latDeg: number): number {
  return Math.asinh(Math.tan((latDeg * Math.PI) / 180));
}
