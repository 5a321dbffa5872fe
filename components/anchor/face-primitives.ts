import type { FaceInput, FacePlacement } from "@/components/anchor/face-input";
import type {
  Condition,
  Form,
  Level,
  PlacementKind,
  PlacementRole,
  Sharpness,
} from "@/lib/domain/vocabulary";

/** Units of the drawing: 1 is about 0.85 px on a narrow phone, up to 1.6 px on a desk. */
export const WIDTH = 372;
export const BALLOON = 9.5;

export interface At {
  x: number;
  y: number;
}

export interface Balloon extends At {
  number: number;
  level: Level;
}

export interface DrawnPlacement extends At {
  number: number;
  kind: PlacementKind;
  role: PlacementRole;
  form: Form | null;
  condition: Condition | null;
  /** Clockwise from "hanging straight down". */
  turnDeg: number;
  balloons: Balloon[];
  /** Reasons that found no room; said in words beside the last balloon. */
  moreReasons: number;
  /** Stands beside the number: "backup", a height. */
  tag: string | null;
  /** Where the number stands; left when something is drawn to the right. */
  numberSide: "left" | "right";
}

export interface DrawnEdge {
  from: At;
  to: At;
  label: string;
  sharpness: Sharpness;
  /** Unit vector from the edge into the rock. */
  rockSide: At;
}

/** A length written along a thin line with end strokes. */
export interface Dimension {
  from: At;
  to: At;
  /** Where the extension lines start, below the dimension line. */
  feet: readonly [At, At];
  label: string;
}

export interface FaceDrawing {
  kind: "scaled" | "schematic" | "row";
  width: number;
  height: number;
  placements: DrawnPlacement[];
  /** A box with placements whose position nobody has measured. */
  setAside: { at: At; width: number; height: number } | null;
  deadHoles: At[];
  bodies: { at: At; width: number; height: number; label: string }[];
  edges: DrawnEdge[];
  masterpoint: At | null;
  legs: { from: At; to: At; role: PlacementRole }[];
  load: { from: At; to: At; label: string } | { out: true; at: At; label: string } | null;
  north: { at: At; dx: number; dy: number } | null;
  scaleBar: { at: At; length: number; label: string } | null;
  grid: { xs: number[]; ys: number[]; step: string } | null;
  dimensions: Dimension[];
  /** The line through a row. */
  line: string | null;
  anchorBalloons: Balloon[];
  /** Said on the sheet under the drawing. */
  notes: string[];
}

export const EMPTY_DRAWING: Omit<FaceDrawing, "kind" | "height"> = {
  width: WIDTH,
  placements: [],
  setAside: null,
  deadHoles: [],
  bodies: [],
  edges: [],
  masterpoint: null,
  legs: [],
  load: null,
  north: null,
  scaleBar: null,
  grid: null,
  dimensions: [],
  line: null,
  anchorBalloons: [],
  notes: [],
};

/** Balloons of one placement: rows of three above it, or one row to its right. */
export function balloonsOf(
  reasons: FaceInput["reasons"],
  number: number | null,
  at: At,
  layout: { way: "above" | "right"; most: number },
): { balloons: Balloon[]; moreReasons: number } {
  const own = reasons.filter((reason) => reason.placementNumber === number);
  const shown = own.slice(0, layout.most);
  const pitch = 2 * BALLOON + 2;
  const balloons = shown.map((reason, index) => {
    const row = Math.floor(index / 3);
    const inRow = Math.min(3, shown.length - row * 3);
    const x = layout.way === "right" ? at.x + index * pitch : at.x + ((index % 3) - (inRow - 1) / 2) * pitch;
    const y = layout.way === "right" ? at.y : at.y - 27 - row * pitch;
    return { number: reason.number, level: reason.level, x, y };
  });
  return { balloons, moreReasons: own.length - shown.length };
}

/** One placement with everything that moves with it. */
export function drawPlacement(
  placement: FacePlacement,
  at: At,
  more: Pick<DrawnPlacement, "balloons" | "moreReasons"> &
    Partial<Pick<DrawnPlacement, "turnDeg" | "tag" | "numberSide">>,
): DrawnPlacement {
  return {
    ...at,
    number: placement.number,
    kind: placement.kind,
    role: placement.role,
    form: placement.bolt?.form ?? null,
    condition: placement.bolt?.condition ?? null,
    turnDeg: more.turnDeg ?? 0,
    balloons: more.balloons,
    moreReasons: more.moreReasons,
    tag: more.tag ?? (placement.role === "main" ? null : placement.role),
    numberSide: more.numberSide ?? "right",
  };
}

/** Reasons about the anchor as a whole stand in the upper left corner. */
export function anchorBalloonsOf(reasons: FaceInput["reasons"]): Balloon[] {
  return balloonsOf(reasons, null, { x: 20, y: 20 }, { way: "right", most: 8 }).balloons;
}

/** Degrees clockwise from straight down that point a glyph at a target; 0 without one. */
export function turnTowards(from: At, to: At | null): number {
  if (to === null || (from.x === to.x && from.y === to.y)) return 0;
  return (Math.atan2(from.x - to.x, to.y - from.y) * 180) / Math.PI;
}

/** The step 1, 2 or 5 times a power of ten that comes nearest below `most`. */
export function roundStep(most: number): number {
  const power = 10 ** Math.floor(Math.log10(most));
  const lead = most / power;
  return (lead >= 5 ? 5 : lead >= 2 ? 2 : 1) * power;
}

/** 240 → "240 mm", 1500 → "1.5 m". */
export function lengthLabel(mm: number): string {
  const space = "\u202f";
  return mm >= 1000 ? `${Number((mm / 1000).toFixed(2))}${space}m` : `${Math.round(mm)}${space}mm`;
}
