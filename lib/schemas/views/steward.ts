import { z } from "zod";
import { HOLE_FATES, JOB_OUTCOMES, JOB_STATES } from "@/lib/domain/vocabulary";
import { photoView, sheetFindingView } from "@/lib/schemas/views/anchor";
import { conditionView, dateView, instantView, verdictView } from "@/lib/schemas/views/common";

const quantity = z.number().nullable();
const words = z.string().nullable();

export const priorityPartView = z.object({
  key: z.string(),
  label: z.string(),
  points: z.number(),
  max: z.number(),
  why: z.string(),
});

export const queueEntryView = z
  .object({
    id: z.string(),
    version: z.number(),
    areaId: z.string(),
    state: z.enum(JOB_STATES),
    title: z.string(),
    anchorId: z.string(),
    anchorCode: z.string(),
    anchorLabel: z.string(),
    anchorCondition: conditionView,
    siteName: z.string(),
    placementNumbers: z.array(z.number()),
    /** Place by the computed priority alone, 1 = first. */
    computedRank: z.number(),
    priority: z.number(),
    parts: z.array(priorityPartView),
    movedPoints: quantity,
    movedReason: words,
    waitingSince: instantView,
    dueOn: dateView.nullable(),
    openedByReportId: words,
    assignees: z.array(z.object({ userId: z.string(), name: z.string() })),
    reasons: z.array(z.object({ level: z.string(), title: z.string() })),
    outcome: z.enum(JOB_OUTCOMES).nullable(),
    holeFate: z.enum(HOLE_FATES).nullable(),
    decidedReason: words,
    doneAt: instantView.nullable(),
  })
  .meta({ id: "ReboltJob" });
export type QueueEntry = z.infer<typeof queueEntryView>;

/** A bolt of the job's anchor, with what stands between it and being put back in service. */
export const jobBoltView = z.object({
  boltId: z.string(),
  placementId: z.string(),
  placementNumber: z.number(),
  typeName: words,
  condition: conditionView,
  verdict: verdictView.nullable(),
  inJob: z.boolean(),
  /** It stood there when the anchor was taken out of use: it is checked by hand before the anchor comes back. */
  carriedEvent: z.boolean(),
  /** Hand-checked and found sound after the event, with a photo. */
  handCheckedAt: instantView.nullable(),
  handCheckHasPhoto: z.boolean(),
});

export const jobView = queueEntryView
  .extend({
    outcomeNote: words,
    outcomePhoto: photoView.nullable(),
    anchorOutOfUseSince: instantView.nullable(),
    bolts: z.array(jobBoltView),
    findings: z.array(sheetFindingView),
    members: z.array(z.object({ userId: z.string(), name: z.string(), role: z.string() })),
    secondPersonForReturn: z.boolean(),
  })
  .meta({ id: "ReboltJobDetail" });
export type JobView = z.infer<typeof jobView>;

export const batchWarningView = z
  .object({
    id: z.string(),
    version: z.number(),
    areaId: words,
    title: z.string(),
    body: z.string(),
    says: z.enum(["stop", "inspect"]),
    typeName: words,
    adhesiveName: words,
    metal: words,
    batchPattern: words,
    installedFrom: dateView.nullable(),
    installedTo: dateView.nullable(),
    source: words,
    publishedAt: instantView.nullable(),
    closedAt: instantView.nullable(),
    /** Bolts it is found against now, in what the audience may see. */
    hits: z.number(),
  })
  .meta({ id: "BatchWarning" });
export type BatchWarningView = z.infer<typeof batchWarningView>;
