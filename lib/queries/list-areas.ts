import "server-only";
import { getDb } from "@/db/client";
import { listAreaRows, listSiteRows, policyOf } from "@/db/repositories/area-read";
import { USES } from "@/lib/domain/vocabulary";
import { audience } from "@/lib/policy/audience";
import type { AreaDetail, AreaView } from "@/lib/schemas/views/register";
import type { Actor } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

/** The areas the actor may know of. */
export async function listAreas(actor: Actor): Promise<AreaView[]> {
  const db = getDb();
  const who = audience(actor);
  const [areas, sites] = await Promise.all([listAreaRows(db, who), listSiteRows(db, who)]);
  return areas.map((area) => areaOf(area, sites));
}

/** One area with its sites and the demand its group has agreed on. @throws AppError `not_found`. */
export async function getArea(actor: Actor, slug: string): Promise<AreaDetail> {
  const db = getDb();
  const who = audience(actor);
  const [area] = await listAreaRows(db, who, slug);
  if (!area) throw new AppError("not_found", "There is no such area, or it is not shown to you.");
  const [sites, policy] = await Promise.all([
    listSiteRows(db, who, { areaSlug: slug }),
    policyOf(db, area.id),
  ]);
  return {
    ...areaOf(area, sites),
    policyVersion: policy.version,
    demand: USES.map((use) => ({
      use,
      ...policy.demand[use],
      checkIntervalMonths: policy.checkIntervalMonths[use],
    })),
    sites: sites.map(({ site, anchorCount }) => ({
      id: site.id,
      slug: site.slug,
      name: site.name,
      anchorCount,
    })),
  };
}

type AreaRow = Awaited<ReturnType<typeof listAreaRows>>[number];

function areaOf(area: AreaRow, sites: Awaited<ReturnType<typeof listSiteRows>>): AreaView {
  const own = sites.filter((row) => row.area.id === area.id);
  const { id, version, slug, name, summary, visibility, timeZone, contactEmail, emergency } = area;
  return {
    id,
    version,
    slug,
    name,
    summary,
    visibility,
    timeZone,
    contactEmail,
    emergency,
    siteCount: own.length,
    anchorCount: own.reduce((sum, row) => sum + row.anchorCount, 0),
  };
}
