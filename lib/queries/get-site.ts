import "server-only";
import { getDb } from "@/db/client";
import { listAnchorRows } from "@/db/repositories/anchor-list";
import { listClosureRows, listSiteRows } from "@/db/repositories/area-read";
import { audience } from "@/lib/policy/audience";
import { closureViewOf, summaryView } from "@/lib/queries/anchor-view";
import { siteSummaryOf } from "@/lib/queries/list-sites";
import type { SiteView } from "@/lib/schemas/views/register";
import type { Actor } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

/** More anchors than any site has; a list beyond it would need pages. */
const MOST_ANCHORS = 1000;

/** One site with its anchors. @throws AppError `not_found` when absent or hidden. */
export async function getSite(actor: Actor, by: { id: string } | { slug: string }): Promise<SiteView> {
  const db = getDb();
  const who = audience(actor);
  const [row] = await listSiteRows(db, who, by);
  if (!row) throw new AppError("not_found", "There is no such site, or it is not shown to you.");
  const { site, area, exact } = row;
  const [closures, anchors] = await Promise.all([
    listClosureRows(db, { areaId: area.id, siteId: site.id }),
    listAnchorRows(
      db,
      who,
      { areaSlug: area.slug, siteSlug: site.slug },
      { limit: MOST_ANCHORS, after: null },
    ),
  ]);
  return {
    ...siteSummaryOf(row),
    version: site.version,
    areaId: area.id,
    ucsMpa: site.ucsMpa,
    ucsBasis: site.ucsBasis,
    washing: site.washing,
    so2: site.so2,
    saltedRoadDistanceM: exact ? site.saltedRoadDistanceM : null,
    warmDry: site.warmDry,
    approach: exact ? site.approach : null,
    landPermission: exact ? site.landPermission : null,
    noBoltZones: exact ? site.noBoltZones : null,
    emergency: exact ? area.emergency : null,
    closures: closures.map(closureViewOf),
    anchors: anchors.map((anchor) => summaryView(anchor, actor)),
  };
}
