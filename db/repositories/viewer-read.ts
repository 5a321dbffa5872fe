import "server-only";
import { sql } from "drizzle-orm";
import type { Handle } from "@/db/client";

/** What waits for a person: open reports and proposals where they are steward, jobs given to them. */
export async function countWaiting(db: Handle, areaIds: readonly string[] | "all", userId: string) {
  const inAreas =
    areaIds === "all"
      ? sql`true`
      : areaIds.length === 0
        ? sql`false`
        : sql`area_id in (${sql.join(
            areaIds.map((id) => sql`${id}::uuid`),
            sql`, `,
          )})`;
  const [row] = await db.execute<{ reports: number; proposals: number; jobs: number }>(sql`select
    (select count(*)::int from reports where state = 'open' and ${inAreas}) as reports,
    (select count(*)::int from rebolt_jobs where state = 'proposed' and ${inAreas}) as proposals,
    (select count(*)::int from rebolt_jobs j join rebolt_job_assignees a on a.job_id = j.id
      where j.state = 'accepted' and a.user_id = ${userId}) as jobs`);
  return row ?? { reports: 0, proposals: 0, jobs: 0 };
}
