import "server-only";
import { updateAnchorRow } from "@/db/repositories/anchors";
import { geodesicM } from "@/db/repositories/coast";
import { appendEvents } from "@/db/repositories/events";
import { remeasureSpans } from "@/db/repositories/spans";
import type { CommandContext } from "@/lib/commands/context";
import { onAnchor } from "@/lib/commands/writing/on-anchor";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { refuseStale } from "@/lib/commands/writing/refusals";
import { seaDistanceColumns } from "@/lib/commands/writing/sea-distance";
import { by } from "@/lib/commands/writing/stamp";
import type { MoveAnchorInput } from "@/lib/schemas/anchor";
import { formatDistanceM } from "@/lib/shared/format";

/**
 * Moves an anchor on the map, with a reason. Its distance to the sea (unless measured by hand) and the lengths
 * of its spans are computed again.
 */
export async function moveAnchor(
  ctx: CommandContext,
  { id, version, move }: { id: string; version: number; move: MoveAnchorInput },
): Promise<{ id: string; version: number }> {
  return onAnchor(ctx, id, "anchor.move", async ({ tx, anchor, person }) => {
    refuseStale(anchor.anchor, version);
    const sea = anchor.seaDistanceSource === "measured" ? {} : await seaDistanceColumns(tx, move.point, {});
    const pointErrorM = move.pointErrorM ?? null;
    await updateAnchorRow(tx, id, { point: move.point, pointErrorM, ...sea }, by(person, ctx.now));
    await remeasureSpans(tx, id);
    await appendEvents(tx, ctx, [
      {
        areaId: anchor.areaId,
        anchorId: id,
        subjectType: "anchor",
        subjectId: id,
        kind: "anchor.moved",
        summary: `Moved by ${formatDistanceM(await geodesicM(tx, anchor.point, move.point))}`,
        before: { point: anchor.point, pointErrorM: anchor.pointErrorM },
        after: { point: move.point, pointErrorM },
        reason: move.reason,
      },
    ]);
    await reevaluate(tx, ctx, [id]);
    return { id, version: version + 1 };
  });
}
