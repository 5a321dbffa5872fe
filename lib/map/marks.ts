import type { Condition, Verdict } from "@/lib/domain/vocabulary";

/** The five marks: the four conditions, and "not enough known". The same on map, table, sheet and print. */
export const MARKS = ["in_service", "check_first", "out_of_use", "not_enough_known", "removed"] as const;
export type Mark = (typeof MARKS)[number];

/** The colour role a mark is drawn in; the CSS variable is `--<tone>-fill` (`--muted` for "removed"). */
export type MarkTone = "calm" | "warn" | "stop" | "info" | "muted";

/** Drawn in a box of 24 by 24 around (12, 12): either filled or stroked, never both. */
export interface MarkShape {
  d: string;
  tone: MarkTone;
  /** Null: the path is filled. */
  stroke: { width: number; dash: readonly [number, number] | null } | null;
}

export const MARK_BOX = 24;

/** A circle as two arcs, so that canvas and SVG read the same string. */
const circle = (r: number) => `M${12 - r} 12a${r} ${r} 0 1 1 ${2 * r} 0a${r} ${r} 0 1 1 ${-2 * r} 0Z`;

/** Six dashes fill the ring of radius 8 exactly: 2π·8 / 6 = 8.378. */
const RING_DASH = [5, 3.378] as const;

export const MARK_SHAPES: Readonly<Record<Mark, MarkShape>> = {
  /** A filled disc. */
  in_service: { d: circle(9), tone: "calm", stroke: null },
  /** The disc of radius 9 with a bite of radius 5.5 around (19, 6) out of it. */
  check_first: {
    d: "M14.22 3.28A9 9 0 1 0 20.96 11.14A5.5 5.5 0 0 1 14.22 3.28Z",
    tone: "warn",
    stroke: null,
  },
  /** A square, cut by a bar that sticks out on both sides. */
  out_of_use: {
    d: "M4 4H20V8.6H4ZM1 10.4H23V13.6H1ZM4 15.4H20V20H4Z",
    tone: "stop",
    stroke: null,
  },
  /** A dashed ring. */
  not_enough_known: { d: circle(8), tone: "info", stroke: { width: 2.5, dash: RING_DASH } },
  /** A hollow ring. */
  removed: { d: circle(8), tone: "muted", stroke: { width: 2, dash: null } },
};

export const MARK_LABELS: Readonly<Record<Mark, string>> = {
  in_service: "in service",
  check_first: "check first",
  out_of_use: "out of use",
  not_enough_known: "not enough known",
  removed: "removed",
};

/** The mark of a verdict: the shape of the condition it asks for. */
export const VERDICT_MARKS: Readonly<Record<Verdict, Mark>> = {
  nothing_against: "in_service",
  within_limits: "check_first",
  not_enough_known: "not_enough_known",
  do_not_use: "out_of_use",
};

/** One mark for both: the condition, unless it is "in service" only because too little is known to say more. */
export function markOf(condition: Condition, verdict: Verdict | null): Mark {
  return condition === "in_service" && verdict === "not_enough_known" ? "not_enough_known" : condition;
}

/** Worst first: what a cluster shows. A removed anchor outranks nothing. */
export function worstMark(marks: readonly Mark[]): Mark | null {
  const order: readonly Mark[] = ["out_of_use", "check_first", "not_enough_known", "in_service", "removed"];
  return order.find((mark) => marks.includes(mark)) ?? null;
}
