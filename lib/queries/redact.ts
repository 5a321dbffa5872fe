import "server-only";
import type { AnchorSheet, AnchorSummary, SheetFinding, SheetReport } from "@/lib/schemas/views/anchor";
import type { BoltView } from "@/lib/schemas/views/bolt";

/**
 * The one place where what an outsider may not read is taken out of a view. Two cases:
 * - outside the area's membership nobody's name is shown;
 * - at a sensitive site, in addition, nothing the place could be found by: exact point, elevation, bearings,
 *   distance to the sea and every number or sentence that follows from it, spans, photos, free text.
 */
export function forOutsiders(sheet: AnchorSheet): AnchorSheet {
  return {
    ...sheet,
    placements: sheet.placements.map((placement) => ({
      ...placement,
      bolt: placement.bolt && withoutNames(placement.bolt),
      former: placement.former.map(withoutNames),
    })),
    reports: sheet.reports.map((report) => ({ ...report, reporterName: null })),
    revisions: sheet.revisions.map((revision) => ({ ...revision, by: "a member" })),
    jobs: [],
  };
}

/** For a sensitive site seen from outside. The point is already rounded by the query. */
export function withoutPlace(sheet: AnchorSheet): AnchorSheet {
  const open = forOutsiders(sheet);
  return {
    ...open,
    pointErrorM: null,
    elevationM: null,
    designAzimuthDeg: null,
    designElevationDeg: null,
    faceAzimuthDeg: null,
    sea: null,
    placeClass: null,
    helpMost: null,
    note: null,
    decided: open.decided && { ...open.decided, reason: "" },
    placements: open.placements.map((placement) => ({
      ...placement,
      faceAzimuthDeg: null,
      axisAzimuthDeg: null,
      note: null,
      bolt: placement.bolt && withoutText(placement.bolt),
      former: placement.former.map(withoutText),
    })),
    fittings: open.fittings.map((fitting) => ({ ...fitting, note: null })),
    rockBodies: open.rockBodies.map((body) => ({ ...body, note: null })),
    findings: open.findings.map(bareFinding),
    reports: open.reports.map(bareReport),
    spans: [],
    revisions: open.revisions.map((revision) => ({ ...revision, summary: "Changed", reason: null })),
  };
}

/** A row of a list for a sensitive site seen from outside. */
export function summaryWithoutPlace(summary: AnchorSummary): AnchorSummary {
  return {
    ...summary,
    exact: false,
    seaDistanceM: null,
    reasons: summary.reasons.map((reason) => ({ ...reason, title: titleWithoutPlace(reason) })),
  };
}

/** A bolt for people outside the area: who installed or removed it is the members' business. */
export function withoutNames(bolt: BoltView): BoltView {
  return { ...bolt, installedBy: null, removedBy: null };
}

/** A bolt at a sensitive site seen from outside. */
export function withoutText(bolt: BoltView): BoltView {
  return {
    ...withoutNames(bolt),
    note: null,
    removedWhy: null,
    struckReason: null,
    pullTests: bolt.pullTests.map((test) => ({ ...test, note: null })),
  };
}

/** Code and level stay; sentences and numbers may tell how far the sea is. */
export function bareFinding(finding: SheetFinding): SheetFinding {
  return {
    ...finding,
    title: titleWithoutPlace(finding),
    text: "",
    clearsWhen: null,
    numbers: {},
    assumed: [],
  };
}

/** What was seen stays, words and pictures go. */
export function bareReport(report: SheetReport): SheetReport {
  return { ...report, note: "", handledHow: null, reporterName: null, photos: [] };
}

function titleWithoutPlace({ code, title }: { code: string; title: string }): string {
  return code.startsWith("metal.") ? "The metal in this place" : title;
}
