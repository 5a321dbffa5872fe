import type { LonLat } from "@/db/columns/point";
import { distanceM, walk } from "@/db/seed/island/frame";
import type { Random } from "@/db/seed/random";
import type { AnchorSpec, BoltSpec, PlacementSpec } from "@/db/seed/spec";
import type { Use } from "@/lib/domain/vocabulary";

/** Shapes that anchors come in, so that the stories only tell what is particular. */

export interface Wall {
  /** Where its left end meets the ground, seen from the front. */
  foot: LonLat;
  /** Where the face looks to; its right end lies 90° counter-clockwise from there… */
  facingDeg: number;
  dipDeg: number;
  groundM: number;
}

/** A point along the foot of a wall, going right as seen from the front. */
export function along(wall: Wall, rightM: number): LonLat {
  return walk(wall.foot, [wall.facingDeg + 270, rightM]);
}

/** A line of protection bolts on one sheet, first bolt at 3 m, evenly up to just under the top. */
export function row(
  random: Random,
  wall: Wall,
  line: { name: string; rightM: number; lengthM: number; bolts: readonly (readonly BoltSpec[])[] },
): AnchorSpec {
  const firstM = 3;
  const gapM = (line.lengthM - firstM - 1.4) / Math.max(1, line.bolts.length - 1);
  return {
    label: line.name,
    uses: ["protection"],
    at: along(wall, line.rightM),
    facts: {
      rowName: line.name,
      rowLengthM: line.lengthM,
      elevationM: wall.groundM,
      faceAzimuthDeg: wall.facingDeg % 360,
      faceDipDeg: wall.dipDeg,
    },
    placements: line.bolts.map((chain, index) => ({
      at: [
        index === 0 ? 0 : Math.round(random.between(-700, 700)),
        Math.round(index * gapM * 1000 + (index === 0 ? 0 : random.between(-250, 250))),
        index === 0 ? 0 : Math.round(random.between(-150, 150)),
      ],
      facts: { overhang: wall.dipDeg > 90 },
      bolts: chain,
    })),
  };
}

/** Two bolts side by side at the top of a line or a ledge. */
export function pair(
  wall: Wall,
  what: {
    label: string;
    uses: Use[];
    rightM: number;
    upM: number;
    apartMm?: number;
    bolts: readonly (readonly BoltSpec[])[];
    more?: Partial<AnchorSpec>;
  },
): AnchorSpec {
  const apart = what.apartMm ?? 240;
  return {
    label: what.label,
    uses: what.uses,
    at: along(wall, what.rightM),
    placements: what.bolts.map((chain, index) => ({
      at: [index * apart, index === 0 ? 0 : -15, 0],
      facts: { overhang: wall.dipDeg > 90 },
      bolts: chain,
    })),
    ...what.more,
    facts: {
      elevationM: wall.groundM + what.upM,
      faceAzimuthDeg: wall.facingDeg % 360,
      faceDipDeg: wall.dipDeg,
      ...what.more?.facts,
    },
  };
}

/**
 * One end of a highline on a slab that falls towards the gap: the face looks along the line, the masterpoint lies
 * down the slab, and each main bolt has a tied leg to it.
 */
export function lineEnd(what: {
  label: string;
  at: LonLat;
  bearingDeg: number;
  dipDeg: number;
  elevationM: number;
  masterpoint: readonly [xMm: number, yMm: number, zMm: number];
  backupSlackM: number;
  placements: readonly PlacementSpec[];
  note?: string;
  bodies?: AnchorSpec["bodies"];
  edge?: Edge;
  more?: Partial<AnchorSpec>;
}): AnchorSpec {
  const [xMm, yMm, zMm] = what.masterpoint;
  const legLengthsM = what.placements
    .filter(({ facts }) => (facts?.role ?? "main") === "main")
    .map(({ at = [0, 0, 0] }) => {
      const [x, y, z] = at;
      return Math.round(Math.hypot(xMm - x, yMm - y, zMm - z) / 10) / 100;
    });
  return {
    label: what.label,
    uses: ["highline"],
    at: what.at,
    placements: what.placements,
    bodies: what.bodies,
    edges: what.edge === undefined ? [] : [what.edge],
    ...what.more,
    facts: {
      elevationM: what.elevationM,
      pointErrorM: 0.5,
      designAzimuthDeg: Math.round(what.bearingDeg * 10) / 10,
      designElevationDeg: -3,
      faceAzimuthDeg: Math.round(what.bearingDeg * 10) / 10,
      faceDipDeg: what.dipDeg,
      masterpointXMm: xMm,
      masterpointYMm: yMm,
      masterpointZMm: zMm,
      rigging: { kind: "fixed", legLengthsM, backupSlackM: what.backupSlackM, note: what.note ?? null },
      ...what.more?.facts,
    },
  };
}

type Edge = NonNullable<AnchorSpec["edges"]>[number];

/** A rock edge the line would lie on, from one point of the face to another, mm; padding is needed. */
export function lip(
  label: string,
  sharpness: Edge["sharpness"],
  secured: string | null,
  [x1Mm, y1Mm]: readonly [number, number],
  [x2Mm, y2Mm]: readonly [number, number],
): Edge {
  return { label, sharpness, paddingNeeded: true, secured, x1Mm, y1Mm, x2Mm, y2Mm };
}

/** The other end of a line: so far along a bearing, checked by the database afterwards. */
export function acrossM(from: LonLat, bearingDeg: number, lengthM: number): LonLat {
  const to = walk(from, [bearingDeg, lengthM]);
  if (Math.abs(distanceM(from, to) - lengthM) > 0.1)
    throw new Error("The plane is too coarse for this span.");
  return to;
}
