import { z } from "zod";

/**
 * The field kinds every input is made of. Numbers are finite and bounded, text is trimmed and limited, word
 * lists are closed. JSON is taken as it is: "12" is not a number here (forms go through `formInput`).
 */

export const id = z.uuid("This is not an id.");

export function text(max: number, min = 1) {
  return z
    .string("Text is wanted here.")
    .trim()
    .min(min, min === 1 ? "This is needed." : `At least ${min} characters.`)
    .max(max, `At most ${max} characters.`)
    .refine((value) => !/[^\P{Cc}\n\r\t]/u.test(value), "There is a character in it that cannot be kept.");
}

/** A note: may be empty. */
export function note(max = 2000) {
  return text(max, 0);
}

export function number(min: number, max: number) {
  const bounds = `A number from ${min} to ${max} is wanted here.`;
  return z.number(bounds).min(min, bounds).max(max, bounds);
}

export function whole(min: number, max: number) {
  const bounds = `A whole number from ${min} to ${max} is wanted here.`;
  return z.int(bounds).min(min, bounds).max(max, bounds);
}

export function oneOf<const T extends readonly [string, ...string[]]>(words: T) {
  return z.enum(words, `One of ${words.join(", ")} is wanted here.`);
}

export const yesNo = z.boolean("Yes or no is wanted here.");

/** `YYYY-MM-DD`, a day that exists. */
export const day = z.iso
  .date("A date like 2026-05-04 is wanted here.")
  .refine((value) => value >= "1900-01-01" && value <= "2200-12-31", "This date cannot be meant.");

/** UTC instant, ISO 8601. */
export const instant = z.iso
  .datetime({ offset: true, error: "A time like 2026-05-04T10:30:00Z is wanted here." })
  .transform((value) => new Date(value));

const geoJsonPoint = z.object({ type: z.literal("Point"), coordinates: z.tuple([z.unknown(), z.unknown()]) });

/** A point on WGS84: by name, or GeoJSON (longitude first) as the API answers it. */
export const lonLat = z
  .preprocess(
    (value) => {
      const point = geoJsonPoint.safeParse(value);
      return point.success ? { lon: point.data.coordinates[0], lat: point.data.coordinates[1] } : value;
    },
    z.strictObject({ lon: number(-180, 180), lat: number(-90, 90) }),
  )
  .meta({ id: "LonLat", description: "lon and lat, or a GeoJSON Point" });

/** EN number, titanium grade or plating; hyphens stay. */
export const metal = z
  .string("A metal like 1.4404, ti-2 or zinc-plated is wanted here.")
  .trim()
  .regex(
    /^(1\.\d{4}|ti-[1-5]|zinc-plated|hot-dip-galvanised)$/,
    "A metal like 1.4404, ti-2 or zinc-plated is wanted here.",
  );

export const lengthMm = number(0, 100_000);
/** Position on the face: either side of placement 1. */
export const positionMm = number(-100_000, 100_000);
export const azimuthDeg = number(0, 360);
export const elevationDeg = number(-90, 90);
export const tempC = number(-40, 60);
export const forceKn = number(0, 1000);
