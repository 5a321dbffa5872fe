import "server-only";
import { inTransaction } from "@/db/client";
import { listAnchorIds } from "@/db/repositories/anchors";
import { appendEvents } from "@/db/repositories/events";
import { lockSite, updateSiteRow } from "@/db/repositories/stewarding";
import type { CommandContext } from "@/lib/commands/context";
import { authorize } from "@/lib/commands/writing/authorize";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { notFound, refuseStale } from "@/lib/commands/writing/refusals";
import { before, by } from "@/lib/commands/writing/stamp";
import { audience } from "@/lib/policy/audience";
import type { SiteChange } from "@/lib/schemas/steward";

/** Changes what is known of a site; its rock and washing decide verdicts, so all its anchors are judged again. */
export async function updateSite(
  ctx: CommandContext,
  { id, version, change }: { id: string; version: number; change: SiteChange },
): Promise<{ id: string; version: number }> {
  return inTransaction(ctx.db, async (tx) => {
    const site = await lockSite(tx, audience(ctx.actor), id);
    if (!site) throw notFound();
    const person = authorize(ctx.actor, "site.edit", { areaId: site.areaId });
    refuseStale(site, version);
    await updateSiteRow(tx, id, change, by(person, ctx.now));
    await appendEvents(tx, ctx, [
      {
        areaId: site.areaId,
        subjectType: "site",
        subjectId: id,
        kind: "site.changed",
        summary: `${site.name}: changed ${Object.keys(change).join(", ")}`,
        before: before(site, change),
        after: change,
      },
    ]);
    await reevaluate(tx, ctx, await listAnchorIds(tx, { siteId: id }));
    return { id, version: version + 1 };
  });
}
