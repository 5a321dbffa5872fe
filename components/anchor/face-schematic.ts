import type { FaceInput, FacePlacement } from "@/components/anchor/face-input";
import { orientationNotes } from "@/components/anchor/face-orientation";
import {
  anchorBalloonsOf,
  type At,
  balloonsOf,
  type DrawnPlacement,
  drawPlacement,
  EMPTY_DRAWING,
  type FaceDrawing,
  WIDTH,
} from "@/components/anchor/face-primitives";

/** Nobody has measured it: backups above, main placements below, evenly; says that it is not to scale. */
export function buildSchematic(input: FaceInput): FaceDrawing {
  const main = input.placements.filter(({ role }) => role === "main");
  const others = input.placements.filter(({ role }) => role !== "main");
  const perRow = input.isRow ? 2 : 4;
  const rowsAbove = Math.ceil(others.length / perRow);
  const rowsBelow = Math.ceil(main.length / perRow);
  const height = 90 + (rowsAbove + rowsBelow) * 104;
  const placed = [...rows(others, perRow, 96), ...rows(main, perRow, 96 + rowsAbove * 104)];
  return {
    ...EMPTY_DRAWING,
    kind: "schematic",
    height,
    placements: placed.map(({ placement, at }): DrawnPlacement =>
      drawPlacement(placement, at, {
        ...balloonsOf(input.reasons, placement.number, at, { way: "above", most: 6 }),
      }),
    ),
    anchorBalloons: anchorBalloonsOf(input.reasons),
    notes: ["Not to scale: positions are not measured.", ...orientationNotes(input)],
  };
}

function rows(
  placements: readonly FacePlacement[],
  perRow: number,
  top: number,
): { placement: FacePlacement; at: At }[] {
  return placements.map((placement, index) => {
    const row = Math.floor(index / perRow);
    const inRow = Math.min(perRow, placements.length - row * perRow);
    const pitch = (WIDTH - 60) / inRow;
    return { placement, at: { x: 30 + pitch * ((index % perRow) + 0.5), y: top + row * 104 } };
  });
}
