import type { LonLat } from "@/db/columns/point";
import { ISLAND_CENTRE, isInside, rounded, toShoreM } from "@/db/seed/island/coast";
import { distanceM, offset, planeFrom, walk } from "@/db/seed/island/frame";
import type { Places } from "@/db/seed/island/places";
import { Random } from "@/db/seed/random";

/** One thing drawn on the map of the island beside its shore. */
export interface Feature {
  kind: "stream" | "road" | "path" | "settlement" | "summit" | "headland" | "bay" | "moor";
  name: string | null;
  points: readonly LonLat[];
}

/**
 * Streams, ways and names. Paths lead to the sites everybody may know of; to the sensitive one there is none, and none of
 * the sites is named here: sites come from the register, which knows who may see them.
 */
export function islandFeatures(at: Places): readonly Feature[] {
  const random = new Random("tarrow features");
  const stations = { keep: at.crownMoor, fell: at.fellgateWall, quarry: at.lowdenQuarry };
  const roadEnd = offset(at.fellgateWall, { eastM: -500, northM: -420 });
  const kiln = offset(at.lowdenQuarry, { eastM: 300, northM: -520 });
  const westRoad = walk(at.gannetCleft.at, [at.gannetCleft.inlandDeg, 1_700]);
  const northRoad = walk(at.pillarStack.at, [at.pillarStack.inlandDeg, 2_300]);
  return [
    ...streams(random, at),
    way(random, "road", "Harbour road", [
      at.harbour,
      offset(at.harbour, { eastM: 2_500, northM: 2_600 }),
      kiln,
    ]),
    way(random, "road", "Moor road", [kiln, offset(kiln, { eastM: -1_600, northM: 4_300 }), roadEnd]),
    way(random, "road", "West road", [
      at.harbour,
      offset(at.harbour, { eastM: -4_200, northM: 4_600 }),
      offset(at.harbour, { eastM: -11_500, northM: 8_600 }),
      westRoad,
    ]),
    way(random, "road", "North road", [
      offset(at.harbour, { eastM: -4_200, northM: 4_600 }),
      offset(ISLAND_CENTRE, { eastM: -8_500, northM: 4_200 }),
      northRoad,
    ]),
    way(random, "path", null, [roadEnd, stations.fell]),
    way(random, "path", null, [kiln, stations.quarry]),
    way(random, "path", null, [roadEnd, offset(stations.keep, { eastM: 3_100, northM: 500 }), stations.keep]),
    way(random, "path", null, [westRoad, walk(at.gannetCleft.at, [at.gannetCleft.inlandDeg, 260])]),
    way(random, "path", null, [northRoad, walk(at.pillarStack.at, [at.pillarStack.inlandDeg, 60])]),
    ...names(at),
  ];
}

function names(at: Places): Feature[] {
  const label = (kind: Feature["kind"], name: string, point: LonLat): Feature => ({
    kind,
    name,
    points: [point],
  });
  const from = (eastM: number, northM: number) => offset(ISLAND_CENTRE, { eastM, northM });
  return [
    label("settlement", "Tarrow Harbour", offset(at.harbour, { eastM: 100, northM: 350 })),
    label("settlement", "Kilnhouses", offset(at.lowdenQuarry, { eastM: 500, northM: -700 })),
    label("settlement", "Wester Croft", from(-15_500, 1_100)),
    label("settlement", "Norder Steading", from(-9_500, 7_600)),
    label("summit", "Crown Head, 412 m", from(2_300, 3_400)),
    label("summit", "Fell of Tarrow, 367 m", from(6_900, 4_600)),
    label("moor", "The Crown Moor", from(-1_800, 1_000)),
    label("bay", "Harbour Sound", from(-2_600, -12_000)),
    label("bay", "Selkie Bight", from(13_400, -9_600)),
    label("bay", "Langshore Firth", from(14_800, 5_700)),
    label("bay", "Wester Voe", from(-19_300, 6_600)),
    label("headland", "Tarrow Ness", from(7_200, 14_300)),
    label("headland", "Easter Horn", from(20_200, -1_500)),
    label("headland", "Southmost", from(7_300, -13_900)),
  ];
}

/** Six burns, from the moor to the sea: always a little nearer the shore than before. */
function streams(random: Random, at: Places): Feature[] {
  const names = ["Crown Burn", "Harbour Burn", "Kiln Burn", "Norder Burn", "Wester Burn", "Fell Burn"];
  return names.map((name, index) => {
    const start = walk(at.crownMoor, [index * 60 + random.between(0, 35), random.between(1_500, 3_000)]);
    return { kind: "stream", name, points: burn(random, start, index * 60 + 15, at.shore) };
  });
}

function burn(random: Random, start: LonLat, towardsDeg: number, shore: readonly LonLat[]): LonLat[] {
  const points = [start];
  let [here, headingDeg] = [start, towardsDeg];
  for (let length = 0; length < 120; length += 1) {
    const left = toShoreM(here, shore);
    headingDeg += random.between(-34, 34) + (towardsDeg - headingDeg) * 0.25;
    const next = walk(here, [headingDeg, Math.max(60, Math.min(330, left * 0.6))]);
    if (!isInside(next, shore)) break;
    points.push(next);
    here = next;
    if (toShoreM(here, shore) < 45) break;
  }
  return points.map(kept);
}

/** A way between points, winding a little as ways do. */
function way(
  random: Random,
  kind: Feature["kind"],
  name: string | null,
  corners: readonly LonLat[],
): Feature {
  const points = corners.flatMap((from, index) => {
    const to = corners[index + 1];
    if (to === undefined) return [from];
    const pieces = Math.max(2, Math.round(distanceM(from, to) / 350));
    const { eastM, northM } = planeFrom(from, to);
    return Array.from({ length: pieces }, (_, piece) => {
      const part = piece / pieces;
      const aside = piece === 0 ? 0 : random.between(-70, 70) + 160 * Math.sin(part * Math.PI * 2.3);
      const length = Math.hypot(eastM, northM);
      return offset(from, {
        eastM: eastM * part - (northM / length) * aside,
        northM: northM * part + (eastM / length) * aside,
      });
    });
  });
  return { kind, name, points: points.map(kept) };
}

function kept({ lon, lat }: LonLat): LonLat {
  return { lon: rounded(lon), lat: rounded(lat) };
}
