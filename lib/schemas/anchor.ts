import { z } from "zod";
import { formInput } from "@/lib/schemas/form-input";
import {
  azimuthDeg,
  day,
  elevationDeg,
  id,
  lengthMm,
  lonLat,
  metal,
  note,
  number,
  oneOf,
  positionMm,
  text,
  whole,
  yesNo,
} from "@/lib/schemas/fields";
import {
  ATTACHMENTS,
  FITTING_KINDS,
  PLACEMENT_KINDS,
  PLACEMENT_ROLES,
  RIGGINGS,
  SHARPNESSES,
  SIDES,
  USES,
  WASHINGS,
} from "@/lib/domain/vocabulary";

const placementFacts = {
  kind: oneOf(PLACEMENT_KINDS).optional(),
  role: oneOf(PLACEMENT_ROLES).optional(),
  xMm: positionMm.nullable().optional(),
  yMm: positionMm.nullable().optional(),
  zMm: positionMm.nullable().optional(),
  faceAzimuthDeg: azimuthDeg.nullable().optional(),
  faceDipDeg: number(0, 180).nullable().optional(),
  overhang: yesNo.nullable().optional(),
  holeDiameterMm: number(3, 100).nullable().optional(),
  holeDepthMm: number(5, 2000).nullable().optional(),
  axisAzimuthDeg: azimuthDeg.nullable().optional(),
  axisElevationDeg: elevationDeg.nullable().optional(),
  edgeDistanceMm: lengthMm.nullable().optional(),
  edgeSide: oneOf(SIDES).nullable().optional(),
  deadHoles: z
    .array(z.strictObject({ xMm: positionMm, yMm: positionMm }))
    .max(40)
    .optional(),
  rockBodyId: id.nullable().optional(),
  sizeMm: lengthMm.nullable().optional(),
  note: note().nullable().optional(),
};

/** One hole, or a tree, boulder, thread, removable piece. The number is given by the server when left out. */
export const newPlacement = z
  .strictObject({ id, number: whole(1, 200).optional(), ...placementFacts })
  .meta({ id: "NewPlacement" });
export type NewPlacementInput = z.output<typeof newPlacement>;

export const addPlacementInput = newPlacement.extend({ anchorId: id });
export type AddPlacementInput = z.output<typeof addPlacementInput>;

export const placementChange = z.strictObject(placementFacts).meta({ id: "PlacementChange" });
export type PlacementChange = z.output<typeof placementChange>;

const newRockBody = z
  .strictObject({
    id,
    label: text(80),
    attachment: oneOf(ATTACHMENTS).optional(),
    lengthM: number(0, 1000).nullable().optional(),
    widthM: number(0, 1000).nullable().optional(),
    heightM: number(0, 1000).nullable().optional(),
    note: note().nullable().optional(),
  })
  .meta({ id: "NewRockBody" });

const newEdge = z
  .strictObject({
    id,
    label: text(80),
    sharpness: oneOf(SHARPNESSES),
    paddingNeeded: yesNo.optional(),
    secured: text(200).nullable().optional(),
    x1Mm: positionMm.nullable().optional(),
    y1Mm: positionMm.nullable().optional(),
    x2Mm: positionMm.nullable().optional(),
    y2Mm: positionMm.nullable().optional(),
  })
  .meta({ id: "NewEdge" });

export const newFitting = z
  .strictObject({
    id,
    placementId: id.nullable().optional(),
    kind: oneOf(FITTING_KINDS),
    metal: metal.nullable().optional(),
    diameterMm: number(1, 100).nullable().optional(),
    diameterLeftMm: number(0, 100).nullable().optional(),
    replaceable: yesNo.optional(),
    installedOn: day.nullable().optional(),
    note: note().nullable().optional(),
  })
  .meta({ id: "NewFitting" });

const rigging = z
  .strictObject({
    kind: oneOf(RIGGINGS),
    legLengthsM: z.array(number(0, 100).nullable()).max(40),
    backupSlackM: number(0, 100).nullable().default(null),
    note: note(500).nullable().default(null),
  })
  .meta({ id: "Rigging" });

const anchorFacts = {
  label: text(80),
  uses: z.array(oneOf(USES), "At least one use.").min(1, "At least one use.").max(USES.length),
  pointErrorM: number(0, 10_000).nullable().optional(),
  elevationM: number(-500, 9000).nullable().optional(),
  designAzimuthDeg: azimuthDeg.nullable().optional(),
  designElevationDeg: elevationDeg.nullable().optional(),
  faceAzimuthDeg: azimuthDeg.nullable().optional(),
  faceDipDeg: number(0, 180).nullable().optional(),
  rigging: rigging.nullable().optional(),
  masterpointXMm: positionMm.nullable().optional(),
  masterpointYMm: positionMm.nullable().optional(),
  masterpointZMm: positionMm.nullable().optional(),
  washing: oneOf(WASHINGS).nullable().optional(),
  /** Measured by hand; without it the distance is computed from the coast on record. */
  seaDistanceM: number(0, 20_000_000).nullable().optional(),
  seaDistanceErrorM: number(0, 100_000).nullable().optional(),
  seaDistanceNote: note(500).nullable().optional(),
  rowName: text(80).nullable().optional(),
  rowLengthM: number(0, 2000).nullable().optional(),
  note: note().nullable().optional(),
};

export const createAnchorInput = z
  .strictObject({
    id,
    siteId: id,
    point: lonLat,
    ...anchorFacts,
    rockBodies: z.array(newRockBody).max(40).default([]),
    placements: z.array(newPlacement).max(200).default([]),
    edges: z.array(newEdge).max(40).default([]),
    fittings: z.array(newFitting).max(80).default([]),
  })
  .meta({ id: "NewAnchor" });
export type CreateAnchorInput = z.output<typeof createAnchorInput>;

/** Everything but where it is: moving wants a reason of its own. */
export const anchorChange = z.strictObject(anchorFacts).partial().meta({ id: "AnchorChange" });
export type AnchorChange = z.output<typeof anchorChange>;

export const moveAnchorInput = z
  .strictObject({
    point: lonLat,
    pointErrorM: number(0, 10_000).nullable().optional(),
    reason: text(500, 3),
  })
  .meta({ id: "AnchorMove" });
export type MoveAnchorInput = z.output<typeof moveAnchorInput>;

/** What `PATCH /anchors/{id}` takes: facts, or a move. */
export const anchorPatch = anchorChange
  .extend({ move: moveAnchorInput.optional() })
  .refine((value) => Object.keys(value).length > 0, "Nothing to change was sent.")
  .refine((value) => value.move === undefined || Object.keys(value).length === 1, {
    path: ["move"],
    message: "Move it in a call of its own.",
  })
  .meta({ id: "AnchorPatch" });

export const createSpanInput = z
  .strictObject({
    id,
    anchorAId: id,
    anchorBId: id,
    name: text(120),
    note: note().nullable().optional(),
  })
  .refine((value) => value.anchorAId !== value.anchorBId, {
    path: ["anchorBId"],
    message: "A span needs two anchors.",
  })
  .meta({ id: "NewSpan" });
export type CreateSpanInput = z.output<typeof createSpanInput>;

/** The anchor a form changes, in the version its reader saw. */
const anchorRef = { id, version: whole(1, 1_000_000_000) };
export const changeAnchorForm = formInput(anchorChange.extend(anchorRef));
export const moveAnchorForm = formInput(moveAnchorInput.extend(anchorRef));
