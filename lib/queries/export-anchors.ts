import "server-only";
import { stringify } from "csv-stringify/sync";
import { BaseBuilder, buildGPX } from "gpx-builder";
import { getDb } from "@/db/client";
import { type AnchorFilter, listAnchorRows } from "@/db/repositories/anchor-list";
import { can } from "@/lib/policy/can";
import { summaryView } from "@/lib/queries/anchor-view";
import type { ExportFile } from "@/lib/schemas/export";
import type { AnchorSummary } from "@/lib/schemas/views/anchor";
import type { Actor } from "@/lib/shared/actor";
import type { Audience } from "@/lib/shared/audience";
import { AppError } from "@/lib/shared/errors";

const MOST = 1_000_000;

/**
 * The anchors of the areas the actor is a member of, in an open format.
 * @throws AppError `forbidden` for people who are a member nowhere.
 */
export async function exportAnchors(
  actor: Actor,
  file: ExportFile,
  filter: AnchorFilter,
  now: Date,
): Promise<{ text: string; contentType: string }> {
  const rows = await listAnchorRows(getDb(), membersOnly(actor), filter, { limit: MOST, after: null });
  const memberRows = rows.filter((row) => can(actor, "export.read", { areaId: row.areaId }));
  const anchors = memberRows.map((row) => summaryView(row, actor));
  switch (file) {
    case "anchors.geojson":
      return { text: JSON.stringify(asGeoJson(anchors, now)), contentType: "application/geo+json" };
    case "anchors.csv":
      return { text: asCsv(anchors), contentType: "text/csv; charset=utf-8" };
    case "anchors.gpx":
      return { text: asGpx(anchors, now), contentType: "application/gpx+xml" };
  }
}

function membersOnly(actor: Actor): Audience {
  if (actor.kind === "person" && actor.isAdmin)
    return { everything: true, memberAreaIds: [], key: "everything" };
  const memberAreaIds = actor.kind === "person" ? Object.keys(actor.roles) : [];
  if (memberAreaIds.length === 0) throw new AppError("forbidden", "Exports are for members of an area.");
  return { everything: false, memberAreaIds, key: "export" };
}

function asGeoJson(anchors: readonly AnchorSummary[], now: Date) {
  return {
    type: "FeatureCollection",
    name: "anchors",
    exportedAt: now.toISOString(),
    features: anchors.map(({ point, reasons, ...properties }) => ({
      type: "Feature",
      id: properties.id,
      geometry: point,
      properties: { ...properties, reasons: reasons.map((reason) => `${reason.level}: ${reason.title}`) },
    })),
  };
}

/** A cell that a spreadsheet would read as a formula is defused. */
function asCsv(anchors: readonly AnchorSummary[]): string {
  const rows = anchors.map((anchor) => ({
    code: anchor.code,
    label: anchor.label,
    site: anchor.siteName,
    uses: anchor.uses.join(" "),
    condition: anchor.condition,
    verdict: anchor.verdict,
    longitude: anchor.point.coordinates[0],
    latitude: anchor.point.coordinates[1],
    sea_distance_m: anchor.seaDistanceM === null ? null : Math.round(anchor.seaDistanceM),
    bolts: anchor.boltCount,
    open_reports: anchor.openReports,
    last_check_on: anchor.lastCheckOn,
    reasons: anchor.reasons.map((reason) => `${reason.level}: ${reason.title}`).join("; "),
    id: anchor.id,
  }));
  return stringify(rows, { header: true, escape_formulas: true, bom: true });
}

function asGpx(anchors: readonly AnchorSummary[], now: Date): string {
  const builder = new BaseBuilder();
  builder.setMetadata(new BaseBuilder.MODELS.Metadata({ name: "Anchors", time: now }));
  builder.setWayPoints(
    anchors.map((anchor) => {
      const [lon, lat] = anchor.point.coordinates;
      return new BaseBuilder.MODELS.Point(lat, lon, {
        name: anchor.code,
        desc: `${anchor.label}, ${anchor.siteName}. Condition ${anchor.condition.replace("_", " ")} as of ${now.toISOString().slice(0, 10)}.`,
      });
    }),
  );
  return buildGPX(builder.toObject());
}
