import "server-only";
import { and, desc, eq, inArray, sql } from "drizzle-orm";
import type { Handle } from "@/db/client";
import { outbox } from "@/db/schema";

/** Mails the drain gave up on: of the areas named, or of the whole installation. */
export function listGivenUpMails(db: Handle, areaIds: readonly string[] | "all") {
  const inAreas =
    areaIds === "all" ? undefined : areaIds.length > 0 ? inArray(outbox.areaId, [...areaIds]) : sql`false`;
  return db
    .select()
    .from(outbox)
    .where(and(eq(outbox.state, "given_up"), inAreas))
    .orderBy(desc(outbox.createdAt))
    .limit(200);
}

/** Seconds the oldest mail that is due has been waiting; 0 when none is. */
export async function drainLagS(db: Handle): Promise<number> {
  const [row] = await db.execute<{ lag: number }>(sql`
    select coalesce(extract(epoch from now() - min(next_attempt_at)), 0)::float as lag
    from outbox where state = 'queued' and next_attempt_at < now()`);
  return row?.lag ?? 0;
}
