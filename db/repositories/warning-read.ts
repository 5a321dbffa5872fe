import "server-only";
import { and, desc, eq, inArray, isNotNull, isNull, or, sql } from "drizzle-orm";
import type { Handle } from "@/db/client";
import { visibleAnchors } from "@/db/repositories/visibility";
import { adhesives, anchors, areas, batchWarnings, boltTypes, findings, sites } from "@/db/schema";
import type { Audience } from "@/lib/shared/audience";

/** Published warnings of the whole installation and of the audience's areas; drafts for members only. */
export function listWarningRows(db: Handle, who: Audience) {
  const mine = who.everything
    ? sql`true`
    : who.memberAreaIds.length > 0
      ? inArray(batchWarnings.areaId, [...who.memberAreaIds])
      : sql`false`;
  const publicArea = sql`exists (select 1 from ${areas} where ${areas.id} = ${batchWarnings.areaId} and ${areas.visibility} = 'public')`;
  return db
    .select({
      warning: batchWarnings,
      typeName: boltTypes.name,
      adhesiveName: adhesives.name,
      hits: sql<number>`(select count(distinct ${findings.boltId})::int from ${findings}
        join ${anchors} on ${anchors.id} = ${findings.anchorId} join ${sites} on ${sites.id} = ${anchors.siteId}
        join ${areas} on ${areas.id} = ${sites.areaId}
        where ${findings.code} = 'record.warning' and ${findings.numbers}->>'warningId' = ${batchWarnings.id}::text
          and ${visibleAnchors(who)})`,
    })
    .from(batchWarnings)
    .leftJoin(boltTypes, eq(boltTypes.id, batchWarnings.boltTypeId))
    .leftJoin(adhesives, eq(adhesives.id, batchWarnings.adhesiveId))
    .where(or(mine, and(isNotNull(batchWarnings.publishedAt), or(isNull(batchWarnings.areaId), publicArea))))
    .orderBy(desc(batchWarnings.publishedAt));
}
