import { z } from "zod";
import { CONDITIONS, FORMS, RULE_CODES, USES, VERDICTS } from "@/lib/domain/vocabulary";

/** What URLs carry. Every number is finite and bounded; a malformed one is refused, never ignored. */
const number = (min: number, max: number) =>
  z
    .string()
    .regex(/^-?\d+(\.\d+)?$/, "A plain decimal number is wanted here.")
    .transform(Number)
    .pipe(z.number().min(min).max(max));

export const limit = number(1, 200).pipe(z.int()).default(50).meta({ description: "At most 200" });
export const cursor = z
  .string()
  .max(500)
  .optional()
  .meta({ description: "Value of `next` of the page before" });

const lon = z.number().min(-180).max(180);
const lat = z.number().min(-90).max(90);

/** `a,b,…` as numbers; anything else is refused. */
function numbers(text: string): unknown[] {
  return text.split(",").map((part) => (/^\s*-?\d+(\.\d+)?\s*$/.test(part) ? Number(part) : part));
}

export const bbox = z
  .string()
  .transform(numbers)
  .pipe(z.tuple([lon, lat, lon, lat]))
  .refine(([, south, , north]) => south <= north, "South lies above north.")
  .meta({ description: "west,south,east,north in degrees; west greater than east crosses the antimeridian" });

/** `lon,lat`. */
export const pointParam = z
  .string()
  .transform(numbers)
  .pipe(z.tuple([lon, lat]))
  .transform(([x, y]) => ({ lon: x, lat: y }));
const near = pointParam.meta({ description: "lon,lat: nearest first" });

/** One or several values, comma separated. */
const conditions = z
  .string()
  .transform((text) => text.split(","))
  .pipe(z.array(z.enum(CONDITIONS)).min(1));

/** Filters shared by the API, the map and the lists. */
export const anchorFilter = z.object({
  bbox: bbox.optional(),
  area: z.string().max(80).optional(),
  site: z.string().max(80).optional(),
  use: z.enum(USES).optional(),
  condition: conditions.optional(),
  verdict: z.enum(VERDICTS).optional(),
  finding: z.enum(RULE_CODES).optional(),
  metal: z.string().max(40).optional(),
  form: z.enum(FORMS).optional(),
  seaWithinM: number(0, 1_000_000).optional(),
  q: z.string().max(100).optional(),
  near: near.optional(),
});

export const anchorListQuery = anchorFilter.extend({ limit, cursor });

type AnchorFilterInput = z.output<typeof anchorFilter>;

/** The URL's short names as the queries call them. */
export function filterOf({ area, site, ...rest }: AnchorFilterInput) {
  return {
    ...rest,
    ...(area === undefined ? {} : { areaSlug: area }),
    ...(site === undefined ? {} : { siteSlug: site }),
  };
}

export const idParam = z.object({ id: z.uuid() });
export const slugParam = z.object({ slug: z.string().min(1).max(80) });

export const reportListQuery = z.object({
  state: z.enum(["open", "handled"]).optional(),
  area: z.string().max(80).optional(),
  mine: z.enum(["1"]).optional(),
  limit,
});

export const queueQuery = z.object({
  area: z.uuid().optional(),
  state: z.enum(["proposed", "accepted", "done", "turned_down"]).optional(),
  mine: z.enum(["1"]).optional(),
});

export const areaQuery = z.object({ area: z.string().max(80).optional() });
export const matrixQuery = z.object({ onDate: z.iso.date().optional() });
