import "server-only";
import { updateAnchorRow } from "@/db/repositories/anchors";
import { findBolt, updateBoltRow } from "@/db/repositories/bolts";
import { appendEvents } from "@/db/repositories/events";
import { listRecipients } from "@/db/repositories/recipients";
import type { CommandContext } from "@/lib/commands/context";
import { nudgeMail } from "@/lib/commands/mail-loop";
import { onAnchor } from "@/lib/commands/writing/on-anchor";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { notFound } from "@/lib/commands/writing/refusals";
import { by } from "@/lib/commands/writing/stamp";
import { writeTo } from "@/lib/commands/writing/write-to";
import { CONDITION_LABELS } from "@/lib/domain/labels";
import type { Condition } from "@/lib/domain/vocabulary";
import { outOfUseMail } from "@/lib/mail/templates/register";
import type { DecideConditionInput } from "@/lib/schemas/report";
import { AppError } from "@/lib/shared/errors";

/**
 * A steward sets a condition by hand, with a reason. What the evidence says stays beside it. Out of use by an
 * event is not lifted this way: that asks for hand checks.
 */
export async function decideCondition(
  ctx: CommandContext,
  { anchorId, boltId, condition, reason }: DecideConditionInput,
): Promise<{ condition: Condition }> {
  const decided = await onAnchor(ctx, anchorId, "condition.decide", async ({ tx, anchor, person }) => {
    const found = boltId ? await findBolt(tx, boltId) : null;
    if (boltId && (found?.anchorId !== anchorId || found.bolt.removedOn || found.bolt.struckAt))
      throw notFound();
    const stored = found?.bolt ?? anchor.anchor;
    const heldByEvent = stored.derivedCondition === "out_of_use" || anchor.outOfUseSince !== null;
    if (heldByEvent && condition !== null && condition !== "out_of_use" && condition !== "removed") {
      throw new AppError(
        "refused_by_rule",
        "It is out of use by what was reported. Answer the report and put it back with a check by hand.",
      );
    }
    const change = {
      decidedCondition: condition,
      decidedReason: condition === null ? null : reason,
      decidedBy: condition === null ? null : person.userId,
      decidedAt: condition === null ? null : ctx.now,
    };
    if (found) await updateBoltRow(tx, found.bolt.id, change, by(person, ctx.now));
    else await updateAnchorRow(tx, anchorId, change, by(person, ctx.now));
    await appendEvents(tx, ctx, [
      {
        areaId: anchor.areaId,
        anchorId,
        subjectType: found ? "bolt" : "anchor",
        subjectId: boltId ?? anchorId,
        kind: "condition.decided",
        summary: `${found ? `Placement ${found.placementNumber}` : "Anchor"}: ${condition === null ? "follows the evidence again" : CONDITION_LABELS[condition]}`,
        before: { decidedCondition: stored.decidedCondition },
        after: { decidedCondition: condition },
        reason,
      },
    ]);
    const [judged] = await reevaluate(tx, ctx, [anchorId]);
    const next = judged?.after.condition ?? anchor.condition;
    if (next === "out_of_use" && anchor.condition !== "out_of_use") {
      const about = {
        anchorLabel: anchor.label,
        siteName: anchor.siteName,
        sheetPath: `/anchors/${anchor.code}`,
      };
      const key = `decided:${anchorId}:${ctx.requestId}`;
      const cause = { key, areaId: anchor.areaId, now: ctx.now };
      await writeTo(tx, await listRecipients(tx, anchorId), outOfUseMail({ ...about, reason }), cause);
    }
    return { condition: next };
  });
  nudgeMail();
  return decided;
}
