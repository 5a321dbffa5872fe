import { familyOf } from "@/lib/domain/catalogue/metals";
import { FORM_LABELS, USE_LABELS } from "@/lib/domain/labels";
import { type Form, FORMS, type Use, USES } from "@/lib/domain/vocabulary";
import { type MapAnchor, mapMark, MARK_RANK } from "@/lib/map/map-anchor";

/** The words of the filter sentence. The values stand in the address, so they stay as they are. */
export const FIXINGS = ["glued", "mechanical", ...FORMS] as const;
export type Fixing = (typeof FIXINGS)[number];

export const METAL_KINDS = ["stainless", "titanium", "plated", "not_known"] as const;
export type MetalKind = (typeof METAL_KINDS)[number];

export const STATES = [
  "out_of_use",
  "check_first_or_worse",
  "check_first",
  "not_enough_known_or_worse",
  "not_enough_known",
  "in_service",
  "removed",
] as const;
export type MapState = (typeof STATES)[number];

/** Metres from the sea; as text because the address carries it. */
export const SEA_LIMITS = ["100", "250", "1000", "3000"] as const;
export type SeaLimit = (typeof SEA_LIMITS)[number];

/** Null: every one. */
export interface MapFilter {
  state: MapState | null;
  fixing: Fixing | null;
  metal: MetalKind | null;
  use: Use | null;
  sea: SeaLimit | null;
  site: string | null;
  /** Words in code, name, row or site. */
  q: string;
}

export const NO_FILTER: MapFilter = {
  state: null,
  fixing: null,
  metal: null,
  use: null,
  sea: null,
  site: null,
  q: "",
};

export const STATE_WORDS: Readonly<Record<MapState, string>> = {
  out_of_use: "out of use or “do not use”",
  check_first_or_worse: "check first or worse",
  check_first: "check first",
  not_enough_known_or_worse: "not enough known or worse",
  not_enough_known: "not enough known",
  in_service: "in service",
  removed: "removed",
};

export const FIXING_WORDS: Readonly<Record<Fixing, string>> = {
  glued: "glued, any kind",
  mechanical: "mechanical, any kind",
  ...FORM_LABELS,
};

export const METAL_WORDS: Readonly<Record<MetalKind, string>> = {
  stainless: "stainless steel",
  titanium: "titanium",
  plated: "plated steel",
  not_known: "metal not recorded",
};

export const SEA_WORDS: Readonly<Record<SeaLimit, string>> = {
  "100": "within 100\u202fm of the sea",
  "250": "within 250\u202fm of the sea",
  "1000": "within 1\u202fkm of the sea",
  "3000": "within 3\u202fkm of the sea",
};

const GLUED: readonly Form[] = ["glued_stud_hanger", "glued_bent_rod", "glued_eye"];

/** True when the anchor fits every word of the sentence. What is not known fits no limit. */
export function fits(anchor: MapAnchor, filter: MapFilter): boolean {
  return (
    (filter.state === null || fitsState(anchor, filter.state)) &&
    fitsHardware(anchor, filter) &&
    (filter.use === null || anchor.uses.includes(filter.use)) &&
    (filter.sea === null || (anchor.seaDistanceM !== null && anchor.seaDistanceM <= Number(filter.sea))) &&
    (filter.site === null || anchor.siteSlug === filter.site) &&
    fitsWords(anchor, filter.q)
  );
}

function fitsState(anchor: MapAnchor, state: MapState): boolean {
  const mark = mapMark(anchor);
  if (state === "check_first_or_worse") return MARK_RANK[mark] >= MARK_RANK.check_first;
  if (state === "not_enough_known_or_worse") return MARK_RANK[mark] >= MARK_RANK.not_enough_known;
  return mark === state;
}

/** Fixing and metal have to be true of the same bolt. */
function fitsHardware(anchor: MapAnchor, { fixing, metal }: MapFilter): boolean {
  if (fixing === null && metal === null) return true;
  return anchor.hardware.some(
    (bolt) =>
      (fixing === null || isFixed(bolt.form, fixing)) &&
      (metal === null || (familyOf(bolt.metal) ?? "not_known") === metal),
  );
}

function isFixed(form: Form, fixing: Fixing): boolean {
  if (fixing === "glued") return GLUED.includes(form);
  if (fixing === "mechanical") return !GLUED.includes(form);
  return form === fixing;
}

function fitsWords(anchor: MapAnchor, q: string): boolean {
  const hay = [anchor.code, anchor.label, anchor.rowName ?? "", anchor.siteName].join(" ").toLowerCase();
  return q
    .toLowerCase()
    .split(/\s+/)
    .every((word) => hay.includes(word));
}

export interface Choice<T extends string> {
  value: T;
  label: string;
  /** How many anchors there would be with this word, the rest of the sentence unchanged. */
  count: number;
}

export interface MapChoices {
  state: readonly Choice<MapState>[];
  fixing: readonly Choice<Fixing>[];
  metal: readonly Choice<MetalKind>[];
  use: readonly Choice<Use>[];
  sea: readonly Choice<SeaLimit>[];
  site: readonly Choice<string>[];
}

/** Every word the sentence could have, with its count; words nothing here answers to are left out. */
export function choicesFor(anchors: readonly MapAnchor[], filter: MapFilter): MapChoices {
  const offered = <T extends string>(
    words: readonly (readonly [T, string])[],
    current: T | null,
    change: (from: MapFilter, value: T) => MapFilter,
  ): Choice<T>[] =>
    words
      .filter(([value]) => value === current || count(anchors, change(NO_FILTER, value)) > 0)
      .map(([value, label]) => ({ value, label, count: count(anchors, change(filter, value)) }));
  return {
    state: offered(pairs(STATES, STATE_WORDS), filter.state, (from, state) => ({ ...from, state })),
    fixing: offered(pairs(FIXINGS, FIXING_WORDS), filter.fixing, (from, fixing) => ({ ...from, fixing })),
    metal: offered(pairs(METAL_KINDS, METAL_WORDS), filter.metal, (from, metal) => ({ ...from, metal })),
    use: offered(pairs(USES, USE_LABELS), filter.use, (from, use) => ({ ...from, use })),
    sea: offered(pairs(SEA_LIMITS, SEA_WORDS), filter.sea, (from, sea) => ({ ...from, sea })),
    site: offered(sitesOf(anchors), filter.site, (from, site) => ({ ...from, site })),
  };
}

function pairs<T extends string>(values: readonly T[], words: Readonly<Record<T, string>>) {
  return values.map((value) => [value, words[value]] as const);
}

function count(anchors: readonly MapAnchor[], filter: MapFilter): number {
  return anchors.filter((anchor) => fits(anchor, filter)).length;
}

function sitesOf(anchors: readonly MapAnchor[]): (readonly [string, string])[] {
  const names = new Map(anchors.map((anchor) => [anchor.siteSlug, anchor.siteName]));
  return [...names].sort(([, a], [, b]) => a.localeCompare(b, "en"));
}

/** A span is shown while one of its ends is. */
export function spansBetween<S extends { aCode: string; bCode: string }>(
  spans: readonly S[],
  anchors: readonly { code: string }[],
): S[] {
  const codes = new Set(anchors.map((anchor) => anchor.code));
  return spans.filter((span) => codes.has(span.aCode) || codes.has(span.bCode));
}

/** The sentence in short: "check first or worse, glued, any kind, within 1 km of the sea". */
export function filterInWords(filter: MapFilter, siteName: string | null): string {
  const { state, fixing, metal, use, sea, q } = filter;
  const words = [
    state && STATE_WORDS[state],
    fixing && FIXING_WORDS[fixing],
    metal && METAL_WORDS[metal],
    use && `for ${USE_LABELS[use]}`,
    sea && SEA_WORDS[sea],
    siteName && `in ${siteName}`,
    q.trim() === "" ? null : `named “${q.trim()}”`,
  ].filter((part) => part !== null);
  return words.length === 0 ? "every anchor" : words.join(", ");
}

export function isFiltered(filter: MapFilter): boolean {
  return (
    filter.q.trim() !== "" || Object.entries(filter).some(([key, value]) => key !== "q" && value !== null)
  );
}
