/**
 * The closed word lists of the register. The spelling here is the one stored in the database and used by
 * the API (lower_snake; metals keep their hyphens). What people read comes from `labels.ts`.
 */
export const USES = [
  "highline",
  "belay",
  "lower_off",
  "abseil",
  "protection",
  "rope_access",
  "directional",
] as const;
export type Use = (typeof USES)[number];

export const FORMS = [
  "expansion_stud_hanger",
  "sleeve_hanger",
  "screw_hanger",
  "glued_stud_hanger",
  "glued_bent_rod",
  "glued_eye",
] as const;
export type Form = (typeof FORMS)[number];

export const METHODS = ["mechanical", "epoxy", "vinylester", "polyester", "mechanical_and_glue"] as const;
export type Method = (typeof METHODS)[number];

/** Where a bend-onset number comes from. */
export const ONSET_BASES = ["tested", "maker", "estimate", "unknown"] as const;
export type OnsetBasis = (typeof ONSET_BASES)[number];

export const CONDITIONS = ["in_service", "check_first", "out_of_use", "removed"] as const;
export type Condition = (typeof CONDITIONS)[number];

export const LEVELS = ["note", "limit", "ask", "stop"] as const;
/** Ascending severity: the verdict is the worst level present. */
export type Level = (typeof LEVELS)[number];

export const VERDICTS = ["nothing_against", "within_limits", "not_enough_known", "do_not_use"] as const;
export type Verdict = (typeof VERDICTS)[number];

export const RULE_CODES = [
  "load.bend",
  "load.strength",
  "load.one-lost",
  "load.direction",
  "load.unknown",
  "metal.class",
  "metal.stress-corrosion",
  "metal.plated",
  "metal.mixed",
  "metal.unknown",
  "rock.embedment",
  "rock.spacing",
  "rock.edge",
  "rock.method",
  "rock.hold",
  "rock.one-body",
  "eye.radius",
  "fitting.wear",
  "record.missing",
  "record.curing",
  "record.glue-expired",
  "record.warning",
  "record.standard",
  "care.overdue",
  "care.report-open",
  "care.closure",
] as const;
export type RuleCode = (typeof RULE_CODES)[number];

export const SOURCE_MARKS = [
  "published",
  "restated",
  "from_memory",
  "common_practice",
  "arithmetic",
] as const;
export type SourceMark = (typeof SOURCE_MARKS)[number];

export const WASHINGS = ["rain", "cleaned", "none"] as const;
export type Washing = (typeof WASHINGS)[number];

export const SO2_BANDS = ["low", "medium", "high"] as const;
export type So2Band = (typeof SO2_BANDS)[number];

export const COASTS = ["other", "baltic_or_german_north_sea", "strict"] as const;
export type Coast = (typeof COASTS)[number];

export const PLACEMENT_KINDS = ["bolt", "tree", "boulder", "thread", "removable"] as const;
export type PlacementKind = (typeof PLACEMENT_KINDS)[number];

export const PLACEMENT_ROLES = ["main", "backup", "edge"] as const;
export type PlacementRole = (typeof PLACEMENT_ROLES)[number];

export const ATTACHMENTS = ["attached", "detached", "hollow", "unknown"] as const;
export type Attachment = (typeof ATTACHMENTS)[number];

export const SIDES = ["left", "right", "above", "below"] as const;
export type Side = (typeof SIDES)[number];

export const RIGGINGS = ["fixed", "sliding", "series"] as const;
export type RiggingKind = (typeof RIGGINGS)[number];

export const DATE_PRECISIONS = ["day", "month", "year", "before"] as const;
/** How well a past date is known; "before" means the event lies before the date given. */
export type DatePrecision = (typeof DATE_PRECISIONS)[number];

export const REPORT_KINDS = [
  "routine_check",
  "deformation",
  "corrosion",
  "nut_loose",
  "hanger_spins",
  "stud_turns",
  "glue_in_moves",
  "rock",
  "wear",
  "after_storm",
  "missing",
  "not_in_register",
  "other",
] as const;
export type ReportKind = (typeof REPORT_KINDS)[number];

/** How close the observer got. */
export const DEPTHS = ["seen", "handled", "torqued", "pulled"] as const;
export type Depth = (typeof DEPTHS)[number];

export const REPORT_STATES = ["open", "handled", "struck"] as const;
export type ReportState = (typeof REPORT_STATES)[number];

export const JOB_STATES = ["proposed", "accepted", "done", "turned_down"] as const;
export type JobState = (typeof JOB_STATES)[number];

export const JOB_OUTCOMES = ["new_bolt", "tightened", "link_swapped", "tested", "removed"] as const;
export type JobOutcome = (typeof JOB_OUTCOMES)[number];

/** What became of the old hole when a bolt was taken out. */
export const HOLE_FATES = ["reused", "plugged", "left_open", "none"] as const;
export type HoleFate = (typeof HOLE_FATES)[number];

export const FITTING_KINDS = ["ring", "chain", "link", "sling"] as const;
export type FittingKind = (typeof FITTING_KINDS)[number];

export const SHARPNESSES = ["sharp", "rounded", "smooth"] as const;
export type Sharpness = (typeof SHARPNESSES)[number];

export const HOLE_CLEANINGS = ["brushed_and_blown", "blown", "brushed", "not_cleaned"] as const;
export type HoleCleaning = (typeof HOLE_CLEANINGS)[number];

export const AREA_VISIBILITIES = ["public", "members"] as const;
export type AreaVisibility = (typeof AREA_VISIBILITIES)[number];

/**
 * public: everything shown. sensitive: outsiders get the name and a rounded point only.
 * members: absent for everyone who is not a member of the area.
 */
export const SITE_VISIBILITIES = ["public", "sensitive", "members"] as const;
export type SiteVisibility = (typeof SITE_VISIBILITIES)[number];

export const TYPE_STATUSES = ["current", "discontinued"] as const;
export type TypeStatus = (typeof TYPE_STATUSES)[number];
