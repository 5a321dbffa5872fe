import "server-only";
import { listPlacements } from "@/db/repositories/anchors";
import { findBoltInForce } from "@/db/repositories/bolts";
import { appendEvents } from "@/db/repositories/events";
import { addJobPlacements, findJob, insertJob } from "@/db/repositories/jobs";
import type { CommandContext } from "@/lib/commands/context";
import { digestOf } from "@/lib/commands/digest";
import { onAnchor } from "@/lib/commands/writing/on-anchor";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { idTaken, invalid, isReplay } from "@/lib/commands/writing/refusals";
import { createdBy } from "@/lib/commands/writing/stamp";
import type { OpenReboltJobInput } from "@/lib/schemas/rebolt";

/** A steward proposes a rebolt by hand. Its rank is computed like any other's. */
export async function openReboltJob(
  ctx: CommandContext,
  input: OpenReboltJobInput,
): Promise<{ id: string; replayed: boolean }> {
  const digest = digestOf(input);
  return onAnchor(ctx, input.anchorId, "job.open", async ({ tx, anchor, person }) => {
    if (isReplay(await findJob(tx, input.id), digest)) return { id: input.id, replayed: true };
    const own = (await listPlacements(tx, anchor.id)).filter((placement) => placement.struckAt === null);
    const problems = input.placementIds.flatMap((id, index) =>
      own.some((placement) => placement.id === id)
        ? []
        : [{ path: `placementIds.${index}`, message: "This placement is not one of this anchor's." }],
    );
    if (problems.length > 0) throw invalid(problems);

    const added = await insertJob(tx, {
      id: input.id,
      areaId: anchor.areaId,
      anchorId: anchor.id,
      title: input.title,
      dueOn: input.dueOn,
      waitingSince: ctx.now,
      digest,
      ...createdBy(person, ctx.now),
    });
    if (!added) throw idTaken();
    for (const placementId of new Set(input.placementIds)) {
      const bolt = await findBoltInForce(tx, placementId);
      await addJobPlacements(tx, [{ jobId: input.id, placementId, boltId: bolt?.id ?? null }]);
    }
    await appendEvents(tx, ctx, [
      {
        areaId: anchor.areaId,
        anchorId: anchor.id,
        subjectType: "rebolt_job",
        subjectId: input.id,
        kind: "job.opened",
        summary: `Rebolt proposed: ${input.title}`,
        after: { placementIds: input.placementIds, dueOn: input.dueOn },
      },
    ]);
    await reevaluate(tx, ctx, [anchor.id]);
    return { id: input.id, replayed: false };
  });
}
