import "server-only";
import { appendEvents } from "@/db/repositories/events";
import { updateJobRow } from "@/db/repositories/jobs";
import type { CommandContext } from "@/lib/commands/context";
import { type JobRef, onJob } from "@/lib/commands/rebolt/on-job";
import { invalidField } from "@/lib/commands/writing/refusals";
import { by } from "@/lib/commands/writing/stamp";
import type { DecideJobInput } from "@/lib/schemas/rebolt";
import { AppError } from "@/lib/shared/errors";

/** Accepts an entry of the queue, or turns it down with a reason. The reports behind it stay open. */
export async function decideJob(
  ctx: CommandContext,
  ref: JobRef,
  { decision, reason, dueOn }: DecideJobInput,
): Promise<{ id: string; version: number }> {
  return onJob(ctx, ref, "job.decide", async ({ tx, anchor, person, job }) => {
    if (job.state === "done") throw new AppError("conflict", "This job is done already.");
    if (decision === "turned_down" && !reason) throw invalidField("reason", "Say why it is turned down.");
    await updateJobRow(
      tx,
      job.id,
      {
        state: decision,
        decidedReason: reason ?? null,
        decidedBy: person.userId,
        decidedAt: ctx.now,
        dueOn: dueOn === undefined ? job.dueOn : dueOn,
      },
      by(person, ctx.now),
    );
    await appendEvents(tx, ctx, [
      {
        areaId: job.areaId,
        anchorId: anchor.id,
        subjectType: "rebolt_job",
        subjectId: job.id,
        kind: `job.${decision.replace("_", "-")}`,
        summary: `Rebolt ${decision === "accepted" ? "accepted" : "turned down"}: ${job.title}`,
        before: { state: job.state },
        after: { state: decision },
        reason: reason ?? null,
      },
    ]);
    return { id: job.id, version: ref.version + 1 };
  });
}
