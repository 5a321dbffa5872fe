import "server-only";
import type { DerivedCondition } from "@/lib/domain/condition/derive-condition";
import type { Condition } from "@/lib/domain/vocabulary";

export interface ConditionColumns {
  condition: Condition;
  derivedCondition: Condition;
  outOfUseSince: Date | null;
}

/**
 * An anchor that an event took out of use stays out until a steward puts it back: checks by hand alone change
 * what the evidence says (`derivedCondition`), not what holds. Putting back clears `outOfUseSince`.
 */
export function conditionInForce(
  anchor: Pick<ConditionColumns, "outOfUseSince">,
  found: DerivedCondition,
): ConditionColumns {
  const event = found.outOfUseSince === null ? null : new Date(found.outOfUseSince);
  const outOfUseSince = later(anchor.outOfUseSince, event);
  const held = outOfUseSince !== null && found.condition !== "removed";
  return {
    condition: held ? "out_of_use" : found.condition,
    derivedCondition: found.derived,
    outOfUseSince,
  };
}

function later(a: Date | null, b: Date | null): Date | null {
  if (a === null || b === null) return a ?? b;
  return a > b ? a : b;
}
