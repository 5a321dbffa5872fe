import "server-only";
import { getDb } from "@/db/client";
import { listSiteRows, type SiteRow } from "@/db/repositories/area-read";
import { audience } from "@/lib/policy/audience";
import type { SiteSummary } from "@/lib/schemas/views/register";
import type { Actor } from "@/lib/shared/actor";

/** The sites the actor may know of. */
export async function listSites(actor: Actor, areaSlug?: string): Promise<SiteSummary[]> {
  const rows = await listSiteRows(getDb(), audience(actor), areaSlug === undefined ? {} : { areaSlug });
  return rows.map(siteSummaryOf);
}

export function siteSummaryOf({ site, area, exact, lon, lat, ...counts }: SiteRow): SiteSummary {
  return {
    id: site.id,
    slug: site.slug,
    areaSlug: area.slug,
    areaName: area.name,
    name: site.name,
    visibility: site.visibility,
    exact,
    point: { type: "Point", coordinates: [lon, lat] },
    rockType: site.rockType,
    summary: exact ? site.summary : "",
    anchorCount: counts.anchorCount,
    conditions: counts.conditions,
    openReports: counts.openReports,
  };
}
