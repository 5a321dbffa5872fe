import type { BoltEvidence, BoltFacts } from "@/lib/domain/finding/evidence";
import type { Form, Level, Use } from "@/lib/domain/vocabulary";

/** What the rules need to know of a bolt's build and of a use, said once. */

const GLUED_FORMS: readonly Form[] = ["glued_stud_hanger", "glued_bent_rod", "glued_eye"];
const PLATE_FORMS: readonly Form[] = [
  "expansion_stud_hanger",
  "sleeve_hanger",
  "screw_hanger",
  "glued_stud_hanger",
];

/** Highline and rope access: a bend or a lost bolt is not tolerated. */
export function isSerious(use: Use): boolean {
  return use === "highline" || use === "rope_access";
}

export function isHighline(use: Use): boolean {
  return use === "highline";
}

export function isGlued(bolt: BoltFacts): boolean {
  if (GLUED_FORMS.includes(bolt.form)) return true;
  return bolt.method !== null && bolt.method !== "mechanical";
}

/** Held by expansion or thread alone. */
export function isMechanical(bolt: BoltFacts): boolean {
  return !isGlued(bolt);
}

/** The rope or connector hangs in a plate. */
export function hasPlate(bolt: BoltFacts): boolean {
  return PLATE_FORMS.includes(bolt.form);
}

/** A bolt at an edge only leads or pads the line: no load case of a use applies to it. */
export function carriesLoad(e: BoltEvidence): boolean {
  return e.placement === null || e.placement.role !== "edge";
}

/** Ascending severity; no finding counts like a note. */
const SEVERITY: Readonly<Record<Level, number>> = { note: 0, limit: 1, ask: 2, stop: 3 };

export function severity(level: Level | null): number {
  return level === null ? 0 : SEVERITY[level];
}

/** The worst of some levels; null when there is none. */
export function worstLevel(levels: readonly (Level | null)[]): Level | null {
  return levels.reduce<Level | null>((worst, level) => {
    if (level === null) return worst;
    return worst === null || severity(level) > severity(worst) ? level : worst;
  }, null);
}

/**
 * One level for a fact that is not known, from the level at each of its plausible values: the worst of them
 * when all lead to the same verdict, otherwise `ask`.
 */
export function acrossUnknown(levels: readonly (Level | null)[]): Level | null {
  const worst = worstLevel(levels);
  return levels.every((level) => severity(level) === severity(worst)) ? worst : "ask";
}
