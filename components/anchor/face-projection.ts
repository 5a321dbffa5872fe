/** A direction seen in the frame of a face: x right, y up the face, out of the rock. Length 1 in all. */
export interface FaceDirection {
  x: number;
  y: number;
  out: number;
}

const RAD = Math.PI / 180;

/**
 * Turns a compass direction into the frame of the drawing.
 * Seen from the front, right is the face's azimuth less 90°. `dipDeg` is measured from horizontal: 90 is
 * vertical, less is a slab, more overhangs. Azimuths clockwise from north, elevation up positive.
 */
export function directionOnFace(
  direction: { azimuthDeg: number; elevationDeg: number },
  face: { azimuthDeg: number; dipDeg: number },
): FaceDirection {
  const turn = (direction.azimuthDeg - face.azimuthDeg) * RAD;
  const level = Math.cos(direction.elevationDeg * RAD);
  const up = Math.sin(direction.elevationDeg * RAD);
  const dip = face.dipDeg * RAD;
  return {
    x: -level * Math.sin(turn),
    y: -Math.cos(dip) * level * Math.cos(turn) + Math.sin(dip) * up,
    out: Math.sin(dip) * level * Math.cos(turn) + Math.cos(dip) * up,
  };
}

const POINTS = ["N", "NE", "E", "SE", "S", "SW", "W", "NW"] as const;

/** `143` → "SE". */
export function compassPoint(azimuthDeg: number): string {
  const turned = ((azimuthDeg % 360) + 360) % 360;
  return POINTS[Math.round(turned / 45) % 8] ?? "N";
}
