import type {
  Attachment,
  Coast,
  DatePrecision,
  Depth,
  Form,
  Method,
  OnsetBasis,
  PlacementKind,
  PlacementRole,
  ReportKind,
  Side,
  So2Band,
  Use,
  Washing,
} from "@/lib/domain/vocabulary";

/**
 * Everything the rules may know about one bolt. `null` always means "not known": it is never a pass and
 * never a zero. Dates are `YYYY-MM-DD`; lengths mm unless the name says otherwise; forces kN.
 */
export interface BoltFacts {
  form: Form;
  /** EN number, `ti-1`…`ti-5`, `zinc-plated`, `hot-dip-galvanised`. */
  metal: string | null;
  hangerMetal: string | null;
  linkMetal: string | null;
  rodCount: number | null;
  rodDiameterMm: number | null;
  /** Rock face to the load, along the bolt axis. */
  leverMm: number | null;
  shankDiameterMm: number | null;
  ratedRadialKn: number | null;
  ratedAxialKn: number | null;
  /** Radial load at which a permanent bend begins; the low end where a range is known. */
  bendOnsetKn: number | null;
  bendOnsetHighKn: number | null;
  bendOnsetAxialKn: number | null;
  bendOnsetBasis: OnsetBasis;
  method: Method | null;
  embedmentMm: number | null;
  holeDiameterMm: number | null;
  eyeRadiusMm: number | null;
  coatingThicknessUm: number | null;
  installedOn: string | null;
  installedOnPrecision: DatePrecision;
  standard: string | null;
  batch: string | null;
  adhesiveId: string | null;
  adhesiveBatch: string | null;
  /** Characteristic bond strength of the adhesive; null: the 5-12 MPa range of common practice. */
  bondMpa: number | null;
  adhesiveExpiresOn: string | null;
  /** UTC instant, ISO 8601, from which the glue may be loaded. */
  usableFrom: string | null;
  recheckDueOn: string | null;
  /** A magnet sticks: plated or martensitic; does not: austenitic or titanium. */
  magnetic: boolean | null;
  /** 0 none to 4 section lost, as last seen. */
  rustGrade: number | null;
}

export interface PlaceFacts {
  seaDistanceM: number | null;
  /**
   * Half-width of the doubt about it; the careful side of it counts near a threshold. 0 when typed into a
   * what-if.
   */
  seaDistanceErrorM: number;
  coast: Coast;
  washing: Washing | null;
  so2: So2Band | null;
  saltedRoadDistanceM: number | null;
  warmDry: boolean;
}

export interface RockFacts {
  ucsMpa: number | null;
}

/** One report still open against the bolt (or its fitting or rock). */
export interface OpenReportFacts {
  reportId: string;
  kind: ReportKind;
  depth: Depth;
  observedAt: string;
  /** Worst component grade 0-4 reported; null when none was given. */
  grade: number | null;
  bendAngleDeg: number | null;
  crackMoves: boolean | null;
  crackNew: boolean | null;
  soundsHollow: boolean | null;
  metalCracked: boolean | null;
  /** False: came through a tag without an account and nobody has confirmed it. */
  confirmed: boolean;
}

export interface WarningFacts {
  warningId: string;
  title: string;
  says: "stop" | "inspect";
  /**
   * exact: everything matches. batch_unknown: all but the batch, which is not recorded. related: same
   * batch, metal or microclimate as one that failed.
   */
  match: "exact" | "batch_unknown" | "related";
}

/** What the in-rock judgement knows and a what-if does not. */
export interface CareFacts {
  openReports: readonly OpenReportFacts[];
  warnings: readonly WarningFacts[];
  /** Date of the last check that was at least `handled`; an install counts. */
  lastCheckOn: string | null;
  /** Metals with a confirmed stress-corrosion fracture at this site. */
  fracturedMetals: readonly string[];
  closures: readonly { closureId: string; reason: string; startsOn: string; endsOn: string | null }[];
}

/** The placement around the bolt. Present for a bolt in the rock, null for a type on its own. */
export interface PlacementFacts {
  placementId: string;
  number: number;
  kind: PlacementKind;
  role: PlacementRole;
  /** mm from placement 1: x right along the face, y up it, z out of the rock; null: not measured. */
  xMm: number | null;
  yMm: number | null;
  zMm: number | null;
  edgeDistanceMm: number | null;
  edgeSide: Side | null;
  overhang: boolean | null;
  /** Distances to abandoned holes near it. */
  deadHoleDistancesMm: readonly number[];
  rockBodyId: string | null;
}

export interface Demand {
  workingKn: number;
  peakKn: number;
  /** Angle between the pull and the bolt's axis out of the rock; 90 = across the bolt. */
  angleFromAxisDeg: number;
  /** Where the numbers come from, in words: "area policy, version 2", "typed". */
  origin: string;
}

/** The group of placements that share a load with the bolt. */
export interface GroupFacts {
  /** Main placements in use that may share the load, the bolt itself included. */
  mainCount: number;
  backupCount: number;
  /** True when every main placement has a position and the masterpoint is known. */
  hasGeometry: boolean;
  /** A line of protection bolts on one sheet: each carries all by itself. */
  isRow?: boolean;
  rockBodies: readonly { rockBodyId: string; attachment: Attachment; label: string }[];
  placements: readonly PlacementFacts[];
}

/**
 * choosing: a type is being picked (catalogue, what-if, the form before drilling): one bolt carries all and
 * failing that is a stop; care rules, one-lost and direction stay silent.
 * in_rock: the bounds of sharing apply and every rule speaks.
 */
export type Context = "choosing" | "in_rock";

export interface BoltEvidence {
  context: Context;
  use: Use;
  bolt: BoltFacts;
  place: PlaceFacts;
  rock: RockFacts;
  demand: Demand;
  /** The date the question is asked for, `YYYY-MM-DD`. */
  onDate: string;
  /** The UTC instant of a question about now; absent: any time of `onDate`. Only curing asks for the hour. */
  atUtc?: string;
  placement: PlacementFacts | null;
  group: GroupFacts | null;
  care: CareFacts | null;
  /** The line or sling goes straight through the bolt's eye or hanger (no connector); null: not known. */
  textileThroughEye: boolean | null;
}

export interface FittingFacts {
  fittingId: string;
  kind: "ring" | "chain" | "link" | "sling";
  metal: string | null;
  diameterMm: number | null;
  diameterLeftMm: number | null;
  replaceable: boolean;
}

/** What is judged once for an anchor, beside its bolts. */
export interface AnchorEvidence {
  anchorId: string;
  uses: readonly Use[];
  onDate: string;
  place: PlaceFacts;
  rock: RockFacts;
  group: GroupFacts;
  fittings: readonly FittingFacts[];
  care: CareFacts;
  /** One entry a use of each current bolt. */
  bolts: readonly { boltId: string; placementNumber: number; evidence: BoltEvidence }[];
}

/** An anchor held against one of its uses. */
export interface AnchorQuestion extends AnchorEvidence {
  use: Use;
}
