import "server-only";
import { inTransaction } from "@/db/client";
import { appendEvents } from "@/db/repositories/events";
import { closeWarningRow, findArea, listAnchorsWarned, lockWarning } from "@/db/repositories/stewarding";
import type { CommandContext } from "@/lib/commands/context";
import { authorize } from "@/lib/commands/writing/authorize";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { notFound, refuseStale } from "@/lib/commands/writing/refusals";
import { by } from "@/lib/commands/writing/stamp";
import { audience, isMember } from "@/lib/policy/audience";
import type { CloseWarningInput } from "@/lib/schemas/steward";
import { AppError } from "@/lib/shared/errors";

/** Closes a batch warning, with a reason; what it had hit is judged again without it. */
export async function closeBatchWarning(
  ctx: CommandContext,
  { id, reason, version }: CloseWarningInput & { version: number },
): Promise<{ id: string; version: number }> {
  return inTransaction(ctx.db, async (tx) => {
    const warning = await lockWarning(tx, id);
    const area = warning?.areaId ? await findArea(tx, warning.areaId) : null;
    const isHidden = area?.visibility === "members" && !isMember(audience(ctx.actor), area.id);
    if (!warning || isHidden) throw notFound();
    const person = authorize(ctx.actor, "warning.write", { areaId: warning.areaId });
    refuseStale(warning, version);
    if (warning.closedAt) throw new AppError("conflict", "This warning is closed already.");
    const hit = await listAnchorsWarned(tx, id);
    await closeWarningRow(tx, id, by(person, ctx.now));
    await appendEvents(tx, ctx, [
      {
        areaId: warning.areaId,
        subjectType: "batch_warning",
        subjectId: id,
        kind: "warning.closed",
        summary: `Batch warning closed: ${warning.title}`,
        reason,
      },
    ]);
    await reevaluate(tx, ctx, hit);
    return { id, version: version + 1 };
  });
}
