import "server-only";
import { getDb } from "@/db/client";
import { boltsOfAnchor, listBoltRows, listFindingRows } from "@/db/repositories/anchor-read";
import { policyOf } from "@/db/repositories/area-read";
import {
  findPhoto,
  type JobRow,
  listHandChecks,
  listJobRows,
  listMembers,
} from "@/db/repositories/queue-read";
import { standsSince } from "@/lib/domain/condition/stands-since";
import type { JobState } from "@/lib/domain/vocabulary";
import { can, roleIn } from "@/lib/policy/can";
import { findingsView, photoViewOf } from "@/lib/queries/anchor-view";
import type { JobView, QueueEntry } from "@/lib/schemas/views/steward";
import type { Actor } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

export interface QueueFilter {
  areaId?: string;
  states?: readonly JobState[];
  /** Only what is given to the actor. */
  mine?: boolean;
}

/**
 * The rebolt queue of the areas where the actor may see one: highest priority first with what a steward added
 * or took away, ties by the longer wait. @throws AppError when there is no such area.
 */
export async function getReboltQueue(actor: Actor, filter: QueueFilter = {}): Promise<QueueEntry[]> {
  if (actor.kind === "visitor") throw new AppError("not_signed_in", "Sign in to see the rebolt queue.");
  const areaIds = areasWithQueue(actor, filter.areaId);
  if (areaIds?.length === 0) {
    throw new AppError("forbidden", "The rebolt queue is for bolters and stewards of an area.");
  }
  const states = filter.states ?? (["proposed", "accepted"] as const);
  const rows = await listJobRows(getDb(), { ...(areaIds ? { areaIds } : {}), states });
  const entries = ranked(rows).filter(
    (entry) => !filter.mine || entry.assignees.some((assignee) => assignee.userId === actor.userId),
  );
  return entries.toSorted(byRank);
}

/** Undefined: an administrator asks for everything. */
function areasWithQueue(actor: Exclude<Actor, { kind: "visitor" }>, areaId: string | undefined) {
  if (areaId !== undefined) return can(actor, "queue.view", { areaId }) ? [areaId] : [];
  if (actor.isAdmin && can(actor, "queue.view", { areaId: null })) return undefined;
  return Object.keys(actor.roles).filter((id) => can(actor, "queue.view", { areaId: id }));
}

function ranked(rows: readonly JobRow[]): QueueEntry[] {
  const byComputed = rows.toSorted(
    (a, b) => b.job.priority - a.job.priority || a.job.waitingSince.getTime() - b.job.waitingSince.getTime(),
  );
  return byComputed.map((row, index) => entryOf(row, index + 1));
}

function byRank(a: QueueEntry, b: QueueEntry): number {
  const points = (entry: QueueEntry) => entry.priority + (entry.movedPoints ?? 0);
  return points(b) - points(a) || a.waitingSince.localeCompare(b.waitingSince);
}

function entryOf(row: JobRow, computedRank: number): QueueEntry {
  const { job } = row;
  return {
    id: job.id,
    version: job.version,
    areaId: job.areaId,
    state: job.state,
    title: job.title,
    anchorId: job.anchorId,
    anchorCode: row.anchorCode,
    anchorLabel: row.anchorLabel,
    anchorCondition: row.anchorCondition,
    siteName: row.siteName,
    placementNumbers: row.placementNumbers,
    computedRank,
    priority: job.priority,
    parts: job.priorityParts,
    movedPoints: job.movedPoints,
    movedReason: job.movedReason,
    waitingSince: job.waitingSince.toISOString(),
    dueOn: job.dueOn,
    openedByReportId: job.openedByReportId,
    assignees: row.assignees,
    reasons: row.reasons,
    outcome: job.outcome,
    holeFate: job.holeFate,
    decidedReason: job.decidedReason,
    doneAt: job.doneAt?.toISOString() ?? null,
  };
}

/** One job with what stands between its anchor and being used again. @throws AppError `not_found`. */
export async function getJob(actor: Actor, id: string): Promise<JobView> {
  const db = getDb();
  const [row] = await listJobRows(db, { id });
  if (!row || roleIn(actor, row.job.areaId) === null) {
    throw new AppError("not_found", "There is no such job, or it is not shown to you.");
  }
  const { job } = row;
  if (!can(actor, "queue.view", { areaId: job.areaId })) {
    throw new AppError("forbidden", "The rebolt queue is for bolters and stewards of this area.");
  }
  const [bolts, checks, findingRows, members, policy, photo, queue] = await Promise.all([
    listBoltRows(db, boltsOfAnchor(job.anchorId)),
    listHandChecks(db, job.anchorId, row.anchorOutOfUseSince),
    listFindingRows(db, job.anchorId),
    listMembers(db, job.areaId),
    policyOf(db, job.areaId),
    job.outcomePhotoId ? findPhoto(db, job.outcomePhotoId) : null,
    listJobRows(db, { areaIds: [job.areaId], states: ["proposed", "accepted"] }),
  ]);
  const rank = ranked(queue).find((entry) => entry.id === id)?.computedRank ?? 0;
  return {
    ...entryOf(row, rank),
    outcomeNote: job.outcomeNote,
    outcomePhoto: photo ? photoViewOf(photo) : null,
    anchorOutOfUseSince: row.anchorOutOfUseSince?.toISOString() ?? null,
    bolts: checks.map((check) => {
      const bolt = bolts.find((one) => one.bolt.id === check.boltId);
      return {
        boltId: check.boltId,
        placementId: check.placementId,
        placementNumber: check.placementNumber,
        typeName: bolt?.type?.name ?? null,
        condition: check.condition,
        verdict: bolt?.evaluation?.verdict ?? null,
        inJob: row.placementNumbers.includes(check.placementNumber),
        carriedEvent: bolt !== undefined && stoodAt(bolt.bolt, row.anchorOutOfUseSince),
        handCheckedAt: check.handCheckedAt === null ? null : new Date(check.handCheckedAt).toISOString(),
        handCheckHasPhoto: check.handCheckHasPhoto,
      };
    }),
    findings: findingsView(findingRows),
    members: members.map(({ userId, name, role }) => ({ userId, name, role })),
    secondPersonForReturn: policy.secondPersonForReturn,
  };
}

function stoodAt(bolt: Parameters<typeof standsSince>[0], event: Date | null): boolean {
  if (event === null) return false;
  const stands = standsSince(bolt);
  return stands === null || stands <= event.toISOString();
}
