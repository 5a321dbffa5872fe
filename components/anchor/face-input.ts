import type {
  Attachment,
  Condition,
  Form,
  Level,
  PlacementKind,
  PlacementRole,
  RiggingKind,
  Sharpness,
} from "@/lib/domain/vocabulary";

export interface Point {
  xMm: number;
  yMm: number;
}

export interface FacePlacement {
  number: number;
  kind: PlacementKind;
  role: PlacementRole;
  /** From placement 1, x right and y up, looking at the rock; null: not measured. */
  xMm: number | null;
  yMm: number | null;
  /** The bolt now in the hole; null: a natural placement, or an empty hole. */
  bolt: { form: Form; condition: Condition; words: string } | null;
  deadHoles: readonly Point[];
  rockBodyId: string | null;
  /** Trunk, boulder or neck; null: not measured. */
  sizeMm: number | null;
}

export interface FaceEdge {
  label: string;
  sharpness: Sharpness;
  paddingNeeded: boolean;
  x1Mm: number | null;
  y1Mm: number | null;
  x2Mm: number | null;
  y2Mm: number | null;
}

/** All that the face drawing needs, with nothing worked out yet. */
export interface FaceInput {
  placements: readonly FacePlacement[];
  masterpoint: Point | null;
  rigging: { kind: RiggingKind; legLengthsM: readonly (number | null)[] } | null;
  edges: readonly FaceEdge[];
  rockBodies: readonly { id: string; label: string; attachment: Attachment }[];
  /** Azimuth the face looks to and dip from horizontal; null: not recorded. */
  faceAzimuthDeg: number | null;
  faceDipDeg: number | null;
  /** Direction the load is expected to pull; null: not recorded. */
  designAzimuthDeg: number | null;
  designElevationDeg: number | null;
  /** Numbered reasons; placementNumber null: about the whole anchor. */
  reasons: readonly { number: number; level: Level; placementNumber: number | null }[];
  /** A line of protection bolts: drawn as a strip with heights. */
  isRow: boolean;
}
