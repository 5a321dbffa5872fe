import "server-only";
import { v7 } from "uuid";
import { inTransaction } from "@/db/client";
import { lockAnchor } from "@/db/repositories/anchors";
import { deleteWatch, insertWatch, lockSite } from "@/db/repositories/stewarding";
import type { CommandContext } from "@/lib/commands/context";
import { authorize } from "@/lib/commands/writing/authorize";
import { notFound } from "@/lib/commands/writing/refusals";
import { audience } from "@/lib/policy/audience";
import type { WatchInput } from "@/lib/schemas/steward";

/** Follows an anchor or a site, or stops to. Doing it twice is doing it once. */
export async function setWatch(
  ctx: CommandContext,
  {
    anchorId = null,
    siteId = null,
    on,
  }: { anchorId?: string | null; siteId?: string | null; on: WatchInput["on"] },
): Promise<{ on: boolean }> {
  return inTransaction(ctx.db, async (tx) => {
    const who = audience(ctx.actor);
    const anchor = anchorId ? await lockAnchor(tx, who, anchorId) : null;
    const site = siteId ? await lockSite(tx, who, siteId) : null;
    const areaId = anchor?.areaId ?? site?.areaId;
    if (areaId === undefined) throw notFound();
    const { userId } = authorize(ctx.actor, "watch.set", { areaId });
    if (on) await insertWatch(tx, { id: v7(), userId, anchorId, siteId, createdAt: ctx.now });
    else await deleteWatch(tx, { userId, anchorId, siteId });
    return { on };
  });
}
