import { z } from "zod";
import { SITE_VISIBILITIES, SO2_BANDS, WASHINGS } from "@/lib/domain/vocabulary";
import { anchorSummaryView, closureView, photoView, sheetReportView } from "@/lib/schemas/views/anchor";
import {
  basisView,
  conditionView,
  dateView,
  findingView,
  formView,
  instantView,
  methodView,
  pointView,
  useView,
  verdictView,
} from "@/lib/schemas/views/common";

const quantity = z.number().nullable();
const words = z.string().nullable();

export const areaView = z
  .object({
    id: z.string(),
    version: z.number(),
    slug: z.string(),
    name: z.string(),
    summary: z.string(),
    visibility: z.enum(["public", "members"]),
    timeZone: z.string(),
    contactEmail: words,
    emergency: z
      .object({ number: words, stretcherAccess: words, signal: words, meetingPoint: words })
      .nullable(),
    siteCount: z.number(),
    anchorCount: z.number(),
  })
  .meta({ id: "Area" });
export type AreaView = z.infer<typeof areaView>;

/** Working and peak case per use, as the area has agreed. */
export const areaDetailView = areaView.extend({
  policyVersion: z.number(),
  demand: z.array(
    z.object({
      use: useView,
      workingKn: z.number(),
      peakKn: z.number(),
      peakStrengthOnly: z.boolean(),
      checkIntervalMonths: z.number(),
    }),
  ),
  sites: z.array(z.object({ id: z.string(), slug: z.string(), name: z.string(), anchorCount: z.number() })),
});
export type AreaDetail = z.infer<typeof areaDetailView>;

export const siteSummaryView = z
  .object({
    id: z.string(),
    slug: z.string(),
    areaSlug: z.string(),
    areaName: z.string(),
    name: z.string(),
    visibility: z.enum(SITE_VISIBILITIES),
    exact: z.boolean(),
    point: pointView,
    rockType: words,
    summary: z.string(),
    anchorCount: z.number(),
    /** Anchors by condition in force. */
    conditions: z.record(z.string(), z.number()),
    openReports: z.number(),
  })
  .meta({ id: "SiteSummary" });
export type SiteSummary = z.infer<typeof siteSummaryView>;

export const siteView = siteSummaryView
  .extend({
    version: z.number(),
    areaId: z.string(),
    ucsMpa: quantity,
    ucsBasis: words,
    washing: z.enum(WASHINGS).nullable(),
    so2: z.enum(SO2_BANDS).nullable(),
    saltedRoadDistanceM: quantity,
    warmDry: z.boolean(),
    approach: words,
    landPermission: words,
    noBoltZones: words,
    emergency: areaView.shape.emergency,
    closures: z.array(closureView),
    anchors: z.array(anchorSummaryView),
  })
  .meta({ id: "Site" });
export type SiteView = z.infer<typeof siteView>;

export const boltTypeView = z
  .object({
    id: z.string(),
    name: z.string(),
    form: formView,
    boltMetal: words,
    hangerMetal: words,
    linkMetal: words,
    rodCount: quantity,
    rodDiameterMm: quantity,
    leverMm: quantity,
    shankDiameterMm: quantity,
    lengthMm: quantity,
    holeDiameterMm: quantity,
    eyeRadiusMm: quantity,
    coatingThicknessUm: quantity,
    ratedRadialKn: quantity,
    ratedAxialKn: quantity,
    bendOnsetLowKn: quantity,
    bendOnsetHighKn: quantity,
    bendOnsetAxialKn: quantity,
    bendOnsetBasis: basisView,
    standard: words,
    allowedMethods: z.array(methodView),
    status: z.enum(["current", "discontinued"]),
    sourceNote: z.string(),
    hasRing: z.boolean(),
    /** Bolts of this type in force in what the audience may see. */
    inForce: z.number(),
  })
  .meta({ id: "BoltType" });
export type BoltTypeView = z.infer<typeof boltTypeView>;

export const matrixView = z
  .object({
    places: z.array(z.object({ key: z.string(), label: z.string() })),
    cells: z.array(
      z.object({
        use: useView,
        place: z.string(),
        verdict: verdictView,
        findings: z.array(findingView),
      }),
    ),
    assumed: z.array(z.string()),
    onDate: dateView,
    engine: z.string(),
    caution: z.string(),
  })
  .meta({ id: "TypeMatrix" });
export type TypeMatrix = z.infer<typeof matrixView>;

const spanEnd = z.object({
  id: z.string(),
  code: z.string(),
  label: z.string(),
  siteName: z.string(),
  condition: conditionView,
  verdict: verdictView.nullable(),
});

export const spanView = z
  .object({
    id: z.string(),
    version: z.number(),
    areaSlug: z.string(),
    name: z.string(),
    exact: z.boolean(),
    lengthM: quantity,
    /** From A to B, true north. */
    bearingDeg: quantity,
    heightDifferenceM: quantity,
    note: words,
    a: spanEnd,
    b: spanEnd,
    rig: z.record(z.string(), z.unknown()).nullable(),
    closures: z.array(closureView),
  })
  .meta({ id: "Span" });
export type SpanView = z.infer<typeof spanView>;

export const reportView = sheetReportView
  .extend({
    version: z.number(),
    areaId: words,
    areaSlug: words,
    /** Of the area; null: a report of a spot in no area. */
    timeZone: words,
    siteName: words,
    siteSlug: words,
    anchorCode: words,
    anchorLabel: words,
    boltId: words,
    receivedAt: instantView,
    point: pointView.nullable(),
    measured: z.record(z.string(), z.union([z.number(), z.string(), z.boolean(), z.null()])),
    jobs: z.array(z.object({ id: z.string(), title: z.string(), state: z.string() })),
    photos: z.array(photoView),
  })
  .meta({ id: "Report" });
export type ReportView = z.infer<typeof reportView>;
