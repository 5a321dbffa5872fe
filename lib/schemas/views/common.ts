import { z } from "zod";
import {
  CONDITIONS,
  DATE_PRECISIONS,
  FORMS,
  LEVELS,
  METHODS,
  ONSET_BASES,
  RULE_CODES,
  SOURCE_MARKS,
  USES,
  VERDICTS,
} from "@/lib/domain/vocabulary";

/** Shared pieces of what the API answers. `null` means not known, or not shown to this audience. */
export const pointView = z
  .object({ type: z.literal("Point"), coordinates: z.tuple([z.number(), z.number()]) })
  .meta({ description: "GeoJSON, WGS84, longitude first" });

export const useView = z.enum(USES);
export const conditionView = z.enum(CONDITIONS);
export const verdictView = z.enum(VERDICTS);
export const levelView = z.enum(LEVELS);
export const codeView = z.enum(RULE_CODES);
export const formView = z.enum(FORMS);
export const methodView = z.enum(METHODS);
export const basisView = z.enum(ONSET_BASES);
export const precisionView = z.enum(DATE_PRECISIONS);
export const dateView = z.string().meta({ description: "YYYY-MM-DD" });
export const instantView = z.string().meta({ description: "ISO 8601, UTC" });

export const findingView = z
  .object({
    code: codeView,
    level: levelView,
    title: z.string(),
    /** Empty where the place must not be given away. */
    text: z.string(),
    clearsWhen: z.string().nullable(),
    numbers: z.record(z.string(), z.union([z.number(), z.string(), z.boolean(), z.null()])),
    assumed: z.array(z.string()),
    source: z.object({ mark: z.enum(SOURCE_MARKS), name: z.string() }),
  })
  .meta({ id: "Finding", description: "One reason inside a verdict" });

export type FindingView = z.infer<typeof findingView>;

export const placeClassView = z
  .object({ f1: z.number(), f2: z.number(), f3: z.number(), crf: z.number(), crc: z.string() })
  .meta({ id: "PlaceClass", description: "EN 1993-1-4 Annex A: CRF = F1 + F2 + F3 and its class" });

export type PlaceClassView = z.infer<typeof placeClassView>;

/** A page of a list. */
export function listOf<T extends z.ZodType>(item: T) {
  return z.object({ items: z.array(item), next: z.string().nullable() });
}
