import { z } from "zod";
import { logInstallSeriesInput } from "@/lib/schemas/bolt";
import { day, id, number, oneOf, text } from "@/lib/schemas/fields";
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
