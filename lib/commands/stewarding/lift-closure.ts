import "server-only";
import { inTransaction } from "@/db/client";
import { listAnchorIds } from "@/db/repositories/anchors";
import { appendEvents } from "@/db/repositories/events";
import { findArea, liftClosureRow, lockClosure } from "@/db/repositories/stewarding";
import type { CommandContext } from "@/lib/commands/context";
import { authorize } from "@/lib/commands/writing/authorize";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { notFound, refuseStale } from "@/lib/commands/writing/refusals";
import { by } from "@/lib/commands/writing/stamp";
import { audience, isMember } from "@/lib/policy/audience";
import type { LiftClosureInput } from "@/lib/schemas/steward";
import { AppError } from "@/lib/shared/errors";

/** Lifts a closure before its time, with a reason. It stays in history. */
export async function liftClosure(
  ctx: CommandContext,
  { id, reason, version }: LiftClosureInput & { version: number },
): Promise<{ id: string; version: number }> {
  return inTransaction(ctx.db, async (tx) => {
    const closure = await lockClosure(tx, id);
    const area = closure ? await findArea(tx, closure.areaId) : null;
    const isHidden = area?.visibility === "members" && !isMember(audience(ctx.actor), area.id);
    if (!closure || isHidden) throw notFound();
    const person = authorize(ctx.actor, "closure.write", { areaId: closure.areaId });
    refuseStale(closure, version);
    if (closure.liftedAt) throw new AppError("conflict", "This closure is lifted already.");
    await liftClosureRow(tx, id, by(person, ctx.now));
    await appendEvents(tx, ctx, [
      {
        areaId: closure.areaId,
        anchorId: closure.anchorId,
        subjectType: "closure",
        subjectId: id,
        kind: "closure.lifted",
        summary: `Closure lifted: ${closure.reason}`,
        reason,
      },
    ]);
    await reevaluate(tx, ctx, await listAnchorIds(tx, closure));
    return { id, version: version + 1 };
  });
}
