import "server-only";
import type { Tx } from "@/db/client";
import { findFitting, findPlacement, findSiteNear } from "@/db/repositories/anchors";
import { findBolt, findBoltInForce, findBoltType } from "@/db/repositories/bolts";
import { findSpan } from "@/db/repositories/spans";
import { lockSite } from "@/db/repositories/stewarding";
import { invalidField, notFound } from "@/lib/commands/writing/refusals";
import type { ReportTarget } from "@/lib/domain/report/draft-report";
import type { FileReportInput } from "@/lib/schemas/report";
import type { Audience } from "@/lib/shared/audience";

/** A point within this distance of a site belongs to it, m. */
const SITE_REACH_M = 2000;

/** The rows a report is about, checked to belong together. */
export interface AboutColumns {
  areaId: string | null;
  siteId: string | null;
  anchorId: string | null;
  placementId: string | null;
  placementNumber: number | null;
  boltId: string | null;
  fittingId: string | null;
  spanId: string | null;
  target: ReportTarget;
}

/** A report about a registered anchor, or a part of it. */
export async function aboutAnchor(
  tx: Tx,
  anchor: { id: string; siteId: string; areaId: string },
  input: FileReportInput,
): Promise<AboutColumns> {
  const named = input.boltId ? await findBolt(tx, input.boltId) : null;
  if (input.boltId && named?.anchorId !== anchor.id) throw foreign("boltId", "bolt");
  const placementId = input.placementId ?? named?.bolt.placementId ?? null;
  const placement = placementId ? await findPlacement(tx, placementId) : null;
  if (placementId && (placement?.anchorId !== anchor.id || placement.struckAt)) {
    throw foreign("placementId", "placement");
  }
  if (named && named.bolt.placementId !== placementId) throw foreign("boltId", "bolt");
  const bolt = named?.bolt ?? (placementId ? await findBoltInForce(tx, placementId) : null);
  const type = bolt?.boltTypeId ? await findBoltType(tx, bolt.boltTypeId) : null;
  const fitting = input.fittingId ? await findFitting(tx, input.fittingId) : null;
  if (input.fittingId && fitting?.anchorId !== anchor.id) throw foreign("fittingId", "fitting");
  const span = input.spanId ? await findSpan(tx, input.spanId) : null;
  if (input.spanId && span?.anchorAId !== anchor.id && span?.anchorBId !== anchor.id) {
    throw foreign("spanId", "span");
  }
  return {
    areaId: anchor.areaId,
    siteId: anchor.siteId,
    anchorId: anchor.id,
    placementId,
    placementNumber: placement?.number ?? null,
    boltId: bolt?.id ?? null,
    fittingId: fitting?.id ?? null,
    spanId: span?.id ?? null,
    target: {
      anchorId: anchor.id,
      hasPoint: input.point !== undefined,
      form: bolt?.form ?? null,
      nominalDiameterMm: fitting
        ? fitting.diameterMm
        : (type?.rodDiameterMm ?? type?.shankDiameterMm ?? null),
    },
  };
}

/** A report about a spot where nothing is registered: at a named site, or the one nearest to the point. */
export async function aboutPlace(tx: Tx, who: Audience, input: FileReportInput): Promise<AboutColumns> {
  const site = input.siteId ? await lockSite(tx, who, input.siteId) : null;
  if (input.siteId && !site) throw notFound();
  for (const path of ["placementId", "boltId", "fittingId", "spanId"] as const) {
    if (input[path]) throw invalidField(path, "Say at which anchor.");
  }
  const near = site === null && input.point ? await findSiteNear(tx, who, input.point, SITE_REACH_M) : null;
  return {
    areaId: site?.areaId ?? near?.areaId ?? null,
    siteId: site?.id ?? near?.siteId ?? null,
    anchorId: null,
    placementId: null,
    placementNumber: null,
    boltId: null,
    fittingId: null,
    spanId: null,
    target: { anchorId: null, hasPoint: input.point !== undefined, form: null, nominalDiameterMm: null },
  };
}

function foreign(path: string, word: string) {
  return invalidField(path, `This ${word} is not one of this anchor's.`);
}
