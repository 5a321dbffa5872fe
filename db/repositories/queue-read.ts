import "server-only";
import { and, asc, eq, inArray, type SQL, sql } from "drizzle-orm";
import type { Handle } from "@/db/client";
import {
  anchors,
  bolts,
  findings,
  memberships,
  photos,
  placements,
  reboltJobAssignees,
  reboltJobPlacements,
  reboltJobs,
  reports,
  sites,
  users,
} from "@/db/schema";
import type { JobState, Level } from "@/lib/domain/vocabulary";

/** Queue entries with the anchor they are about, in no order: ranking is the reader's. */
export function listJobRows(
  db: Handle,
  filter: { areaIds?: readonly string[]; states?: readonly JobState[]; id?: string },
) {
  const { areaIds, states, id } = filter;
  return db
    .select({
      job: reboltJobs,
      anchorCode: anchors.code,
      anchorLabel: anchors.label,
      anchorCondition: anchors.condition,
      anchorOutOfUseSince: anchors.outOfUseSince,
      siteName: sites.name,
      placementNumbers: sql<number[]>`(select coalesce(json_agg(p.number order by p.number), '[]'::json)
        from ${reboltJobPlacements} jp join ${placements} p on p.id = jp.placement_id where jp.job_id = ${reboltJobs.id})`,
      assignees: sql<
        { userId: string; name: string }[]
      >`(select coalesce(json_agg(json_build_object('userId', u.id, 'name', u.name) order by u.name), '[]'::json)
        from ${reboltJobAssignees} ja join ${users} u on u.id = ja.user_id where ja.job_id = ${reboltJobs.id})`,
      reasons: sql<
        { level: Level; title: string }[]
      >`(select coalesce(json_agg(json_build_object('level', w.level, 'title', w.title) order by w.rank, w.title), '[]'::json)
        from (select f.level, f.title, array_position(array['stop','ask','limit','note'], f.level) as rank
          from ${findings} f where f.anchor_id = ${reboltJobs.anchorId} and f.level in ('stop','ask','limit')
          group by f.level, f.title order by rank, f.title limit 5) w)`,
    })
    .from(reboltJobs)
    .innerJoin(anchors, eq(anchors.id, reboltJobs.anchorId))
    .innerJoin(sites, eq(sites.id, anchors.siteId))
    .where(
      and(
        areaIds && (areaIds.length > 0 ? inArray(reboltJobs.areaId, [...areaIds]) : sql`false`),
        states && inArray(reboltJobs.state, [...states]),
        id === undefined ? undefined : eq(reboltJobs.id, id),
      ),
    )
    .orderBy(asc(reboltJobs.waitingSince));
}

export type JobRow = Awaited<ReturnType<typeof listJobRows>>[number];

/**
 * The bolts in force of an anchor with the newest hand check that found each sound after `since`, and whether
 * a photo belongs to that check.
 */
export function listHandChecks(db: Handle, anchorId: string, since: Date | null) {
  const sound: SQL = sql`r.bolt_id = ${bolts.id} and r.kind = 'routine_check' and r.found_sound and r.depth <> 'seen'
    and r.state <> 'struck' and r.observed_at > ${(since ?? new Date(0)).toISOString()}`;
  return db
    .select({
      boltId: bolts.id,
      placementId: placements.id,
      placementNumber: placements.number,
      condition: bolts.condition,
      handCheckedAt: sql<string | null>`(select max(r.observed_at) from ${reports} r where ${sound})`,
      handCheckHasPhoto: sql<boolean>`exists (select 1 from ${reports} r join ${photos} f on f.report_id = r.id where ${sound})`,
    })
    .from(bolts)
    .innerJoin(placements, eq(placements.id, bolts.placementId))
    .where(
      and(
        eq(placements.anchorId, anchorId),
        sql`${bolts.removedOn} is null and ${bolts.struckAt} is null and ${placements.struckAt} is null`,
      ),
    )
    .orderBy(asc(placements.number));
}

/** Everybody who can be given work in an area. */
export function listMembers(db: Handle, areaId: string) {
  return db
    .select({ userId: users.id, name: users.name, email: users.email, role: memberships.role })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(memberships.areaId, areaId))
    .orderBy(asc(users.name));
}

export async function findPhoto(db: Handle, id: string) {
  const [row] = await db.select().from(photos).where(eq(photos.id, id)).limit(1);
  return row ?? null;
}
