import type { FaceInput } from "@/components/anchor/face-input";
import type { At, FaceDrawing } from "@/components/anchor/face-primitives";
import { compassPoint, directionOnFace } from "@/components/anchor/face-projection";
import { formatBearingDeg, formatQuantity } from "@/lib/shared/format";

const ARROW = 64;

/** The design load as an arrow, as long as its part along the face; a ring with a dot when it comes straight out. */
export function loadOf(input: FaceInput, from: At): FaceDrawing["load"] {
  const { designAzimuthDeg: azimuthDeg, designElevationDeg, faceAzimuthDeg } = input;
  if (azimuthDeg === null || faceAzimuthDeg === null) return null;
  const seen = directionOnFace(
    { azimuthDeg, elevationDeg: designElevationDeg ?? 0 },
    { azimuthDeg: faceAzimuthDeg, dipDeg: input.faceDipDeg ?? 90 },
  );
  const elevation =
    designElevationDeg === null
      ? ""
      : ` / ${formatQuantity(designElevationDeg, "°", { signed: true, digits: 0 })}`;
  const label = `design load ${formatBearingDeg(azimuthDeg)}${elevation}`;
  const along = Math.hypot(seen.x, seen.y);
  if (along < 0.2) return { out: true, at: from, label };
  return { from, to: { x: from.x + seen.x * ARROW, y: from.y - seen.y * ARROW }, label };
}

/** Where north lies in the drawing; says nothing on a steep face, where no line of it points north. */
export function northOf(input: FaceInput, at: At): FaceDrawing["north"] {
  if (input.faceAzimuthDeg === null || input.faceDipDeg === null || input.faceDipDeg > 45) return null;
  const seen = directionOnFace(
    { azimuthDeg: 0, elevationDeg: 0 },
    { azimuthDeg: input.faceAzimuthDeg, dipDeg: input.faceDipDeg },
  );
  const length = Math.hypot(seen.x, seen.y);
  return { at, dx: seen.x / length, dy: -seen.y / length };
}

/** What the reader must know to hold the drawing against the rock. */
export function orientationNotes(input: FaceInput): string[] {
  const { faceAzimuthDeg, faceDipDeg, designAzimuthDeg, designElevationDeg } = input;
  const looks =
    faceAzimuthDeg === null
      ? "the way the face looks is not recorded"
      : `the face looks ${compassPoint(faceAzimuthDeg)} (${formatBearingDeg(faceAzimuthDeg)})`;
  const dips =
    faceDipDeg === null
      ? "its dip is not recorded"
      : `dips ${formatQuantity(faceDipDeg, "°", { digits: 0 })}${faceDipDeg > 90 ? " (overhangs)" : ""}`;
  const notes = [`Seen looking at the rock; ${looks}, ${dips}.`];
  if (designAzimuthDeg !== null && faceAzimuthDeg === null)
    notes.push("The design load is not drawn: the way the face looks is not recorded.");
  if (designAzimuthDeg !== null && designElevationDeg === null)
    notes.push("The elevation of the design load is not recorded: drawn level.");
  return notes;
}
