import "server-only";
import type { AnchorListRow } from "@/db/repositories/anchor-list";
import type { ClosureRow } from "@/db/repositories/area-read";
import type { BoltRow, FindingRow, ReportRow } from "@/db/repositories/anchor-read";
import { reasonNumbers } from "@/lib/domain/finding/reason-numbers";
import { audience, isMember } from "@/lib/policy/audience";
import type { Actor } from "@/lib/shared/actor";
import { summaryWithoutPlace } from "@/lib/queries/redact";
import type {
  AnchorSummary,
  ClosureView,
  PhotoView,
  SheetFinding,
  SheetReport,
} from "@/lib/schemas/views/anchor";
import type { BoltView } from "@/lib/schemas/views/bolt";

/** Rows of the database turned into what people and programs are shown: flat, no Date, no Drizzle row. */
export function summaryView(row: AnchorListRow, actor: Actor): AnchorSummary {
  const exact = row.siteVisibility !== "sensitive" || isMember(audience(actor), row.areaId);
  const summary: AnchorSummary = {
    id: row.id,
    code: row.code,
    label: row.label,
    areaSlug: row.areaSlug,
    siteSlug: row.siteSlug,
    siteName: row.siteName,
    uses: row.uses,
    rowName: row.rowName,
    condition: row.condition,
    verdict: row.verdict,
    utilisation: row.utilisation,
    point: { type: "Point", coordinates: [row.lon, row.lat] },
    exact,
    seaDistanceM: row.seaDistanceM,
    boltCount: row.boltCount,
    hardware: row.hardware,
    openReports: row.openReports,
    lastCheckOn: row.lastCheckOn,
    reasons: row.reasons,
  };
  return exact ? summary : summaryWithoutPlace(summary);
}

export function boltViewOf({ bolt, type, adhesiveName, evaluation, tests }: BoltRow): BoltView {
  return {
    id: bolt.id,
    version: bolt.version,
    placementId: bolt.placementId,
    typeId: bolt.boltTypeId,
    typeName: type?.name ?? null,
    form: bolt.form,
    boltMetal: bolt.boltMetal ?? type?.boltMetal ?? null,
    hangerMetal: bolt.hangerMetal ?? type?.hangerMetal ?? null,
    linkMetal: bolt.linkMetal ?? type?.linkMetal ?? null,
    rodCount: type?.rodCount ?? null,
    rodDiameterMm: type?.rodDiameterMm ?? null,
    leverMm: bolt.leverMm ?? type?.leverMm ?? null,
    shankDiameterMm: type?.shankDiameterMm ?? null,
    ratedRadialKn: type?.ratedRadialKn ?? null,
    ratedAxialKn: type?.ratedAxialKn ?? null,
    bendOnsetLowKn: type?.bendOnsetLowKn ?? null,
    bendOnsetHighKn: type?.bendOnsetHighKn ?? null,
    bendOnsetAxialKn: type?.bendOnsetAxialKn ?? null,
    bendOnsetBasis: type?.bendOnsetBasis ?? "unknown",
    typeSourceNote: type?.sourceNote ?? "",
    standard: bolt.claimedStandard ?? type?.standard ?? null,
    batch: bolt.batch,
    installedOn: bolt.installedOn,
    installedOnPrecision: bolt.installedOnPrecision,
    installedBy: bolt.installedBy,
    method: bolt.method,
    adhesiveName,
    adhesiveBatch: bolt.adhesiveBatch,
    adhesiveExpiresOn: bolt.adhesiveExpiresOn,
    glueTempC: bolt.glueTempC,
    rockTempC: bolt.rockTempC,
    holeCleaning: bolt.holeCleaning,
    torqueNm: bolt.torqueNm,
    recheckDueOn: bolt.recheckDueOn,
    embedmentMm: bolt.embedmentMm,
    usableFrom: bolt.usableFrom?.toISOString() ?? null,
    witnessMark: bolt.witnessMark,
    magnetic: bolt.magnetic,
    rustGrade: bolt.rustGrade,
    note: bolt.note,
    removedOn: bolt.removedOn,
    removedBy: bolt.removedBy,
    removedWhy: bolt.removedWhy,
    replacesBoltId: bolt.replacesBoltId,
    struckReason: bolt.struckReason,
    condition: bolt.removedOn ? "removed" : bolt.condition,
    outOfUseSince: bolt.outOfUseSince?.toISOString() ?? null,
    verdict: evaluation?.verdict ?? null,
    utilisation: evaluation?.utilisation ?? null,
    pullTests: tests.map(({ id, direction, loadKn, holdS, movementMm, mode, testedOn, note }) => ({
      id,
      direction,
      loadKn,
      holdS,
      movementMm,
      mode,
      testedOn,
      note,
    })),
  };
}

export function findingsView(rows: readonly FindingRow[]): SheetFinding[] {
  const findings = rows.map((row) => ({
    ...row,
    source: { mark: row.sourceMark, name: row.sourceName },
  }));
  const numbers = reasonNumbers(findings);
  return findings.map((row, index) => ({
    number: numbers[index] ?? index + 1,
    code: row.code,
    level: row.level,
    title: row.title,
    text: row.text,
    clearsWhen: row.clearsWhen,
    numbers: row.numbers,
    assumed: row.assumed,
    source: row.source,
    boltId: row.boltId,
    fittingId: row.fittingId,
    placementNumber: row.placementNumber,
    uses: row.uses,
  }));
}

export function photoViewOf(photo: {
  id: string;
  largeKey: string;
  thumbKey: string;
  widthPx: number;
  heightPx: number;
  caption: string;
}): PhotoView {
  return {
    id: photo.id,
    largeUrl: `/api/uploads/${photo.largeKey}`,
    thumbUrl: `/api/uploads/${photo.thumbKey}`,
    widthPx: photo.widthPx,
    heightPx: photo.heightPx,
    caption: photo.caption,
  };
}

export function sheetReportOf({ report, placementNumber, photos }: ReportRow): SheetReport {
  return {
    id: report.id,
    kind: report.kind,
    depth: report.depth,
    placementNumber,
    observedAt: report.observedAt.toISOString(),
    grade: report.grade,
    note: report.note,
    foundSound: report.foundSound,
    tookOutOfUse: report.tookOutOfUse,
    confirmed: report.confirmed,
    state: report.state,
    handledAt: report.handledAt?.toISOString() ?? null,
    handledHow: report.handledHow,
    reporterName: report.reporterName,
    photos: photos.map(photoViewOf),
  };
}

export function closureViewOf({ closure, siteName, anchorCode, areaName }: ClosureRow): ClosureView {
  const scope = closure.anchorId ? "anchor" : closure.siteId ? "site" : "area";
  return {
    id: closure.id,
    version: closure.version,
    areaId: closure.areaId,
    scope,
    scopeName: anchorCode ?? siteName ?? areaName,
    reason: closure.reason,
    startsOn: closure.startsOn,
    endsOn: closure.endsOn,
    yearly: closure.yearly,
    source: closure.source,
    liftedAt: closure.liftedAt?.toISOString() ?? null,
  };
}
