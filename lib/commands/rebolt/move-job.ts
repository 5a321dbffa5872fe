import "server-only";
import { appendEvents } from "@/db/repositories/events";
import { updateJobRow } from "@/db/repositories/jobs";
import type { CommandContext } from "@/lib/commands/context";
import { type JobRef, onJob } from "@/lib/commands/rebolt/on-job";
import { by } from "@/lib/commands/writing/stamp";
import type { MoveJobInput } from "@/lib/schemas/rebolt";

/** Moves an entry up or down by points, with a reason. The computed rank stays visible; 0 points undoes it. */
export async function moveJob(
  ctx: CommandContext,
  ref: JobRef,
  { points, reason }: MoveJobInput,
): Promise<{ id: string; version: number }> {
  return onJob(ctx, ref, "job.decide", async ({ tx, anchor, person, job }) => {
    const moved =
      points === 0
        ? { movedBy: null, movedPoints: null, movedReason: null }
        : { movedBy: person.userId, movedPoints: points, movedReason: reason };
    await updateJobRow(tx, job.id, moved, by(person, ctx.now));
    await appendEvents(tx, ctx, [
      {
        areaId: job.areaId,
        anchorId: anchor.id,
        subjectType: "rebolt_job",
        subjectId: job.id,
        kind: "job.moved",
        summary: `Rebolt moved by ${points} points: ${job.title}`,
        before: { movedPoints: job.movedPoints },
        after: { movedPoints: moved.movedPoints },
        reason,
      },
    ]);
    return { id: job.id, version: ref.version + 1 };
  });
}
