import "server-only";
import { updateAnchorRow } from "@/db/repositories/anchors";
import { appendEvents } from "@/db/repositories/events";
import type { CommandContext } from "@/lib/commands/context";
import { onAnchor } from "@/lib/commands/writing/on-anchor";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { refuseStale } from "@/lib/commands/writing/refusals";
import { seaDistanceColumns } from "@/lib/commands/writing/sea-distance";
import { before, by } from "@/lib/commands/writing/stamp";
import type { AnchorChange } from "@/lib/schemas/anchor";

/** Corrects the facts of an anchor. `version` is the one the editor last saw. */
export async function updateAnchor(
  ctx: CommandContext,
  { id, version, change }: { id: string; version: number; change: AnchorChange },
): Promise<{ id: string; version: number }> {
  return onAnchor(ctx, id, "anchor.edit", async ({ tx, anchor, person }) => {
    refuseStale(anchor.anchor, version);
    const sea = change.seaDistanceM === undefined ? {} : await seaDistanceColumns(tx, anchor.point, change);
    await updateAnchorRow(tx, id, { ...change, ...sea }, by(person, ctx.now));
    await appendEvents(tx, ctx, [
      {
        areaId: anchor.areaId,
        anchorId: id,
        subjectType: "anchor",
        subjectId: id,
        kind: "anchor.changed",
        summary: `Changed ${Object.keys(change).join(", ")}`,
        before: before(anchor.anchor, change),
        after: change,
      },
    ]);
    await reevaluate(tx, ctx, [id]);
    return { id, version: version + 1 };
  });
}
