import "server-only";
import type { Tx } from "@/db/client";
import { setAnchorCondition, setBoltCondition } from "@/db/repositories/evaluation";
import type { EvidenceRows } from "@/db/repositories/evidence";
import { assembleCondition } from "@/lib/commands/evaluation/assemble-condition";
import { type ConditionColumns, conditionInForce } from "@/lib/commands/evaluation/condition-in-force";
import type { AnchorRows } from "@/lib/commands/evaluation/assemble-evidence";
import { type AnchorCondition, deriveCondition } from "@/lib/domain/condition/derive-condition";
import type { Condition } from "@/lib/domain/vocabulary";

/** The conditions the evidence gives; `bolts` are all that ever stood there. */
export function conditionOf(
  rows: Pick<AnchorRows, "head" | "placements" | "bolts" | "reports" | "policy">,
  now: Date,
): AnchorCondition {
  const { anchor } = rows.head;
  return deriveCondition(
    assembleCondition(anchor, [...rows.placements], rows.bolts, rows.reports, now),
    rows.policy,
  );
}

/** Writes the conditions that changed, one statement after the other: they share one transaction. */
export async function applyConditions(
  tx: Tx,
  anchor: EvidenceRows["heads"][number]["anchor"],
  bolts: EvidenceRows["bolts"],
  found: AnchorCondition,
): Promise<Condition> {
  const columns = conditionInForce(anchor, found);
  if (differs(anchor, columns)) await setAnchorCondition(tx, anchor.id, columns);
  for (const { bolt } of bolts) {
    const own = found.bolts.find((one) => one.boltId === bolt.id);
    if (!own) continue;
    const next = {
      condition: own.condition,
      derivedCondition: own.derived,
      outOfUseSince: own.outOfUseSince === null ? null : new Date(own.outOfUseSince),
    };
    if (differs(bolt, next)) await setBoltCondition(tx, bolt.id, next);
  }
  return columns.condition;
}

function differs(a: ConditionColumns, b: ConditionColumns): boolean {
  return (
    a.condition !== b.condition ||
    a.derivedCondition !== b.derivedCondition ||
    a.outOfUseSince?.getTime() !== b.outOfUseSince?.getTime()
  );
}
