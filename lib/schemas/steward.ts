import { z } from "zod";
import { day, id, lonLat, metal, note, number, oneOf, text, whole, yesNo } from "@/lib/schemas/fields";
import { formInput } from "@/lib/schemas/form-input";
import { AREA_VISIBILITIES, COASTS, SITE_VISIBILITIES, SO2_BANDS, WASHINGS } from "@/lib/domain/vocabulary";

export const batchWarningInput = z
  .strictObject({
    id,
    /** Null: holds in every area; for administrators. */
    areaId: id.nullable(),
    title: text(160),
    body: text(4000),
    says: oneOf(["stop", "inspect"]),
    boltTypeId: id.nullable().default(null),
    adhesiveId: id.nullable().default(null),
    metal: metal.nullable().default(null),
    batchPattern: text(80).nullable().default(null),
    installedFrom: day.nullable().default(null),
    installedTo: day.nullable().default(null),
    source: text(300).nullable().default(null),
  })
  .refine(
    ({ boltTypeId, adhesiveId, metal, batchPattern }) => boltTypeId ?? adhesiveId ?? metal ?? batchPattern,
    {
      path: ["boltTypeId"],
      message: "Say what it is about: a type, an adhesive, a metal or a batch.",
    },
  )
  .refine(
    ({ installedFrom, installedTo }) => !installedFrom || !installedTo || installedFrom <= installedTo,
    {
      path: ["installedTo"],
      message: "The end lies before the beginning.",
    },
  )
  .meta({ id: "NewBatchWarning" });
export type BatchWarningInput = z.output<typeof batchWarningInput>;

export const closeWarningInput = z.strictObject({ id, reason: text(500, 3) });
/** The record a form ends, in the version its reader saw. */
const version = whole(1, 1_000_000_000);
export const closeWarningForm = formInput(closeWarningInput.extend({ version }));
export type CloseWarningInput = z.output<typeof closeWarningInput>;

export const closureInput = z
  .strictObject({
    id,
    areaId: id,
    siteId: id.nullable().default(null),
    anchorId: id.nullable().default(null),
    reason: text(500),
    startsOn: day,
    endsOn: day.nullable().default(null),
    yearly: yesNo.default(false),
    source: text(300).nullable().default(null),
  })
  .refine(({ yearly, startsOn, endsOn }) => yearly || endsOn === null || startsOn <= endsOn, {
    path: ["endsOn"],
    message: "The last day lies before the first.",
  })
  .refine(({ yearly, endsOn }) => !yearly || endsOn !== null, {
    path: ["endsOn"],
    message: "A yearly season needs its last day.",
  })
  .meta({ id: "NewClosure" });
export type ClosureInput = z.output<typeof closureInput>;

export const liftClosureInput = z.strictObject({ id, reason: text(500, 3) });
export const liftClosureForm = formInput(liftClosureInput.extend({ version }));
export type LiftClosureInput = z.output<typeof liftClosureInput>;

/** Exactly one of anchor and site. */
export const watchInput = z
  .strictObject({ anchorId: id.optional(), siteId: id.optional(), on: yesNo })
  .refine(({ anchorId, siteId }) => (anchorId === undefined) !== (siteId === undefined), {
    path: ["anchorId"],
    message: "Name an anchor or a site.",
  });
export type WatchInput = z.output<typeof watchInput>;

const slug = text(60).regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, "Small letters, digits and hyphens.");

export const createAreaInput = z.strictObject({
  id,
  slug,
  name: text(120),
  summary: note().default(""),
  visibility: oneOf(AREA_VISIBILITIES).default("public"),
  coast: oneOf(COASTS).default("other"),
  so2: oneOf(SO2_BANDS).nullable().default(null),
  timeZone: text(60).refine(isTimeZone, "A time zone like Europe/Lisbon is wanted here.").default("UTC"),
  contactEmail: z.email("This is not an e-mail address.").nullable().default(null),
});
export type CreateAreaInput = z.output<typeof createAreaInput>;

const siteFacts = {
  name: text(120),
  visibility: oneOf(SITE_VISIBILITIES).optional(),
  summary: note().optional(),
  rockType: text(80).nullable().optional(),
  ucsMpa: number(0.1, 500).nullable().optional(),
  ucsBasis: text(160).nullable().optional(),
  washing: oneOf(WASHINGS).nullable().optional(),
  so2: oneOf(SO2_BANDS).nullable().optional(),
  saltedRoadDistanceM: number(0, 100_000).nullable().optional(),
  warmDry: yesNo.optional(),
  approach: note().nullable().optional(),
  landPermission: note().nullable().optional(),
  noBoltZones: note().nullable().optional(),
};

export const createSiteInput = z.strictObject({ id, areaId: id, slug, point: lonLat, ...siteFacts });
export type CreateSiteInput = z.output<typeof createSiteInput>;

export const siteChange = z.strictObject({ ...siteFacts, point: lonLat }).partial();
export type SiteChange = z.output<typeof siteChange>;

function isTimeZone(value: string): boolean {
  try {
    return new Intl.DateTimeFormat("en", { timeZone: value }).resolvedOptions().timeZone.length > 0;
  } catch {
    return false;
  }
}
