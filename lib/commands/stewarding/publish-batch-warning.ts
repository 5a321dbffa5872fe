import "server-only";
import { inTransaction } from "@/db/client";
import { listAnchorIds, listAnchorIdsWithHardware } from "@/db/repositories/anchors";
import { findAdhesive, findBoltType } from "@/db/repositories/bolts";
import { appendEvents } from "@/db/repositories/events";
import { listRecipients, type Recipient } from "@/db/repositories/recipients";
import { findArea, findWarning, insertWarning, listAnchorsWarned } from "@/db/repositories/stewarding";
import type { CommandContext } from "@/lib/commands/context";
import { digestOf } from "@/lib/commands/digest";
import { nudgeMail } from "@/lib/commands/mail-loop";
import { authorize } from "@/lib/commands/writing/authorize";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { idTaken, invalidField, isReplay, notFound } from "@/lib/commands/writing/refusals";
import { createdBy } from "@/lib/commands/writing/stamp";
import { writeTo } from "@/lib/commands/writing/write-to";
import { warningPublishedMail } from "@/lib/mail/templates/register";
import { audience, isMember } from "@/lib/policy/audience";
import type { BatchWarningInput } from "@/lib/schemas/steward";

/** Publishes a batch warning, judges what it may concern again, and writes to who looks after what it hits. */
export async function publishBatchWarning(
  ctx: CommandContext,
  input: BatchWarningInput,
): Promise<{ id: string; anchorsHit: number; replayed: boolean }> {
  const digest = digestOf(input);
  const done = await inTransaction(ctx.db, async (tx) => {
    const area = input.areaId ? await findArea(tx, input.areaId) : null;
    const isHidden = area?.visibility === "members" && !isMember(audience(ctx.actor), area.id);
    if (input.areaId && (!area || isHidden)) throw notFound();
    const person = authorize(ctx.actor, "warning.write", { areaId: input.areaId });
    if (isReplay(await findWarning(tx, input.id), digest)) {
      return { id: input.id, anchorsHit: (await listAnchorsWarned(tx, input.id)).length, replayed: true };
    }
    if (input.boltTypeId && !(await findBoltType(tx, input.boltTypeId))) {
      throw invalidField("boltTypeId", "There is no such type in the catalogue.");
    }
    if (input.adhesiveId && !(await findAdhesive(tx, input.adhesiveId))) {
      throw invalidField("adhesiveId", "There is no such adhesive.");
    }
    const row = { ...input, publishedAt: ctx.now, digest, ...createdBy(person, ctx.now) };
    if (!(await insertWarning(tx, row))) throw idTaken();
    await appendEvents(tx, ctx, [
      {
        areaId: input.areaId,
        subjectType: "batch_warning",
        subjectId: input.id,
        kind: "warning.published",
        summary: `Batch warning: ${input.title}`,
        after: input,
      },
    ]);
    const byHardware = input.boltTypeId ?? input.adhesiveId;
    await reevaluate(
      tx,
      ctx,
      byHardware ? await listAnchorIdsWithHardware(tx, input) : await listAnchorIds(tx, input),
    );

    const hit = await listAnchorsWarned(tx, input.id);
    const recipients = new Map<string, Recipient>();
    for (const anchorId of hit) {
      for (const one of await listRecipients(tx, anchorId)) recipients.set(one.userId, one);
    }
    const mail = warningPublishedMail({
      title: input.title,
      reason: input.body,
      anchorCount: hit.length,
      warningPath: "/batch-warnings",
    });
    const cause = { key: `warning:${input.id}`, areaId: input.areaId, now: ctx.now };
    await writeTo(tx, [...recipients.values()], mail, cause);
    return { id: input.id, anchorsHit: hit.length, replayed: false };
  });
  nudgeMail();
  return done;
}
