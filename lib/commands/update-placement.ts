import "server-only";
import { findPlacement, listRockBodyIds, updatePlacementRow } from "@/db/repositories/anchors";
import { findBoltInForce } from "@/db/repositories/bolts";
import { appendEvents } from "@/db/repositories/events";
import type { CommandContext } from "@/lib/commands/context";
import { onAnchor } from "@/lib/commands/writing/on-anchor";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { invalidField, notFound, refuseStale } from "@/lib/commands/writing/refusals";
import { before, by } from "@/lib/commands/writing/stamp";
import type { PlacementChange } from "@/lib/schemas/anchor";

/** Corrects the facts of a placement. */
export async function updatePlacement(
  ctx: CommandContext,
  { id, version, change }: { id: string; version: number; change: PlacementChange },
): Promise<{ id: string; version: number }> {
  const known = await findPlacement(ctx.db, id);
  return onAnchor(ctx, known?.anchorId ?? null, "anchor.edit", async ({ tx, anchor, person }) => {
    const placement = await findPlacement(tx, id);
    if (!placement || placement.struckAt) throw notFound();
    refuseStale(placement, version);
    if (change.rockBodyId && !(await listRockBodyIds(tx, anchor.id)).includes(change.rockBodyId)) {
      throw invalidField("rockBodyId", "This rock body is not one of this anchor's.");
    }
    if (change.kind && change.kind !== "bolt" && (await findBoltInForce(tx, id))) {
      throw invalidField("kind", "A bolt stands in it: take it out first.");
    }
    await updatePlacementRow(tx, id, change, by(person, ctx.now));
    await appendEvents(tx, ctx, [
      {
        areaId: anchor.areaId,
        anchorId: anchor.id,
        subjectType: "placement",
        subjectId: id,
        kind: "placement.changed",
        summary: `Placement ${placement.number}: changed ${Object.keys(change).join(", ")}`,
        before: before(placement, change),
        after: change,
      },
    ]);
    await reevaluate(tx, ctx, [anchor.id]);
    return { id, version: version + 1 };
  });
}
