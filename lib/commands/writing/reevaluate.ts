import "server-only";
import type { Tx } from "@/db/client";
import { lockAnchors } from "@/db/repositories/anchors";
import { appendEvents } from "@/db/repositories/events";
import type { CommandContext } from "@/lib/commands/context";
import { type EvaluatedAnchor, evaluateAnchors } from "@/lib/commands/evaluation/evaluate-anchors";
import { CONDITION_LABELS } from "@/lib/domain/labels";

const AT_A_TIME = 50;

/**
 * Judges anchors again after a write, in its transaction, and puts each change of condition on record.
 * Locks them in the order of their ids.
 */
export async function reevaluate(
  tx: Tx,
  ctx: CommandContext,
  anchorIds: readonly string[],
): Promise<EvaluatedAnchor[]> {
  const ids = [...new Set(anchorIds)].toSorted();
  const done: EvaluatedAnchor[] = [];
  for (let from = 0; from < ids.length; from += AT_A_TIME) {
    const batch = ids.slice(from, from + AT_A_TIME);
    await lockAnchors(tx, batch);
    done.push(...(await evaluateAnchors(tx, batch, { now: ctx.now })));
  }
  await appendEvents(
    tx,
    ctx,
    done
      .filter(({ before, after }) => before.condition !== after.condition)
      .map(({ anchorId, areaId, before, after }) => ({
        areaId,
        anchorId,
        subjectType: "anchor",
        subjectId: anchorId,
        kind: "anchor.condition-changed",
        summary: `Condition: ${CONDITION_LABELS[before.condition]} → ${CONDITION_LABELS[after.condition]}`,
        before: { condition: before.condition },
        after: { condition: after.condition },
      })),
  );
  return done;
}
