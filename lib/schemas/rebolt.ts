import { z } from "zod";
import { logInstallSeriesInput } from "@/lib/schemas/bolt";
import { day, id, number, oneOf, text, whole } from "@/lib/schemas/fields";
import { formInput } from "@/lib/schemas/form-input";
import { spreadCommon } from "@/lib/schemas/series";
import { HOLE_FATES, JOB_OUTCOMES } from "@/lib/domain/vocabulary";

export const openReboltJobInput = z
  .strictObject({
    id,
    anchorId: id,
    placementIds: z.array(id).min(1, "Name at least one placement.").max(60),
    title: text(160),
    dueOn: day.nullable().default(null),
  })
  .meta({ id: "NewReboltJob" });
export type OpenReboltJobInput = z.output<typeof openReboltJobInput>;

const decide = z.strictObject({
  action: z.literal("decide"),
  decision: oneOf(["accepted", "turned_down"]),
  reason: text(1000).optional(),
  dueOn: day.nullable().optional(),
});
const assign = z.strictObject({ action: z.literal("assign"), userIds: z.array(id).max(20) });
const move = z.strictObject({ action: z.literal("move"), points: number(-100, 100), reason: text(500, 3) });
const complete = z.strictObject({
  action: z.literal("complete"),
  outcome: oneOf(JOB_OUTCOMES),
  /** What became of the hole, when a bolt was taken out. */
  holeFate: oneOf(HOLE_FATES).nullable().default(null),
  note: text(2000, 0).default(""),
  /** Added before with the job as its subject. */
  photoId: id,
  /** For `new_bolt`: what was installed, as for logging an install. */
  install: logInstallSeriesInput.shape.bolts.optional(),
});

/** What may be done with an entry of the queue. */
export const jobAction = z
  .discriminatedUnion(
    "action",
    [decide, assign, move, complete],
    "One of decide, assign, move, complete is wanted here.",
  )
  .meta({ id: "ReboltJobAction" });
export type JobActionInput = z.output<typeof jobAction>;
export type DecideJobInput = z.output<typeof decide>;
export type AssignJobInput = z.output<typeof assign>;
export type MoveJobInput = z.output<typeof move>;
export type CompleteJobInput = z.output<typeof complete>;

/** The entry a form is about, in the version its reader saw. What it does is decided by where it is sent. */
const ref = { id, version: whole(1, 1_000_000_000) };
/** Nothing ticked sends nothing: it is refused in the words of a list that is empty. */
export const openReboltJobForm = formInput(
  openReboltJobInput.extend({ placementIds: openReboltJobInput.shape.placementIds.prefault([]) }),
);
export const decideJobForm = formInput(decide.omit({ action: true }).extend(ref));
export const moveJobForm = formInput(move.omit({ action: true }).extend(ref));
/** Nobody ticked sends nothing: the job is taken back. */
export const assignJobForm = formInput(
  assign.omit({ action: true }).extend({ ...ref, userIds: assign.shape.userIds.default([]) }),
);
/** What was installed comes as from the series form, under `common` and `bolts`. */
export const completeJobForm = z.preprocess(
  (value) => {
    const { bolts, ...rest } = spreadCommon(value);
    return bolts.length > 0 ? { ...rest, install: bolts } : rest;
  },
  formInput(complete.omit({ action: true }).extend(ref)),
);

/** Which part of the queue a page shows; anything else is what is to be done. */
export const QUEUE_SHOWS = ["open", "mine", "done", "turned_down"] as const;
export const queueShow = z.enum(QUEUE_SHOWS).catch("open");
export type QueueShow = z.output<typeof queueShow>;
