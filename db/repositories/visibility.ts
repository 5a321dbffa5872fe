import "server-only";
import { and, eq, inArray, isNull, ne, or, type SQL, sql } from "drizzle-orm";
import { anchors, areas, sites } from "@/db/schema";
import type { Audience } from "@/lib/shared/audience";

/** The areas this audience may know of. */
export function visibleAreas(who: Audience): SQL | undefined {
  if (who.everything) return undefined;
  return or(eq(areas.visibility, "public"), memberArea(who));
}

/** The sites this audience may know of; the statement joins `areas`. Struck sites are gone for everybody. */
export function visibleSites(who: Audience): SQL | undefined {
  const inForce = isNull(sites.struckAt);
  if (who.everything) return inForce;
  return and(
    inForce,
    or(memberArea(who), and(eq(areas.visibility, "public"), ne(sites.visibility, "members"))),
  );
}

/** The anchors this audience may know of; the statement joins `sites` and `areas`. */
export function visibleAnchors(who: Audience): SQL | undefined {
  return and(isNull(anchors.struckAt), visibleSites(who));
}

/** True in SQL where the audience may see exact places and everything that follows from them. */
export function seesExactly(who: Audience): SQL<boolean> {
  if (who.everything) return sql<boolean>`true`;
  const member = who.memberAreaIds.length > 0 ? inArray(sites.areaId, [...who.memberAreaIds]) : sql`false`;
  return sql<boolean>`(${sites.visibility} <> 'sensitive' or ${member})`;
}

/** Where an anchor is shown: its point, or its site's point rounded to about 1 km. */
export function shownPoint(who: Audience): SQL {
  return sql`case when ${seesExactly(who)} then ${anchors.point} else ${roundedSitePoint()} end`;
}

/** The site's point on a grid of a hundredth of a degree. */
export function roundedSitePoint(): SQL {
  return sql`ST_SnapToGrid(${sites.point}, 0.01)`;
}

function memberArea(who: Audience): SQL {
  return who.memberAreaIds.length > 0 ? inArray(areas.id, [...who.memberAreaIds]) : sql`false`;
}
