import { buildRow } from "@/components/anchor/face-row";
import { buildScaled } from "@/components/anchor/face-scaled";
import { buildSchematic } from "@/components/anchor/face-schematic";
import type { FaceInput } from "@/components/anchor/face-input";
import type { FaceDrawing } from "@/components/anchor/face-primitives";

/**
 * Works out the drawing of an anchor from its recorded positions.
 * To scale when the positions allow it: a placement that is not measured is set aside in a box of its own. With
 * fewer than two measured (and more than one to draw) it is a scheme and says so.
 */
export function buildFaceDrawing(input: FaceInput): FaceDrawing {
  const measured = input.placements.filter((placement) => placement.xMm !== null && placement.yMm !== null);
  const enough = measured.length >= 2 || (measured.length === 1 && input.placements.length === 1);
  if (!enough) return buildSchematic(input);
  return input.isRow && measured.length === input.placements.length ? buildRow(input) : buildScaled(input);
}
