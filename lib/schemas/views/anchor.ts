import { z } from "zod";
import {
  ATTACHMENTS,
  FITTING_KINDS,
  JOB_STATES,
  PLACEMENT_KINDS,
  PLACEMENT_ROLES,
  REPORT_KINDS,
  REPORT_STATES,
  RIGGINGS,
  SHARPNESSES,
  SIDES,
  SITE_VISIBILITIES,
  WASHINGS,
} from "@/lib/domain/vocabulary";
import { boltView } from "@/lib/schemas/views/bolt";
import {
  codeView,
  conditionView,
  dateView,
  findingView,
  formView,
  instantView,
  levelView,
  placeClassView,
  pointView,
  useView,
  verdictView,
} from "@/lib/schemas/views/common";

const quantity = z.number().nullable();
const words = z.string().nullable();

/** A row of lists and map panels. */
export const anchorSummaryView = z
  .object({
    id: z.string(),
    code: z.string(),
    label: z.string(),
    areaSlug: z.string(),
    siteSlug: z.string(),
    siteName: z.string(),
    uses: z.array(useView),
    rowName: words,
    condition: conditionView,
    verdict: verdictView.nullable(),
    utilisation: quantity,
    point: pointView,
    /** False: the site is sensitive and the point is rounded to about 1 km. */
    exact: z.boolean(),
    seaDistanceM: quantity,
    boltCount: z.number(),
    /** How the bolts in force are fixed and what they are made of, each pair once; natural placements have none. */
    hardware: z.array(z.object({ form: formView, metal: words })),
    openReports: z.number(),
    lastCheckOn: dateView.nullable(),
    reasons: z.array(z.object({ code: codeView, level: levelView, title: z.string() })),
  })
  .meta({ id: "AnchorSummary" });

export type AnchorSummary = z.infer<typeof anchorSummaryView>;

export const placementView = z
  .object({
    id: z.string(),
    version: z.number(),
    number: z.number(),
    kind: z.enum(PLACEMENT_KINDS),
    role: z.enum(PLACEMENT_ROLES),
    xMm: quantity,
    yMm: quantity,
    zMm: quantity,
    faceAzimuthDeg: quantity,
    faceDipDeg: quantity,
    overhang: z.boolean().nullable(),
    holeDiameterMm: quantity,
    holeDepthMm: quantity,
    axisAzimuthDeg: quantity,
    axisElevationDeg: quantity,
    edgeDistanceMm: quantity,
    edgeSide: z.enum(SIDES).nullable(),
    deadHoles: z.array(z.object({ xMm: z.number(), yMm: z.number() })),
    rockBodyId: words,
    sizeMm: quantity,
    note: words,
    /** The bolt in force; null: natural placement, or an empty hole. */
    bolt: boltView.nullable(),
    /** Its predecessors, newest first. */
    former: z.array(boltView),
  })
  .meta({ id: "Placement" });

export type PlacementView = z.infer<typeof placementView>;

export const sheetFindingView = findingView.extend({
  /** Key in the drawing, 1 upward, worst first; shared by findings that say the same of several bolts. */
  number: z.number(),
  boltId: words,
  fittingId: words,
  placementNumber: quantity,
  uses: z.array(useView),
});

export type SheetFinding = z.infer<typeof sheetFindingView>;

export const photoView = z.object({
  id: z.string(),
  largeUrl: z.string(),
  thumbUrl: z.string(),
  widthPx: z.number(),
  heightPx: z.number(),
  caption: z.string(),
});
export type PhotoView = z.infer<typeof photoView>;

export const sheetReportView = z.object({
  id: z.string(),
  kind: z.enum(REPORT_KINDS),
  depth: z.string(),
  placementNumber: quantity,
  observedAt: instantView,
  grade: quantity,
  note: z.string(),
  foundSound: z.boolean(),
  tookOutOfUse: z.boolean(),
  confirmed: z.boolean(),
  state: z.enum(REPORT_STATES),
  handledAt: instantView.nullable(),
  handledHow: words,
  reporterName: words,
  photos: z.array(photoView),
});
export type SheetReport = z.infer<typeof sheetReportView>;

export const closureView = z
  .object({
    id: z.string(),
    version: z.number(),
    areaId: z.string(),
    scope: z.enum(["area", "site", "anchor"]),
    scopeName: z.string(),
    reason: z.string(),
    startsOn: dateView,
    endsOn: dateView.nullable(),
    yearly: z.boolean(),
    source: words,
    liftedAt: instantView.nullable(),
  })
  .meta({ id: "Closure" });
export type ClosureView = z.infer<typeof closureView>;

/** One line of the revision table. */
export const revisionView = z.object({
  letter: z.string(),
  at: instantView,
  by: z.string(),
  summary: z.string(),
  reason: words,
});
export type RevisionView = z.infer<typeof revisionView>;

export const anchorSheetView = z
  .object({
    id: z.string(),
    version: z.number(),
    code: z.string(),
    label: z.string(),
    area: z.object({ id: z.string(), slug: z.string(), name: z.string(), timeZone: z.string() }),
    site: z.object({
      id: z.string(),
      slug: z.string(),
      name: z.string(),
      visibility: z.enum(SITE_VISIBILITIES),
      rockType: words,
      ucsMpa: quantity,
      ucsBasis: words,
    }),
    uses: z.array(useView),
    point: pointView,
    exact: z.boolean(),
    pointErrorM: quantity,
    elevationM: quantity,
    designAzimuthDeg: quantity,
    designElevationDeg: quantity,
    faceAzimuthDeg: quantity,
    faceDipDeg: quantity,
    rigging: z
      .object({
        kind: z.enum(RIGGINGS),
        legLengthsM: z.array(quantity),
        backupSlackM: quantity,
        note: words,
      })
      .nullable(),
    masterpoint: z.object({ xMm: z.number(), yMm: z.number(), zMm: z.number() }).nullable(),
    washing: z.enum(WASHINGS).nullable(),
    /** Whether the anchor has a value of its own, or follows its site. */
    washingFrom: z.enum(["anchor", "site"]),
    sea: z
      .object({
        distanceM: z.number(),
        source: z.enum(["coast", "measured"]),
        errorM: z.number(),
        note: words,
      })
      .nullable(),
    rowName: words,
    rowLengthM: quantity,
    note: words,
    condition: conditionView,
    derivedCondition: conditionView,
    decided: z.object({ condition: conditionView, reason: z.string(), at: instantView }).nullable(),
    outOfUseSince: instantView.nullable(),
    verdict: verdictView.nullable(),
    utilisation: quantity,
    helpMost: words,
    placeClass: placeClassView.nullable(),
    engineVersion: words,
    policyVersion: quantity,
    placements: z.array(placementView),
    fittings: z.array(
      z.object({
        id: z.string(),
        version: z.number(),
        placementNumber: quantity,
        kind: z.enum(FITTING_KINDS),
        metal: words,
        diameterMm: quantity,
        diameterLeftMm: quantity,
        replaceable: z.boolean(),
        installedOn: dateView.nullable(),
        note: words,
      }),
    ),
    edges: z.array(
      z.object({
        id: z.string(),
        version: z.number(),
        label: z.string(),
        sharpness: z.enum(SHARPNESSES),
        paddingNeeded: z.boolean(),
        secured: words,
        x1Mm: quantity,
        y1Mm: quantity,
        x2Mm: quantity,
        y2Mm: quantity,
      }),
    ),
    rockBodies: z.array(
      z.object({
        id: z.string(),
        version: z.number(),
        label: z.string(),
        attachment: z.enum(ATTACHMENTS),
        lengthM: quantity,
        widthM: quantity,
        heightM: quantity,
        note: words,
      }),
    ),
    findings: z.array(sheetFindingView),
    reports: z.array(sheetReportView),
    spans: z.array(
      z.object({
        id: z.string(),
        name: z.string(),
        lengthM: quantity,
        otherCode: words,
        otherLabel: words,
        otherCondition: conditionView.nullable(),
      }),
    ),
    closures: z.array(closureView),
    jobs: z.array(
      z.object({ id: z.string(), title: z.string(), state: z.enum(JOB_STATES), priority: z.number() }),
    ),
    revisions: z.array(revisionView),
    lastCheckOn: dateView.nullable(),
    nextCheckDueOn: dateView.nullable(),
    watched: z.boolean(),
    caution: z.string(),
  })
  .meta({ id: "AnchorSheet" });

export type AnchorSheet = z.infer<typeof anchorSheetView>;
