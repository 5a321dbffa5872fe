import { createParser, parseAsString, parseAsStringLiteral } from "nuqs/server";
import { USES } from "@/lib/domain/vocabulary";
import { FIXINGS, METAL_KINDS, SEA_LIMITS, STATES } from "@/lib/map/filter";

/** Where the map looks. */
export interface Camera {
  lat: number;
  lon: number;
  zoom: number;
}

const CAMERA = /^(-?\d{1,2}(?:\.\d+)?),(-?\d{1,3}(?:\.\d+)?),(\d{1,2}(?:\.\d+)?)$/;

/** `46.9021,-34.1999,11.2`: latitude, longitude, zoom. Anything else is as good as absent. */
export function parseCamera(text: string): Camera | null {
  const [, lat, lon, zoom] = (CAMERA.exec(text) ?? []).map(Number);
  if (lat === undefined || lon === undefined || zoom === undefined) return null;
  if (Math.abs(lat) > 85 || Math.abs(lon) > 180 || zoom > 22) return null;
  return { lat, lon, zoom };
}

/** About a metre, and a twentieth of a zoom step, is exact enough for a link. */
export function writeCamera({ lat, lon, zoom }: Camera): string {
  return `${lat.toFixed(5)},${lon.toFixed(5)},${zoom.toFixed(2)}`;
}

const parseAsCamera = createParser({ parse: parseCamera, serialize: writeCamera });

/** Everything the address of the map can say. */
export const mapParams = {
  state: parseAsStringLiteral(STATES),
  fixing: parseAsStringLiteral(FIXINGS),
  metal: parseAsStringLiteral(METAL_KINDS),
  use: parseAsStringLiteral(USES),
  sea: parseAsStringLiteral(SEA_LIMITS),
  site: parseAsString,
  q: parseAsString.withDefault(""),
  /** Code of the chosen anchor. */
  anchor: parseAsString,
  at: parseAsCamera,
};
