import { METALS } from "@/lib/domain/catalogue/metals";
import type {
  Attachment,
  Coast,
  Condition,
  Depth,
  FittingKind,
  Form,
  HoleCleaning,
  HoleFate,
  JobOutcome,
  JobState,
  Level,
  Method,
  OnsetBasis,
  PlacementKind,
  PlacementRole,
  ReportKind,
  ReportState,
  RiggingKind,
  RuleCode,
  Sharpness,
  Side,
  SiteVisibility,
  So2Band,
  SourceMark,
  TypeStatus,
  Use,
  Verdict,
  Washing,
} from "@/lib/domain/vocabulary";
import type { Role } from "@/lib/shared/actor";

/** The words people read for every closed list of the register. Lower case; a sentence makes its own capital. */

export const USE_LABELS: Readonly<Record<Use, string>> = {
  highline: "highline",
  belay: "belay",
  lower_off: "lower-off",
  abseil: "abseil",
  protection: "protection",
  rope_access: "rope access",
  directional: "directional",
};

export const FORM_LABELS: Readonly<Record<Form, string>> = {
  expansion_stud_hanger: "expansion stud + hanger",
  sleeve_hanger: "sleeve bolt + hanger",
  screw_hanger: "screw bolt + hanger",
  glued_stud_hanger: "glued stud + hanger",
  glued_bent_rod: "glued bent rod",
  glued_eye: "glued forged or welded eye",
};

export const METHOD_LABELS: Readonly<Record<Method, string>> = {
  mechanical: "mechanical",
  epoxy: "glued, epoxy",
  vinylester: "glued, vinylester",
  polyester: "glued, polyester",
  mechanical_and_glue: "mechanical + glue",
};

export const ONSET_BASIS_LABELS: Readonly<Record<OnsetBasis, string>> = {
  tested: "tested",
  maker: "maker",
  estimate: "estimate",
  unknown: "not known",
};

export const CONDITION_LABELS: Readonly<Record<Condition, string>> = {
  in_service: "in service",
  check_first: "check first",
  out_of_use: "out of use",
  removed: "removed",
};

export const LEVEL_LABELS: Readonly<Record<Level, string>> = {
  stop: "stop",
  ask: "ask",
  limit: "limit",
  note: "note",
};

export const VERDICT_LABELS: Readonly<Record<Verdict, string>> = {
  do_not_use: "Do not use",
  not_enough_known: "Not enough known",
  within_limits: "Only within",
  nothing_against: "Nothing found against it",
};

export const SOURCE_MARK_LABELS: Readonly<Record<SourceMark, string>> = {
  published: "published",
  restated: "restated by others",
  from_memory: "from memory",
  common_practice: "common practice",
  arithmetic: "arithmetic",
};

export const WASHING_LABELS: Readonly<Record<Washing, string>> = {
  rain: "washed by rain",
  cleaned: "cleaned by hand",
  none: "never washed",
};

export const SO2_LABELS: Readonly<Record<So2Band, string>> = { low: "low", medium: "medium", high: "high" };

export const PLACEMENT_KIND_LABELS: Readonly<Record<PlacementKind, string>> = {
  bolt: "bolt",
  tree: "tree",
  boulder: "boulder",
  thread: "thread",
  removable: "removable gear",
};

export const PLACEMENT_ROLE_LABELS: Readonly<Record<PlacementRole, string>> = {
  main: "main",
  backup: "backup",
  edge: "edge",
};

export const ATTACHMENT_LABELS: Readonly<Record<Attachment, string>> = {
  attached: "attached",
  detached: "detached",
  hollow: "hollow",
  unknown: "attachment not known",
};

export const SIDE_LABELS: Readonly<Record<Side, string>> = {
  left: "left",
  right: "right",
  above: "above",
  below: "below",
};

export const RIGGING_LABELS: Readonly<Record<RiggingKind, string>> = {
  fixed: "tied legs",
  sliding: "sliding",
  series: "main and backup in series",
};

export const REPORT_KIND_LABELS: Readonly<Record<ReportKind, string>> = {
  routine_check: "routine check",
  deformation: "deformation",
  corrosion: "corrosion",
  nut_loose: "nut loose",
  hanger_spins: "hanger spins",
  stud_turns: "stud turns",
  glue_in_moves: "glue-in moves",
  rock: "rock",
  wear: "wear",
  after_storm: "after a storm or big load",
  missing: "missing",
  not_in_register: "not in the register",
  other: "other",
};

export const DEPTH_LABELS: Readonly<Record<Depth, string>> = {
  seen: "seen",
  handled: "handled",
  torqued: "torqued",
  pulled: "pulled",
};

export const REPORT_STATE_LABELS: Readonly<Record<ReportState, string>> = {
  open: "open",
  handled: "handled",
  struck: "struck through",
};

export const JOB_STATE_LABELS: Readonly<Record<JobState, string>> = {
  proposed: "proposed",
  accepted: "accepted",
  done: "done",
  turned_down: "turned down",
};

export const JOB_OUTCOME_LABELS: Readonly<Record<JobOutcome, string>> = {
  new_bolt: "new bolt",
  tightened: "tightened",
  link_swapped: "link swapped",
  tested: "tested",
  removed: "removed",
};

export const HOLE_FATE_LABELS: Readonly<Record<HoleFate, string>> = {
  reused: "used again",
  plugged: "plugged",
  left_open: "left open",
  none: "no hole",
};

export const FITTING_KIND_LABELS: Readonly<Record<FittingKind, string>> = {
  ring: "ring",
  chain: "chain",
  link: "link",
  sling: "sling",
};

export const SHARPNESS_LABELS: Readonly<Record<Sharpness, string>> = {
  sharp: "sharp",
  rounded: "rounded",
  smooth: "smooth",
};

export const HOLE_CLEANING_LABELS: Readonly<Record<HoleCleaning, string>> = {
  brushed_and_blown: "brushed and blown out",
  blown: "blown out",
  brushed: "brushed",
  not_cleaned: "not cleaned",
};

export const SITE_VISIBILITY_LABELS: Readonly<Record<SiteVisibility, string>> = {
  public: "public",
  sensitive: "place known to members only",
  members: "members only",
};

export const TYPE_STATUS_LABELS: Readonly<Record<TypeStatus, string>> = {
  current: "current",
  discontinued: "discontinued",
};

/** A metal as it is stored, in words: `1.4404` stays as it is, `ti-2` becomes "titanium grade 2". */
export function metalLabel(metal: string | null): string {
  if (metal === null) return "metal not known";
  const grade = /^ti-(\d)$/.exec(metal)?.[1];
  if (grade !== undefined) return `titanium grade ${grade}`;
  return metal === "hot-dip-galvanised" ? "hot-dip galvanised" : metal.replace("-", " ");
}

/** The metals a form offers, in words. */
export const METAL_CHOICES = METALS.map((metal) => ({ value: metal, label: metalLabel(metal) }));

/** `["lower_off", "abseil"]` → "lower-off, abseil". */
export function usesLabel(uses: readonly Use[]): string {
  return uses.map((use) => USE_LABELS[use]).join(", ");
}

/** First letter upper case, the rest as it is: "in service" → "In service". */
export function sentence(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
