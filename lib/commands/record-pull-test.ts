import "server-only";
import { findBolt, findPullTestDigest, insertPullTest } from "@/db/repositories/bolts";
import { appendEvents } from "@/db/repositories/events";
import type { CommandContext } from "@/lib/commands/context";
import { digestOf } from "@/lib/commands/digest";
import { dayAt } from "@/lib/commands/evaluation/evaluate-anchors";
import { onAnchor } from "@/lib/commands/writing/on-anchor";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { idTaken, invalidField, isReplay, notFound } from "@/lib/commands/writing/refusals";
import { createdBy } from "@/lib/commands/writing/stamp";
import type { PullTestInput } from "@/lib/schemas/bolt";
import { formatKn } from "@/lib/shared/format";

/** A measured pull on one bolt. A bend or a pull-out is filed as a report beside it. */
export async function recordPullTest(
  ctx: CommandContext,
  input: PullTestInput,
): Promise<{ id: string; replayed: boolean }> {
  const digest = digestOf(input);
  const known = await findBolt(ctx.db, input.boltId);
  return onAnchor(ctx, known?.anchorId ?? null, "pull-test.record", async ({ tx, anchor, person }) => {
    if (isReplay(await findPullTestDigest(tx, input.id), digest)) return { id: input.id, replayed: true };
    const stored = await findBolt(tx, input.boltId);
    if (!stored || stored.bolt.struckAt) throw notFound();
    if (input.testedOn > dayAt(ctx.now, anchor.timeZone)) {
      throw invalidField("testedOn", "This lies in the future.");
    }
    const row = { ...input, testedBy: input.testedBy ?? person.name, digest, ...createdBy(person, ctx.now) };
    if (!(await insertPullTest(tx, row))) throw idTaken();
    await appendEvents(tx, ctx, [
      {
        areaId: anchor.areaId,
        anchorId: anchor.id,
        subjectType: "bolt",
        subjectId: input.boltId,
        kind: "pull-test.recorded",
        summary: `Placement ${stored.placementNumber}: pulled ${input.direction} to ${formatKn(input.loadKn)}, ${input.mode.replace("_", " ")}`,
        after: input,
      },
    ]);
    await reevaluate(tx, ctx, [anchor.id]);
    return { id: input.id, replayed: false };
  });
}
