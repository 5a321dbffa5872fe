import type { Condition, Form, Use, Verdict } from "@/lib/domain/vocabulary";
import { MARKS, markOf, type Mark } from "@/lib/map/marks";

/** What the map needs to know of an anchor. The rows of lists and of the API have all of it. */
export interface MapAnchor {
  code: string;
  label: string;
  siteSlug: string;
  siteName: string;
  rowName: string | null;
  uses: readonly Use[];
  condition: Condition;
  verdict: Verdict | null;
  /** False: the point is the site's, rounded to about 1 km. */
  exact: boolean;
  point: { coordinates: readonly [number, number] };
  /** Null: not known, or not shown to this reader. */
  seaDistanceM: number | null;
  hardware: readonly { form: Form; metal: string | null }[];
}

export interface MapSpan {
  name: string;
  lengthM: number;
  aCode: string;
  bCode: string;
  coordinates: readonly [readonly [number, number], readonly [number, number]];
}

/** How far down the scale a mark stands; a group of anchors shows the highest inside. */
export const MARK_RANK: Readonly<Record<Mark, number>> = {
  removed: 0,
  in_service: 1,
  not_enough_known: 2,
  check_first: 3,
  out_of_use: 4,
};

/** Worst first. */
export const MARKS_BY_RANK: readonly Mark[] = [...MARKS].sort((a, b) => MARK_RANK[b] - MARK_RANK[a]);

/**
 * The mark on the map. On a small drawing there is room for one sign only, so it is never milder than the
 * verdict: "do not use" is drawn as out of use, although nobody may have taken the anchor out of use yet.
 */
export function mapMark({ condition, verdict }: Pick<MapAnchor, "condition" | "verdict">): Mark {
  if (condition !== "removed" && verdict === "do_not_use") return "out_of_use";
  return markOf(condition, verdict);
}

/** What each mark says on the map, in the plural sense of a count: "3 out of use or do not use". */
export const MAP_MARK_WORDS: Readonly<Record<Mark, string>> = {
  out_of_use: "out of use or “do not use”",
  check_first: "check first",
  not_enough_known: "not enough known",
  in_service: "in service",
  removed: "removed",
};

export type MarkCounts = Readonly<Record<Mark, number>>;

/** How many of each mark. */
export function countMarks(anchors: readonly Pick<MapAnchor, "condition" | "verdict">[]): MarkCounts {
  const counts = { removed: 0, in_service: 0, not_enough_known: 0, check_first: 0, out_of_use: 0 };
  for (const anchor of anchors) counts[mapMark(anchor)] += 1;
  return counts;
}

/** The worst mark a group holds; null for an empty one. */
export function worstOf(counts: MarkCounts): Mark | null {
  return MARKS_BY_RANK.find((mark) => counts[mark] > 0) ?? null;
}

/** `2 out of use or “do not use”, 3 check first`: worst first, absent ones left out. */
export function splitInWords(counts: MarkCounts): string {
  return MARKS_BY_RANK.filter((mark) => counts[mark] > 0)
    .map((mark) => `${counts[mark]} ${MAP_MARK_WORDS[mark]}`)
    .join(", ");
}

/** The counts of a group as the map's source hands them back. */
export function readCounts(properties: Readonly<Record<string, unknown>>): MarkCounts {
  const of = (mark: Mark) => {
    const value = Number(properties[mark]);
    return Number.isFinite(value) ? value : 0;
  };
  return {
    removed: of("removed"),
    in_service: of("in_service"),
    not_enough_known: of("not_enough_known"),
    check_first: of("check_first"),
    out_of_use: of("out_of_use"),
  };
}
