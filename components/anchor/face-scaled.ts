import { scaleLinear } from "d3-scale";
import { loadOf, northOf, orientationNotes } from "@/components/anchor/face-orientation";
import type { FaceEdge, FaceInput, FacePlacement, Point } from "@/components/anchor/face-input";
import {
  anchorBalloonsOf,
  type At,
  balloonsOf,
  type Dimension,
  type DrawnEdge,
  type DrawnPlacement,
  drawPlacement,
  EMPTY_DRAWING,
  type FaceDrawing,
  lengthLabel,
  roundStep,
  turnTowards,
  WIDTH,
} from "@/components/anchor/face-primitives";

const SIDE = 40;
const TOP = 92;
const BOTTOM = 66;
const MOST_HEIGHT = 520;
/** Even a pair of bolts is drawn within half a metre of rock, so that two anchors can be compared by eye. */
const LEAST_EXTENT_MM = 620;

type Placed = FacePlacement & Point;

const isPlaced = (placement: FacePlacement): placement is Placed =>
  placement.xMm !== null && placement.yMm !== null;

/** One scale for both directions; whatever is measured stands where it is. */
export function buildScaled(input: FaceInput): FaceDrawing {
  const placed = input.placements.filter(isPlaced);
  const aside = input.placements.filter((placement) => !isPlaced(placement));
  const edges = input.edges.filter(isDrawable);
  const frame = frameOf([
    ...placed,
    ...placed.flatMap((placement) => placement.deadHoles),
    ...(input.masterpoint ? [input.masterpoint] : []),
    ...edges.flatMap((edge) => [
      { xMm: edge.x1Mm, yMm: edge.y1Mm },
      { xMm: edge.x2Mm, yMm: edge.y2Mm },
    ]),
  ]);
  const masterpoint = input.masterpoint && frame.at(input.masterpoint);
  const asideHeight = aside.length > 0 ? 78 : 0;
  const centre = { x: WIDTH / 2, y: frame.height / 2 };
  const deadHoles = placed.flatMap((placement) => placement.deadHoles).map(frame.at);
  const drawn = placed.map((placement) => {
    const at = frame.at(placement);
    const crowded = deadHoles.some(({ x, y }) => x > at.x && x < at.x + 44 && Math.abs(y - at.y) < 16);
    return drawPlacement(placement, at, {
      ...balloonsOf(input.reasons, placement.number, at, { way: "above", most: 6 }),
      turnDeg: turnTowards(at, masterpoint),
      numberSide: crowded ? "left" : "right",
    });
  });
  return {
    ...EMPTY_DRAWING,
    kind: "scaled",
    height: frame.height + asideHeight,
    placements: [...drawn, ...setAsideOf(aside, input, frame.height)],
    setAside:
      aside.length > 0
        ? { at: { x: 12, y: frame.height }, width: WIDTH - 24, height: asideHeight - 12 }
        : null,
    deadHoles,
    bodies: bodiesOf(input, placed, drawn),
    edges: edges.map((edge) => drawEdge(edge, frame.at, averageOf(drawn))),
    masterpoint,
    legs: masterpoint ? legsOf(drawn, masterpoint) : [],
    load: loadOf(input, masterpoint ?? averageOf(drawn) ?? centre),
    north: northOf(input, { x: WIDTH - 34, y: 38 }),
    scaleBar: {
      at: { x: 20, y: frame.height - 22 },
      length: frame.stepMm * frame.perMm,
      label: lengthLabel(frame.stepMm),
    },
    grid: { xs: frame.xs, ys: frame.ys, step: lengthLabel(frame.stepMm) },
    dimensions: dimensionsOf(placed, frame.at),
    anchorBalloons: anchorBalloonsOf(input.reasons),
    notes: [
      ...orientationNotes(input),
      ...(aside.length > 0
        ? [`Not measured, set aside: ${aside.map(({ number }) => number).join(", ")}.`]
        : []),
    ],
  };
}

function frameOf(points: readonly Point[]) {
  const xs = points.map((point) => point.xMm);
  const ys = points.map((point) => point.yMm);
  const [left, right] = widened(Math.min(...xs), Math.max(...xs), LEAST_EXTENT_MM);
  const [low, high] = widened(Math.min(...ys), Math.max(...ys), LEAST_EXTENT_MM / 2);
  const perMm = Math.min((WIDTH - 2 * SIDE) / (right - left), MOST_HEIGHT / (high - low));
  const middle = (left + right) / 2;
  const height = TOP + (high - low) * perMm + BOTTOM;
  const x = scaleLinear([middle - 1, middle + 1], [WIDTH / 2 - perMm, WIDTH / 2 + perMm]);
  const y = scaleLinear([low, high], [height - BOTTOM, TOP]);
  const stepMm = roundStep(110 / perMm);
  return {
    perMm,
    height,
    stepMm,
    at: (point: Point): At => ({ x: x(point.xMm), y: y(point.yMm) }),
    xs: multiples(x.invert(0), x.invert(WIDTH), stepMm).map((mm) => x(mm)),
    ys: multiples(y.invert(height), y.invert(0), stepMm).map((mm) => y(mm)),
  };
}

function widened(from: number, to: number, least: number): [number, number] {
  const spare = Math.max(0, least - (to - from)) / 2;
  return [from - spare, to + spare];
}

function multiples(from: number, to: number, step: number): number[] {
  const first = Math.ceil(from / step);
  return Array.from({ length: Math.max(0, Math.floor(to / step) - first + 1) }, (_, i) => (first + i) * step);
}

function averageOf(points: readonly At[]): At | null {
  if (points.length === 0) return null;
  const sum = points.reduce((a, b) => ({ x: a.x + b.x, y: a.y + b.y }), { x: 0, y: 0 });
  return { x: sum.x / points.length, y: sum.y / points.length };
}

/** How far below its hole a leg starts: in the eye. */
const EYE = 11;

/** A leg to every placement that holds something up; gear at an edge has none. */
function legsOf(drawn: readonly DrawnPlacement[], to: At): FaceDrawing["legs"] {
  return drawn
    .filter((placement) => placement.role !== "edge" && placement.condition !== "removed")
    .map(({ x, y, role }) => {
      const reach = EYE / Math.max(EYE, Math.hypot(to.x - x, to.y - y));
      return { from: { x: x + (to.x - x) * reach, y: y + (to.y - y) * reach }, to, role };
    });
}

function setAsideOf(aside: readonly FacePlacement[], input: FaceInput, top: number): DrawnPlacement[] {
  const pitch = (WIDTH - 60) / Math.max(1, aside.length);
  return aside.map((placement, index) => {
    const at = { x: 30 + pitch * (index + 0.5), y: top + 40 };
    const beside = { x: at.x + 24, y: at.y - 16 };
    const most = Math.max(1, Math.floor((pitch - 40) / 21));
    return drawPlacement(
      placement,
      at,
      balloonsOf(input.reasons, placement.number, beside, { way: "right", most }),
    );
  });
}

type DrawableEdge = FaceEdge & { x1Mm: number; y1Mm: number; x2Mm: number; y2Mm: number };

const isDrawable = (edge: FaceEdge): edge is DrawableEdge =>
  edge.x1Mm !== null && edge.y1Mm !== null && edge.x2Mm !== null && edge.y2Mm !== null;

function drawEdge(edge: DrawableEdge, place: (point: Point) => At, rock: At | null): DrawnEdge {
  const from = place({ xMm: edge.x1Mm, yMm: edge.y1Mm });
  const to = place({ xMm: edge.x2Mm, yMm: edge.y2Mm });
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  const normal = { x: -(to.y - from.y) / length, y: (to.x - from.x) / length };
  const towards = rock ? (rock.x - from.x) * normal.x + (rock.y - from.y) * normal.y : -1;
  const sign = towards >= 0 ? 1 : -1;
  return {
    from,
    to,
    label: edge.label,
    sharpness: edge.sharpness,
    rockSide: { x: normal.x * sign, y: normal.y * sign },
  };
}

/** A block that is not part of the cliff is drawn round the placements that sit in it. */
function bodiesOf(
  input: FaceInput,
  placed: readonly Placed[],
  drawn: readonly DrawnPlacement[],
): FaceDrawing["bodies"] {
  return input.rockBodies.flatMap((body) => {
    const numbers = placed
      .filter((placement) => placement.rockBodyId === body.id)
      .map(({ number }) => number);
    const inside = drawn.filter(({ number }) => numbers.includes(number));
    if (inside.length === 0 || body.attachment === "attached") return [];
    const xs = inside.map(({ x }) => x);
    const ys = inside.map(({ y }) => y);
    const at = { x: Math.min(...xs) - 26, y: Math.min(...ys) - 26 };
    const state = body.attachment === "unknown" ? "attachment not known" : body.attachment;
    return [
      {
        at,
        width: Math.max(...xs) - at.x + 26,
        height: Math.max(...ys) - at.y + 26,
        label: `${body.label} (${state})`,
      },
    ];
  });
}

/** Distances between neighbouring main placements, across the top; left out where they would not be readable. */
function dimensionsOf(placed: readonly Placed[], place: (point: Point) => At): Dimension[] {
  const main = placed.filter(({ role }) => role === "main").sort((a, b) => a.xMm - b.xMm);
  const line = 52;
  return main.slice(1).flatMap((right, index) => {
    const left = main[index];
    if (left === undefined) return [];
    const [a, b] = [place(left), place(right)];
    if (b.x - a.x < 44) return [];
    return [
      {
        from: { x: a.x, y: line },
        to: { x: b.x, y: line },
        feet: [a, b],
        label: String(Math.round(right.xMm - left.xMm)),
      },
    ];
  });
}
