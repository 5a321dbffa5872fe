import "server-only";
import { getDb } from "@/db/client";
import { listAreaRows, listClosureRows } from "@/db/repositories/area-read";
import { listWarningRows } from "@/db/repositories/warning-read";
import { listGivenUpMails } from "@/db/repositories/outbox-read";
import { audience, isMember } from "@/lib/policy/audience";
import { can } from "@/lib/policy/can";
import { closureViewOf } from "@/lib/queries/anchor-view";
import type { ClosureView } from "@/lib/schemas/views/anchor";
import type { BatchWarningView } from "@/lib/schemas/views/steward";
import type { Actor } from "@/lib/shared/actor";

/** Closures of the areas the actor may know of; a closure of a hidden site is for members. */
export async function listClosures(actor: Actor, withLifted = false): Promise<ClosureView[]> {
  const db = getDb();
  const who = audience(actor);
  const areas = await listAreaRows(db, who);
  const rows = await Promise.all(areas.map((area) => listClosureRows(db, { areaId: area.id, withLifted })));
  return rows
    .flat()
    .filter((row) => row.siteVisibility !== "members" || isMember(who, row.closure.areaId))
    .map(closureViewOf);
}

/** Warnings that hold where the actor may look, with how many bolts each hits there. */
export async function listBatchWarnings(actor: Actor): Promise<BatchWarningView[]> {
  const rows = await listWarningRows(getDb(), audience(actor));
  return rows.map(({ warning, typeName, adhesiveName, hits }) => ({
    id: warning.id,
    version: warning.version,
    areaId: warning.areaId,
    title: warning.title,
    body: warning.body,
    says: warning.says,
    typeName,
    adhesiveName,
    metal: warning.metal,
    batchPattern: warning.batchPattern,
    installedFrom: warning.installedFrom,
    installedTo: warning.installedTo,
    source: warning.source,
    publishedAt: warning.publishedAt?.toISOString() ?? null,
    closedAt: warning.closedAt?.toISOString() ?? null,
    hits,
  }));
}

export interface FailedMail {
  id: string;
  toEmail: string;
  subject: string;
  attempts: number;
  lastError: string | null;
  createdAt: string;
}

/** Mails the drain gave up on, in the areas the actor stewards. */
export async function listFailedMails(actor: Actor): Promise<FailedMail[]> {
  if (actor.kind === "visitor") return [];
  const areaIds = Object.keys(actor.roles).filter((areaId) => can(actor, "mail.view-failed", { areaId }));
  const rows = await listGivenUpMails(getDb(), actor.isAdmin ? "all" : areaIds);
  return rows.map(({ id, toEmail, subject, attempts, lastError, createdAt }) => ({
    id,
    toEmail,
    subject,
    attempts,
    lastError,
    createdAt: createdAt.toISOString(),
  }));
}
