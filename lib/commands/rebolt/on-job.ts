import "server-only";
import { inTransaction } from "@/db/client";
import { lockAnchor } from "@/db/repositories/anchors";
import { findJob, type JobRow, listAssignees } from "@/db/repositories/jobs";
import type { CommandContext } from "@/lib/commands/context";
import { authorize } from "@/lib/commands/writing/authorize";
import type { OnAnchor } from "@/lib/commands/writing/on-anchor";
import { notFound, refuseStale } from "@/lib/commands/writing/refusals";
import { audience } from "@/lib/policy/audience";
import { type Action, roleIn } from "@/lib/policy/can";

/** Which entry, and the version its editor last saw. */
export interface JobRef {
  id: string;
  version: number;
}

/**
 * One transaction on one entry of the queue, its anchor locked first. Outside its area an entry does not exist.
 * @throws AppError `not_found`, `not_signed_in`, `forbidden`, `stale_version`.
 */
export function onJob<T>(
  ctx: CommandContext,
  { id, version }: JobRef,
  action: Action,
  work: (on: OnAnchor & { job: JobRow; assignedTo: string[] }) => Promise<T>,
): Promise<T> {
  return inTransaction(ctx.db, async (tx) => {
    const known = await findJob(tx, id);
    const anchor = known ? await lockAnchor(tx, audience(ctx.actor), known.anchorId) : null;
    const job = anchor ? await findJob(tx, id) : null;
    const isInside = job !== null && (ctx.actor.kind === "visitor" || roleIn(ctx.actor, job.areaId) !== null);
    if (!anchor || !job || !isInside) throw notFound();
    const assignedTo = (await listAssignees(tx, id)).map((assignee) => assignee.userId);
    const person = authorize(ctx.actor, action, { areaId: job.areaId, assignedTo });
    refuseStale(job, version);
    return work({ tx, anchor, person, job, assignedTo });
  });
}
