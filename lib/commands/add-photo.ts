import "server-only";
import { inTransaction, type Tx } from "@/db/client";
import { lockAnchor } from "@/db/repositories/anchors";
import { findBolt } from "@/db/repositories/bolts";
import { appendEvents } from "@/db/repositories/events";
import { findJob } from "@/db/repositories/jobs";
import { findPhotoRow, insertPhoto, type PhotoSubject } from "@/db/repositories/photos";
import { findReport } from "@/db/repositories/reports";
import type { CommandContext } from "@/lib/commands/context";
import { authorize, requirePerson } from "@/lib/commands/writing/authorize";
import { idTaken, notFound } from "@/lib/commands/writing/refusals";
import { createdBy } from "@/lib/commands/writing/stamp";
import { audience } from "@/lib/policy/audience";
import { roleIn } from "@/lib/policy/can";
import { AppError } from "@/lib/shared/errors";
import { photoStore } from "@/lib/storage/photo-store";
import { type PreparedPhoto, preparePhoto } from "@/lib/storage/prepare-photo";

export interface AddPhotoInput {
  id: string;
  caption: string;
  bytes: Uint8Array;
  /** Exactly one: what the photo shows. */
  to: { reportId: string } | { jobId: string } | { boltId: string };
}

export interface AddedPhoto {
  id: string;
  largeUrl: string;
  thumbUrl: string;
  widthPx: number;
  heightPx: number;
  replayed: boolean;
}

/**
 * Adds a photo to a report, a rebolt job or a bolt. Whether it may be added is asked before the work of
 * reading it. The files are written first and removed again when the row cannot be.
 */
export async function addPhoto(ctx: CommandContext, input: AddPhotoInput): Promise<AddedPhoto> {
  requirePerson(ctx.actor);
  await inTransaction(ctx.db, (tx) => subjectOf(tx, ctx, input.to));
  const photo = await preparePhoto(input.bytes);
  const stored = await findPhotoRow(ctx.db, input.id);
  if (stored) {
    if (stored.sha256 !== photo.sha256) throw idTaken();
    return answer(stored, true);
  }
  const files = Object.values(photo.files);
  const store = photoStore();
  try {
    for (const file of files) await store.put(file.key, file.bytes, file.contentType);
    return await inTransaction(ctx.db, (tx) => insert(tx, ctx, input, photo));
  } catch (error) {
    for (const file of files) await store.remove(file.key);
    throw error;
  }
}

async function insert(
  tx: Tx,
  ctx: CommandContext,
  input: AddPhotoInput,
  { sha256, widthPx, heightPx, files }: PreparedPhoto,
): Promise<AddedPhoto> {
  const { areaId, ...subject } = await subjectOf(tx, ctx, input.to);
  const row = {
    ...subject,
    id: input.id,
    caption: input.caption,
    sha256,
    widthPx,
    heightPx,
    originalKey: files.original.key,
    largeKey: files.large.key,
    thumbKey: files.thumb.key,
    ...createdBy(requirePerson(ctx.actor), ctx.now),
  };
  if (!(await insertPhoto(tx, row))) throw idTaken();
  await appendEvents(tx, ctx, [
    {
      areaId,
      anchorId: subject.anchorId,
      subjectType: "photo",
      subjectId: input.id,
      kind: "photo.added",
      summary: "Photo added",
      after: { reportId: subject.reportId, jobId: subject.jobId, boltId: subject.boltId },
    },
  ]);
  return answer(row, false);
}

/** What it is added to. A report takes photos of its writer and of members; jobs and bolts of members only. */
async function subjectOf(
  tx: Tx,
  ctx: CommandContext,
  to: AddPhotoInput["to"],
): Promise<PhotoSubject & { areaId: string | null }> {
  const none = { reportId: null, jobId: null, boltId: null, anchorId: null, areaId: null };
  const report = "reportId" in to ? await findReport(tx, to.reportId) : null;
  const job = "jobId" in to ? await findJob(tx, to.jobId) : null;
  const bolt = "boltId" in to ? await findBolt(tx, to.boltId) : null;
  const anchorId = report?.anchorId ?? job?.anchorId ?? bolt?.anchorId ?? null;
  const anchor = anchorId ? await lockAnchor(tx, audience(ctx.actor), anchorId) : null;
  if ((!report && !job && !bolt) || (anchorId && !anchor)) throw notFound();

  const areaId = anchor?.areaId ?? report?.areaId ?? null;
  const person = authorize(ctx.actor, "photo.add", { areaId });
  const isOwn = report?.createdBy === person.userId;
  const isMember = person.isAdmin || (areaId !== null && roleIn(person, areaId) !== null);
  if (!isOwn && !isMember)
    throw anchor
      ? new AppError("forbidden", "Only the writer and members of the area add photos here.")
      : notFound();
  return {
    ...none,
    areaId,
    anchorId,
    reportId: report?.id ?? null,
    jobId: job?.id ?? null,
    boltId: bolt?.bolt.id ?? report?.boltId ?? null,
  };
}

function answer(
  row: { id: string; largeKey: string; thumbKey: string; widthPx: number; heightPx: number },
  replayed: boolean,
): AddedPhoto {
  return {
    id: row.id,
    largeUrl: `/api/uploads/${row.largeKey}`,
    thumbUrl: `/api/uploads/${row.thumbKey}`,
    widthPx: row.widthPx,
    heightPx: row.heightPx,
    replayed,
  };
}
