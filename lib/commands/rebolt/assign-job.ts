import "server-only";
import { appendEvents } from "@/db/repositories/events";
import { listWorkers, replaceAssignees, updateJobRow } from "@/db/repositories/jobs";
import type { CommandContext } from "@/lib/commands/context";
import { nudgeMail } from "@/lib/commands/mail-loop";
import { type JobRef, onJob } from "@/lib/commands/rebolt/on-job";
import { invalid } from "@/lib/commands/writing/refusals";
import { by } from "@/lib/commands/writing/stamp";
import { writeTo } from "@/lib/commands/writing/write-to";
import { jobAssignedMail } from "@/lib/mail/templates/register";
import type { AssignJobInput } from "@/lib/schemas/rebolt";
import { AppError } from "@/lib/shared/errors";

/** Gives an accepted job to one or several bolters or stewards of the area; an empty list takes it back. */
export async function assignJob(
  ctx: CommandContext,
  ref: JobRef,
  input: AssignJobInput,
): Promise<{ id: string; version: number }> {
  const done = await onJob(ctx, ref, "job.assign", async ({ tx, anchor, person, job, assignedTo }) => {
    if (job.state !== "accepted")
      throw new AppError("conflict", "Only an accepted job can be given to somebody.");
    const userIds = [...new Set(input.userIds)];
    const workers = await listWorkers(tx, job.areaId, userIds);
    const problems = userIds.flatMap((userId, index) =>
      workers.some((worker) => worker.userId === userId)
        ? []
        : [
            {
              path: `userIds.${index}`,
              message: "Only bolters and stewards of this area can be given a job.",
            },
          ],
    );
    if (problems.length > 0) throw invalid(problems);
    await replaceAssignees(tx, job.id, userIds, ctx.now);
    await updateJobRow(tx, job.id, {}, by(person, ctx.now));
    await appendEvents(tx, ctx, [
      {
        areaId: job.areaId,
        anchorId: anchor.id,
        subjectType: "rebolt_job",
        subjectId: job.id,
        kind: "job.assigned",
        summary: `Rebolt given to ${workers.map((worker) => worker.name).join(", ") || "nobody"}: ${job.title}`,
        before: { userIds: assignedTo },
        after: { userIds },
      },
    ]);
    const fresh = workers.filter((worker) => !assignedTo.includes(worker.userId));
    const mail = jobAssignedMail({
      anchorLabel: anchor.label,
      siteName: anchor.siteName,
      jobPath: `/queue/${job.id}`,
      dueOn: job.dueOn,
    });
    const cause = { key: `job-assigned:${job.id}:${job.version}`, areaId: job.areaId, now: ctx.now };
    await writeTo(tx, fresh, mail, cause);
    return { id: job.id, version: ref.version + 1 };
  });
  nudgeMail();
  return done;
}
