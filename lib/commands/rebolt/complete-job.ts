import "server-only";
import type { Tx } from "@/db/client";
import { findBoltInForce } from "@/db/repositories/bolts";
import { appendEvents } from "@/db/repositories/events";
import { isPhotoOfJob, type JobRow, listJobPlacements, updateJobRow } from "@/db/repositories/jobs";
import { answerReports } from "@/db/repositories/reports";
import type { CommandContext } from "@/lib/commands/context";
import { dayAt } from "@/lib/commands/evaluation/evaluate-anchors";
import { takeOut } from "@/lib/commands/install/install-bolt";
import { installAll } from "@/lib/commands/log-install";
import { type JobRef, onJob } from "@/lib/commands/rebolt/on-job";
import type { OnAnchor } from "@/lib/commands/writing/on-anchor";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { invalidField } from "@/lib/commands/writing/refusals";
import { by } from "@/lib/commands/writing/stamp";
import { JOB_OUTCOME_LABELS } from "@/lib/domain/labels";
import { type JobOutcome, REPORT_KINDS, type ReportKind } from "@/lib/domain/vocabulary";
import type { CompleteJobInput } from "@/lib/schemas/rebolt";
import { AppError } from "@/lib/shared/errors";

/**
 * What each outcome answers at the job's placements. A new bolt answers for the hole it went into, and only
 * there (`installBolt`). A test answers nothing: somebody has to judge what it showed.
 */
const ANSWERS: Readonly<Record<JobOutcome, readonly ReportKind[]>> = {
  new_bolt: [],
  removed: REPORT_KINDS.filter((kind) => kind !== "rock"),
  tightened: ["nut_loose", "hanger_spins", "stud_turns"],
  link_swapped: ["wear"],
  tested: [],
};

/** Closes a job with its outcome, a photo, and what became of the hole when a bolt came out. */
export async function completeJob(
  ctx: CommandContext,
  ref: JobRef,
  input: CompleteJobInput,
): Promise<{ id: string; version: number; newBoltIds: string[] }> {
  return onJob(ctx, ref, "job.complete", async (on) => {
    const { tx, anchor, person, job } = on;
    if (job.state !== "accepted") throw new AppError("conflict", "Only an accepted job can be closed.");
    if (!(await isPhotoOfJob(tx, input.photoId, job.id))) {
      throw invalidField("photoId", "Add a photo of the finished work to this job first.");
    }
    const newBoltIds = await apply(ctx, on, job, input);
    await updateJobRow(
      tx,
      job.id,
      {
        state: "done",
        outcome: input.outcome,
        holeFate: input.holeFate,
        outcomeNote: input.note || null,
        outcomePhotoId: input.photoId,
        newBoltId: newBoltIds[0] ?? null,
        doneAt: ctx.now,
        doneBy: person.userId,
      },
      by(person, ctx.now),
    );
    await appendEvents(tx, ctx, [
      {
        areaId: job.areaId,
        anchorId: anchor.id,
        subjectType: "rebolt_job",
        subjectId: job.id,
        kind: "job.done",
        summary: `Rebolt done, ${JOB_OUTCOME_LABELS[input.outcome]}: ${job.title}`,
        after: { outcome: input.outcome, holeFate: input.holeFate, newBoltIds },
      },
    ]);
    await reevaluate(tx, ctx, [anchor.id]);
    return { id: job.id, version: ref.version + 1, newBoltIds };
  });
}

async function apply(
  ctx: CommandContext,
  on: OnAnchor,
  job: JobRow,
  { outcome, install, holeFate, note }: CompleteJobInput,
): Promise<string[]> {
  if (outcome !== "new_bolt" && install) throw invalidField("install", "Only a new bolt is installed.");
  if (outcome === "new_bolt" && !install) throw invalidField("install", "Say what was installed.");
  const placementIds = (await listJobPlacements(on.tx, [job.id])).map((row) => row.placementId);
  let tookOut = false;
  let newBoltIds: string[] = [];
  if (install) {
    const { done } = await installAll(ctx, on, install);
    tookOut = done.some((bolt) => bolt.replacedBoltId !== null);
    newBoltIds = done.map((bolt) => bolt.id);
  }
  if (outcome === "removed") tookOut = await removeAll(ctx, on, placementIds, note);
  if (tookOut && (holeFate === null || holeFate === "none")) {
    throw invalidField("holeFate", "A bolt came out: say what became of its hole.");
  }
  await answerAll(on.tx, placementIds, outcome, by(on.person, ctx.now));
  return newBoltIds;
}

async function removeAll(
  ctx: CommandContext,
  on: OnAnchor,
  placementIds: readonly string[],
  note: string,
): Promise<boolean> {
  let any = false;
  for (const placementId of placementIds) {
    const bolt = await findBoltInForce(on.tx, placementId);
    if (!bolt) continue;
    await takeOut(ctx, on, bolt, dayAt(ctx.now, on.anchor.timeZone), note || "Taken out");
    any = true;
  }
  return any;
}

async function answerAll(
  tx: Tx,
  placementIds: readonly string[],
  outcome: JobOutcome,
  who: { userId: string; now: Date },
): Promise<void> {
  const how = `Rebolt job done: ${JOB_OUTCOME_LABELS[outcome]}.`;
  for (const placementId of placementIds) {
    await answerReports(tx, { placementId, kinds: ANSWERS[outcome], how }, who);
  }
}
