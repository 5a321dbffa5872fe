import type { LonLat } from "@/db/columns/point";
import { offset, type Plane, planeFrom, step } from "@/db/seed/island/frame";
import { Random } from "@/db/seed/random";

/** The middle of the island: empty ocean, so that nobody can take it for a real place. */
export const ISLAND_CENTRE: LonLat = { lon: -34.2, lat: 46.9 };
export const ISLAND_EAST_WEST_M = 44_000;
export const ISLAND_NORTH_SOUTH_M = 30_000;

const CONTROL_POINTS = 120;
/** Halvings of every stretch between control points: 120 · 2⁵ points, some 40 m apart. */
const HALVINGS = 5;
/** Firths: where they cut in (degrees from east, counter-clockwise), how deep (part of the radius), how wide (degrees). */
const FIRTHS = [
  { at: 24, deep: 0.2, wide: 5 },
  { at: 78, deep: 0.14, wide: 6 },
  { at: 158, deep: 0.24, wide: 5 },
  { at: 214, deep: 0.17, wide: 4 },
  { at: 262, deep: 0.22, wide: 7 },
  { at: 318, deep: 0.16, wide: 4 },
] as const;
/** Coordinates are kept to 1e-6 degrees, about 0.1 m, so that file and database hold the same line. */
const KEPT_DECIMALS = 6;

/** Shoreline of the main island as a closed ring, counter-clockwise, first point repeated at the end. */
export function islandShore(): readonly LonLat[] {
  const random = new Random("tarrow coast");
  let ring = controlPoints(random);
  for (let halving = 0; halving < HALVINGS; halving += 1) ring = halve(ring, random, 0.24 - 0.035 * halving);
  return closed(fitted(ring).map((at) => offset(ISLAND_CENTRE, at)));
}

/** Shoreline of a stack or skerry: a small rough ring round a point. */
export function isletShore(centre: LonLat, radiusM: number, word: string): readonly LonLat[] {
  const random = new Random(word);
  const ring = Array.from({ length: 30 }, (_, index) => {
    const swing = 1 + 0.09 * Math.sin(index * 0.63 + 1) + random.between(-0.05, 0.05);
    return step(360 - index * 12, radiusM * swing);
  });
  return closed(ring.map((at) => offset(centre, at)));
}

/** A rounded outline: an ellipse whose radius swings with slow waves, cut by firths, every point a little off. */
function controlPoints(random: Random): Plane[] {
  const waves = Array.from({ length: 10 }, (_, index) => ({
    turns: index + 2,
    height: (0.11 * random.between(0.5, 1)) / (index + 2) ** 0.6,
    phase: random.between(0, 2 * Math.PI),
  }));
  return Array.from({ length: CONTROL_POINTS }, (_, index) => {
    const angleDeg = (360 * (index + random.between(-0.3, 0.3))) / CONTROL_POINTS;
    const angle = (angleDeg * Math.PI) / 180;
    const swing = waves.reduce(
      (sum, { turns, height, phase }) => sum + height * Math.sin(turns * angle + phase),
      1,
    );
    const cut = FIRTHS.reduce(
      (sum, { at, deep, wide }) => sum + deep * Math.exp(-(((angleDeg - at) / wide) ** 2)),
      0,
    );
    const radius = swing - cut + random.between(-0.022, 0.022);
    return { eastM: 22_000 * radius * Math.cos(angle), northM: 15_000 * radius * Math.sin(angle) };
  });
}

/** Puts a point between every two, off the straight line by a part of their distance. */
function halve(ring: readonly Plane[], random: Random, roughness: number): Plane[] {
  return ring.flatMap((from, index) => {
    const to = ring[(index + 1) % ring.length] ?? from;
    const aside = random.between(-roughness, roughness);
    const east = to.eastM - from.eastM;
    const north = to.northM - from.northM;
    return [
      from,
      { eastM: from.eastM + east / 2 - north * aside, northM: from.northM + north / 2 + east * aside },
    ];
  });
}

/** Stretched and shifted to the island's stated size. */
function fitted(ring: readonly Plane[]): Plane[] {
  const east = range(ring.map(({ eastM }) => eastM));
  const north = range(ring.map(({ northM }) => northM));
  return ring.map(({ eastM, northM }) => ({
    eastM: ((eastM - east.middle) * ISLAND_EAST_WEST_M) / east.width,
    northM: ((northM - north.middle) * ISLAND_NORTH_SOUTH_M) / north.width,
  }));
}

function range(values: readonly number[]): { middle: number; width: number } {
  const low = Math.min(...values);
  const high = Math.max(...values);
  return { middle: (low + high) / 2, width: high - low };
}

function closed(ring: readonly LonLat[]): LonLat[] {
  const kept = ring.map(({ lon, lat }) => ({ lon: rounded(lon), lat: rounded(lat) }));
  const [first] = kept;
  return first === undefined ? [] : [...kept, first];
}

export function rounded(degrees: number): number {
  return Number(degrees.toFixed(KEPT_DECIMALS));
}

/** Distance from a point to a shoreline, m, in the plane of the point; the database measures on the ellipsoid. */
export function toShoreM(at: LonLat, shore: readonly LonLat[]): number {
  const ring = shore.map((vertex) => planeFrom(at, vertex));
  return ring.reduce((least, from, index) => {
    const to = ring[index + 1];
    return to === undefined ? least : Math.min(least, toSegmentM(from, to));
  }, Number.POSITIVE_INFINITY);
}

/** Distance of the origin from a segment. */
function toSegmentM(from: Plane, to: Plane): number {
  const east = to.eastM - from.eastM;
  const north = to.northM - from.northM;
  const squared = east * east + north * north;
  const along = squared === 0 ? 0 : -(from.eastM * east + from.northM * north) / squared;
  const at = Math.min(1, Math.max(0, along));
  return Math.hypot(from.eastM + at * east, from.northM + at * north);
}

/** Is the point on the land side of a closed ring (even-odd rule)? */
export function isInside(at: LonLat, shore: readonly LonLat[]): boolean {
  return shore.reduce((inside, from, index) => {
    const to = shore[index + 1];
    if (to === undefined || from.lat > at.lat === to.lat > at.lat) return inside;
    const crossing = from.lon + ((at.lat - from.lat) * (to.lon - from.lon)) / (to.lat - from.lat);
    return at.lon < crossing ? !inside : inside;
  }, false);
}
