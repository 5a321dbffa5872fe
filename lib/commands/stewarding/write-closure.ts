import "server-only";
import { inTransaction, type Tx } from "@/db/client";
import { listAnchorIds, lockAnchor } from "@/db/repositories/anchors";
import { appendEvents } from "@/db/repositories/events";
import { findArea, findClosure, insertClosure, lockSite } from "@/db/repositories/stewarding";
import type { CommandContext } from "@/lib/commands/context";
import { digestOf } from "@/lib/commands/digest";
import { authorize } from "@/lib/commands/writing/authorize";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { idTaken, invalidField, isReplay, notFound } from "@/lib/commands/writing/refusals";
import { createdBy } from "@/lib/commands/writing/stamp";
import { audience, isMember } from "@/lib/policy/audience";
import type { ClosureInput } from "@/lib/schemas/steward";
import type { Audience } from "@/lib/shared/audience";

/** Closes an area, one of its sites or one anchor, for a time, until lifted, or every year. */
export async function writeClosure(
  ctx: CommandContext,
  input: ClosureInput,
): Promise<{ id: string; replayed: boolean }> {
  const digest = digestOf(input);
  return inTransaction(ctx.db, async (tx) => {
    const who = audience(ctx.actor);
    const area = await findArea(tx, input.areaId);
    if (!area || (area.visibility === "members" && !isMember(who, area.id))) throw notFound();
    await checkTarget(tx, who, input);
    const person = authorize(ctx.actor, "closure.write", { areaId: input.areaId });
    if (isReplay(await findClosure(tx, input.id), digest)) return { id: input.id, replayed: true };
    if (!(await insertClosure(tx, { ...input, digest, ...createdBy(person, ctx.now) }))) throw idTaken();
    await appendEvents(tx, ctx, [
      {
        areaId: input.areaId,
        anchorId: input.anchorId,
        subjectType: "closure",
        subjectId: input.id,
        kind: "closure.written",
        summary: `Closed from ${input.startsOn}${input.endsOn ? ` to ${input.endsOn}` : ""}${input.yearly ? ", every year" : ""}`,
        after: input,
        reason: input.reason,
      },
    ]);
    await reevaluate(tx, ctx, await listAnchorIds(tx, input));
    return { id: input.id, replayed: false };
  });
}

/** Site and anchor have to lie in the area, and the anchor at the site. */
async function checkTarget(tx: Tx, who: Audience, { areaId, siteId, anchorId }: ClosureInput): Promise<void> {
  const site = siteId ? await lockSite(tx, who, siteId) : null;
  const anchor = anchorId ? await lockAnchor(tx, who, anchorId) : null;
  if ((siteId && !site) || (anchorId && !anchor)) throw notFound();
  if (site && site.areaId !== areaId) throw invalidField("siteId", "This site is not in this area.");
  if (anchor && anchor.areaId !== areaId) throw invalidField("anchorId", "This anchor is not in this area.");
  if (site && anchor && anchor.siteId !== site.id)
    throw invalidField("anchorId", "This anchor is not at this site.");
}
