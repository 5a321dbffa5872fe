import { scaleLinear } from "d3-scale";
import { curveMonotoneY, line } from "d3-shape";
import type { FaceInput } from "@/components/anchor/face-input";
import { orientationNotes } from "@/components/anchor/face-orientation";
import {
  anchorBalloonsOf,
  type At,
  balloonsOf,
  drawPlacement,
  EMPTY_DRAWING,
  type FaceDrawing,
  roundStep,
} from "@/components/anchor/face-primitives";
import { formatQuantity } from "@/lib/shared/format";

const TOP = 62;
const BOTTOM = 58;
/** Least distance between neighbours on paper: room for a glyph and its balloons. */
const LEAST_GAP = 34;

/** A line of protection bolts as a strip: one scale for both directions, heights from the first bolt. */
export function buildRow(input: FaceInput): FaceDrawing {
  const bolts = input.placements
    .map((placement) => ({ placement, xMm: placement.xMm ?? 0, yMm: placement.yMm ?? 0 }))
    .sort((a, b) => a.yMm - b.yMm);
  const heights = bolts.map(({ yMm }) => yMm);
  const low = Math.min(...heights);
  const span = Math.max(1000, Math.max(...heights) - low);
  const perMm = Math.min(980, Math.max(320, LEAST_GAP / smallestGap(heights, span))) / span;
  const height = TOP + span * perMm + BOTTOM;
  const y = scaleLinear([low, low + span], [height - BOTTOM, TOP]);
  const x = scaleLinear([0, 1], [118, 118 + perMm]);
  const stepMm = roundStep(100 / perMm);
  const points = bolts.map(({ xMm, yMm }): At => ({ x: x(xMm), y: y(yMm) }));
  return {
    ...EMPTY_DRAWING,
    kind: "row",
    height,
    placements: bolts.map(({ placement, yMm }, index) => {
      const at = points[index] ?? { x: 0, y: 0 };
      const beside = { x: at.x + 94, y: at.y };
      return drawPlacement(placement, at, {
        ...balloonsOf(input.reasons, placement.number, beside, { way: "right", most: 7 }),
        tag: formatQuantity(yMm / 1000, "m", { digits: 1, signed: true }),
      });
    }),
    line: line<At>(
      (point) => point.x,
      (point) => point.y,
    ).curve(curveMonotoneY)(points),
    scaleBar: {
      at: { x: 20, y: height - 20 },
      length: stepMm * perMm,
      label: formatQuantity(stepMm / 1000, "m"),
    },
    anchorBalloons: anchorBalloonsOf(input.reasons),
    notes: [...orientationNotes(input), "Heights are from the first bolt."],
  };
}

/** As a share of the whole height; equal heights do not count. */
function smallestGap(heights: readonly number[], span: number): number {
  const gaps = heights.slice(1).map((height, index) => height - (heights[index] ?? height));
  return Math.min(1, ...gaps.filter((gap) => gap > 100).map((gap) => gap / span));
}
