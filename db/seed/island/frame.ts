import type { LonLat } from "@/db/columns/point";

/** Metres east and north of some point, in the plane that touches the ellipsoid there. */
export interface Plane {
  eastM: number;
  northM: number;
}

/** WGS84. */
const SEMI_MAJOR_M = 6_378_137;
const ECCENTRICITY_SQUARED = 0.00669437999014;

/** Metres per degree of latitude and longitude at a latitude, from the two radii of curvature. */
function metresPerDegree(latDeg: number): { latM: number; lonM: number } {
  const lat = (latDeg * Math.PI) / 180;
  const w = 1 - ECCENTRICITY_SQUARED * Math.sin(lat) ** 2;
  const meridianM = (SEMI_MAJOR_M * (1 - ECCENTRICITY_SQUARED)) / w ** 1.5;
  const normalM = SEMI_MAJOR_M / Math.sqrt(w);
  return { latM: (meridianM * Math.PI) / 180, lonM: (normalM * Math.cos(lat) * Math.PI) / 180 };
}

/** The point so many metres away. Good to a centimetre over a kilometre (middle-latitude formula). */
export function offset(from: LonLat, { eastM, northM }: Plane): LonLat {
  const roughLat = from.lat + northM / metresPerDegree(from.lat).latM;
  const middle = metresPerDegree((from.lat + roughLat) / 2);
  return { lon: from.lon + eastM / middle.lonM, lat: from.lat + northM / middle.latM };
}

/** How far one point lies east and north of another; the inverse of `offset`. */
export function planeFrom(from: LonLat, to: LonLat): Plane {
  const middle = metresPerDegree((from.lat + to.lat) / 2);
  return { eastM: (to.lon - from.lon) * middle.lonM, northM: (to.lat - from.lat) * middle.latM };
}

/** A step in a direction, clockwise from north. */
export function step(azimuthDeg: number, lengthM: number): Plane {
  const azimuth = (azimuthDeg * Math.PI) / 180;
  return { eastM: lengthM * Math.sin(azimuth), northM: lengthM * Math.cos(azimuth) };
}

/** A point reached by steps, each a direction and a length. */
export function walk(
  from: LonLat,
  ...steps: readonly (readonly [azimuthDeg: number, lengthM: number])[]
): LonLat {
  return steps.reduce((at, [azimuthDeg, lengthM]) => offset(at, step(azimuthDeg, lengthM)), from);
}

/** Direction from one point to another, clockwise from north, 0 ≤ azimuth < 360. */
export function azimuthDeg(from: LonLat, to: LonLat): number {
  const { eastM, northM } = planeFrom(from, to);
  return ((Math.atan2(eastM, northM) * 180) / Math.PI + 360) % 360;
}

export function distanceM(from: LonLat, to: LonLat): number {
  const { eastM, northM } = planeFrom(from, to);
  return Math.hypot(eastM, northM);
}
