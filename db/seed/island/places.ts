import type { LonLat } from "@/db/columns/point";
import { ISLAND_CENTRE, islandShore, isInside, isletShore, rounded, toShoreM } from "@/db/seed/island/coast";
import { azimuthDeg, distanceM, offset, step, walk } from "@/db/seed/island/frame";

/** A stretch of shore that is nearly straight: a point on it and the direction away from the water. */
interface Strand {
  at: LonLat;
  inlandDeg: number;
}

/** Where everything lies; found on the generated coast, so that the distances to the sea come out as told. */
export interface Places {
  shore: readonly LonLat[];
  /** The stack and the outer skerry: islands of their own, with a shore of their own. */
  stackShore: readonly LonLat[];
  skerryShore: readonly LonLat[];
  gannetCleft: Strand;
  pillarStack: Strand & { stackCentre: LonLat };
  undercroft: LonLat & { inlandDeg: number };
  lowdenQuarry: LonLat;
  fellgateWall: LonLat;
  crownMoor: LonLat;
  skerry: LonLat;
  harbour: LonLat;
}

/** The line on Pillar Stack is 96 m: this far from the rim's shore to its mainland anchor, the rest across the water. */
export const RIM_ANCHOR_INLAND_M = 14;
const STACK_ANCHOR_FROM_CENTRE_M = 12;
export const STACK_SPAN_M = 96;
const STACK_RADIUS_M = 30;

export function places(): Places {
  const shore = islandShore();
  const gannetCleft = strand(shore, [262, 288], 9);
  const rim = strand(shore, [298, 312], 4);
  const south = strand(shore, [150, 172], 5);
  const stackCentre = kept(
    walk(rim.at, [rim.inlandDeg + 180, STACK_SPAN_M - RIM_ANCHOR_INLAND_M + STACK_ANCHOR_FROM_CENTRE_M]),
  );
  const skerry = kept(offset(ISLAND_CENTRE, { eastM: 17_800, northM: 16_200 }));
  return {
    shore,
    stackShore: isletShore(stackCentre, STACK_RADIUS_M, "pillar stack"),
    skerryShore: isletShore(skerry, 85, "outer skerry"),
    gannetCleft,
    pillarStack: { ...rim, stackCentre },
    undercroft: { ...inland(shore, south, 90), inlandDeg: south.inlandDeg },
    lowdenQuarry: inwards(shore, 118, 2_400),
    fellgateWall: inwards(shore, 70, 6_000),
    crownMoor: kept(offset(ISLAND_CENTRE, { eastM: 900, northM: 1_900 })),
    skerry,
    harbour: nearestVertex(shore, offset(ISLAND_CENTRE, { eastM: -2_400, northM: -8_500 })),
  };
}

/** The straightest stretch of shore between two directions from the island's middle, `reach` points to each side. */
function strand(shore: readonly LonLat[], between: readonly [number, number], reach: number): Strand {
  let best = { bend: Number.POSITIVE_INFINITY, at: ISLAND_CENTRE, inlandDeg: 0 };
  for (let index = reach; index < shore.length - reach; index += 1) {
    const [at, from, to] = [shore[index], shore[index - reach], shore[index + reach]];
    if (at === undefined || from === undefined || to === undefined) continue;
    const bearing = azimuthDeg(ISLAND_CENTRE, at);
    if (bearing < between[0] || bearing > between[1]) continue;
    // The ring runs counter-clockwise: land lies to the left of it.
    const alongDeg = azimuthDeg(from, to);
    const bend = shore
      .slice(index - reach, index + reach + 1)
      .reduce((most, vertex) => Math.max(most, Math.abs(aside(from, vertex, alongDeg))), 0);
    if (bend < best.bend) best = { bend, at, inlandDeg: (alongDeg + 270) % 360 };
  }
  return { at: best.at, inlandDeg: best.inlandDeg };
}

/** How far a point lies off a line. */
function aside(from: LonLat, point: LonLat, alongDeg: number): number {
  const turn = ((azimuthDeg(from, point) - alongDeg) * Math.PI) / 180;
  return distanceM(from, point) * Math.sin(turn);
}

/** The point behind a strand that is so far from the nearest water. */
function inland(shore: readonly LonLat[], { at, inlandDeg }: Strand, targetM: number): LonLat {
  return halved(
    (lengthM) => walk(at, [inlandDeg, lengthM]),
    targetM * 3,
    (point) => toShoreM(point, shore) > targetM,
  );
}

/** Coming in from the sea in a direction seen from the middle: the first point so far from the nearest water. */
function inwards(shore: readonly LonLat[], bearingDeg: number, targetM: number): LonLat {
  const far = 30_000;
  return halved(
    (lengthM) => offset(ISLAND_CENTRE, step(bearingDeg, far - lengthM)),
    far,
    (point) => isInside(point, shore) && toShoreM(point, shore) > targetM,
  );
}

/** Bisection along a way: the length from which on the test holds. */
function halved(way: (lengthM: number) => LonLat, longestM: number, test: (at: LonLat) => boolean): LonLat {
  let [short, long] = [0, longestM];
  while (long - short > 0.05) {
    const middle = (short + long) / 2;
    if (test(way(middle))) long = middle;
    else short = middle;
  }
  return kept(way(long));
}

function nearestVertex(shore: readonly LonLat[], to: LonLat): LonLat {
  return shore.reduce(
    (best, vertex) => (distanceM(vertex, to) < distanceM(best, to) ? vertex : best),
    ISLAND_CENTRE,
  );
}

function kept({ lon, lat }: LonLat): LonLat {
  return { lon: rounded(lon), lat: rounded(lat) };
}
