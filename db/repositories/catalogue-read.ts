import "server-only";
import { and, asc, eq, isNull, sql } from "drizzle-orm";
import type { Handle } from "@/db/client";
import { visibleAnchors } from "@/db/repositories/visibility";
import { adhesives, anchors, areas, bolts, boltTypes, placements, sites } from "@/db/schema";
import type { Audience } from "@/lib/shared/audience";

/** Catalogue types with how many stand in the rock, among what the audience may know. */
export async function listTypeRows(db: Handle, who: Audience, id?: string) {
  const [types, counts] = await Promise.all([
    db
      .select()
      .from(boltTypes)
      .where(id === undefined ? undefined : eq(boltTypes.id, id))
      .orderBy(asc(boltTypes.form), asc(boltTypes.name)),
    db
      .select({ typeId: bolts.boltTypeId, n: sql<number>`count(*)::int` })
      .from(bolts)
      .innerJoin(placements, eq(placements.id, bolts.placementId))
      .innerJoin(anchors, eq(anchors.id, placements.anchorId))
      .innerJoin(sites, eq(sites.id, anchors.siteId))
      .innerJoin(areas, eq(areas.id, sites.areaId))
      .where(
        and(
          isNull(bolts.removedOn),
          isNull(bolts.struckAt),
          visibleAnchors(who),
          id === undefined ? undefined : eq(bolts.boltTypeId, id),
        ),
      )
      .groupBy(bolts.boltTypeId),
  ]);
  const inForce = new Map(counts.map((row) => [row.typeId, row.n]));
  return types.map((type) => ({ ...type, inForce: inForce.get(type.id) ?? 0 }));
}

export function listAdhesiveRows(db: Handle) {
  return db.select().from(adhesives).orderBy(asc(adhesives.name));
}
