import { z } from "zod";
import { id, instant, lonLat, note, oneOf, text, whole, yesNo } from "@/lib/schemas/fields";
import { formInput } from "@/lib/schemas/form-input";
import { CONDITIONS, DEPTHS, REPORT_KINDS } from "@/lib/domain/vocabulary";

/** What was seen. The measurements that fit the kind are checked by the command, which names each that does not. */
export const fileReportInput = z
  .strictObject({
    id,
    /** Of the area it lies in; found by the anchor or the point when left out. */
    siteId: id.optional(),
    anchorId: id.optional(),
    placementId: id.optional(),
    boltId: id.optional(),
    fittingId: id.optional(),
    spanId: id.optional(),
    /** Where, when nothing is registered there yet. */
    point: lonLat.optional(),
    kind: oneOf(REPORT_KINDS),
    depth: oneOf(DEPTHS).default("seen"),
    observedAt: instant,
    measured: z
      .record(
        z.string().max(40),
        z.union(
          [z.number(), z.string().max(200), z.boolean(), z.null()],
          "A number, a word, yes or no is wanted here.",
        ),
      )
      .refine((value) => Object.keys(value).length <= 20, "Too many measurements.")
      .default({}),
    grade: whole(0, 4).nullable().default(null),
    note: note(4000).default(""),
    /** The code on the anchor's tag: lets somebody without an account report; it waits to be confirmed. */
    tagCode: text(40).optional(),
    reporterName: text(120).optional(),
  })
  .meta({ id: "NewReport" });
export type FileReportInput = z.output<typeof fileReportInput>;

/** A steward's answer. `found_wrong` strikes the report through; it stays in history. */
export const handleReportInput = z
  .strictObject({
    answer: oneOf(["handled", "found_wrong", "confirmed"]),
    how: text(1000, 3),
    /** Puts on record that salt cracked this metal here: it stops the grade at the whole site. */
    stressCorrosionConfirmed: yesNo.optional(),
  })
  .meta({ id: "ReportAnswer" });
export type HandleReportInput = z.output<typeof handleReportInput>;

/** A check by hand of one bolt that found nothing. */
export const handCheckInput = z.strictObject({
  id,
  anchorId: id,
  placementId: id,
  depth: oneOf(["handled", "torqued", "pulled"]).default("handled"),
  observedAt: instant,
  note: note(2000).default(""),
});
export type HandCheckInput = z.output<typeof handCheckInput>;

export const returnToServiceInput = z.strictObject({
  anchorId: id,
  reason: text(1000, 3),
});
export type ReturnToServiceInput = z.output<typeof returnToServiceInput>;

/** A condition set by hand, for an anchor or one of its bolts; null goes back to what the evidence says. */
export const decideConditionInput = z.strictObject({
  anchorId: id,
  boltId: id.optional(),
  condition: oneOf(CONDITIONS).nullable(),
  reason: text(1000, 3),
});
export type DecideConditionInput = z.output<typeof decideConditionInput>;

/** The answer as the form sends it, with the report it is about in the version its reader saw. */
export const handleReportForm = formInput(handleReportInput.extend({ id, version: whole(1, 1_000_000_000) }));
