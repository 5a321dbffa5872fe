import type { Level, RuleCode, Use } from "@/lib/domain/vocabulary";
import type { Finding } from "@/lib/domain/finding/types";
import { worstLevel } from "@/lib/domain/finding/traits";

/** One named part of a priority: what it gives, of how much, and why. */
export interface PriorityPart {
  key: "load" | "grade" | "corrosion" | "people" | "one_lost" | "waiting";
  label: string;
  points: number;
  max: number;
  why: string;
}

export interface PriorityInput {
  /** Greatest part of a strength or bend onset used up; null: not known. */
  utilisation: number | null;
  /** Worst component grade on record, 0-4; null: not graded. */
  worstGrade: number | null;
  /** A report that takes it out of use stands against it. */
  outOfUse: boolean;
  /** The reasons of the anchor and of the bolts concerned. */
  findings: readonly Pick<Finding, "code" | "level">[];
  uses: readonly Use[];
  /** People-visits a year; null: not known. */
  visitsPerYear: number | null;
  /** UTC instants. */
  waitingSince: string;
  now: string;
}

export interface Priority {
  total: number;
  parts: readonly PriorityPart[];
}

/** Weight of a use by what depends on a single anchor in it (common practice). */
const USE_POINTS: Readonly<Record<Use, number>> = {
  highline: 8,
  rope_access: 8,
  belay: 8,
  abseil: 7,
  lower_off: 7,
  protection: 5,
  directional: 3,
};
const VISIT_POINTS = 7;
const VISITS_FULL = 365;
const DAY_MS = 86_400_000;

/**
 * How soon a rebolt is wanted: a sum of six named parts, 100 at most. What is not known counts part of the
 * way, never as nothing. The weights are common practice; a steward may move an entry, and this sum stays
 * visible beside it.
 */
export function reboltPriority(input: PriorityInput): Priority {
  const parts = [
    loadPart(input),
    gradePart(input),
    corrosionPart(input),
    peoplePart(input),
    oneLostPart(input),
    waitingPart(input),
  ].map((part) => ({ ...part, points: Math.round(part.points * 10) / 10 }));
  return { total: Math.round(parts.reduce((sum, part) => sum + part.points, 0) * 10) / 10, parts };
}

/** Highest total first; of equals, the one that waits longer. */
export function byPriority(
  a: { total: number; waitingSince: string },
  b: { total: number; waitingSince: string },
): number {
  return b.total - a.total || a.waitingSince.localeCompare(b.waitingSince);
}

function loadPart({ utilisation }: PriorityInput): PriorityPart {
  const part = { key: "load", label: "Load", max: 40 } as const;
  if (utilisation === null)
    return { ...part, points: 20, why: "The load could not be compared: half is counted." };
  return {
    ...part,
    points: 40 * Math.min(1, Math.max(0, utilisation)),
    why: `The load expected takes up ${Math.round(utilisation * 100)} % of what the weakest bolt bears.`,
  };
}

function gradePart({ worstGrade, outOfUse }: PriorityInput): PriorityPart {
  const part = { key: "grade", label: "Damage", max: 20 } as const;
  if (outOfUse) return { ...part, points: 20, why: "A report takes it out of use." };
  if (worstGrade === null)
    return { ...part, points: 5, why: "No component was graded: a quarter is counted." };
  return { ...part, points: 5 * worstGrade, why: `The worst component is grade ${worstGrade} of 4.` };
}

function corrosionPart({ findings }: PriorityInput): PriorityPart {
  const part = { key: "corrosion", label: "Corrosion", max: 15 } as const;
  const level = (...codes: RuleCode[]): Level | null =>
    worstLevel(findings.filter((found) => codes.includes(found.code)).map((found) => found.level));
  const cracking = level("metal.stress-corrosion");
  const wasting = level("metal.class", "metal.plated", "metal.unknown", "metal.mixed");
  if (cracking === "stop") return { ...part, points: 15, why: "Salt may crack it without warning." };
  if (wasting === "stop")
    return { ...part, points: 12, why: "The metal is far below what the place asks for." };
  if (cracking === "limit") return { ...part, points: 8, why: "Within reach of cracking from salt." };
  if (cracking === "ask" || wasting === "ask") {
    return { ...part, points: 7, why: "Metal or place not known: about half is counted." };
  }
  if (wasting === "limit") return { ...part, points: 5, why: "The metal is below what the place asks for." };
  return { ...part, points: 0, why: "Nothing found against the metal." };
}

function peoplePart({ uses, visitsPerYear }: PriorityInput): PriorityPart {
  const byUse = Math.max(0, ...uses.map((use) => USE_POINTS[use]));
  const byVisits =
    visitsPerYear === null
      ? VISIT_POINTS / 2
      : VISIT_POINTS * Math.min(1, Math.log1p(Math.max(0, visitsPerYear)) / Math.log1p(VISITS_FULL));
  const visits =
    visitsPerYear === null ? "visits not known: half is counted" : `${visitsPerYear} visits a year`;
  return {
    key: "people",
    label: "People",
    max: 15,
    points: byUse + byVisits,
    why: `Used for ${uses.length === 0 ? "nothing on record" : uses.join(", ").replaceAll("_", "-")}; ${visits}.`,
  };
}

function oneLostPart({ findings }: PriorityInput): PriorityPart {
  const part = { key: "one_lost", label: "If one goes", max: 5 } as const;
  const level = worstLevel(
    findings.filter((found) => found.code === "load.one-lost").map((found) => found.level),
  );
  switch (level) {
    case "stop":
      return { ...part, points: 5, why: "Nothing sufficient is left when one placement goes." };
    case "ask":
      return { ...part, points: 3, why: "Not known what is left when one placement goes." };
    case "limit":
      return { ...part, points: 2, why: "Little is left when one placement goes." };
    case "note":
    case null:
      return { ...part, points: 0, why: "The others take over when one placement goes." };
  }
}

function waitingPart({ waitingSince, now }: PriorityInput): PriorityPart {
  const days = Math.max(0, (new Date(now).getTime() - new Date(waitingSince).getTime()) / DAY_MS);
  return {
    key: "waiting",
    label: "Waiting",
    max: 5,
    points: 5 * Math.min(1, days / 365),
    why: `Waiting for ${Math.floor(days)} days; full after a year.`,
  };
}
