import { z } from "zod";
import { id, number, oneOf } from "@/lib/schemas/fields";
import { METHODS } from "@/lib/domain/vocabulary";

/** A type somebody is about to place at an anchor, with what is known of it so far. */
export const choiceInput = z.strictObject({
  anchorId: id,
  boltTypeId: id,
  method: oneOf(METHODS).nullable().default(null),
  embedmentMm: number(0, 1000).nullable().default(null),
  leverMm: number(0, 500).nullable().default(null),
});
export type ChoiceInput = z.output<typeof choiceInput>;
