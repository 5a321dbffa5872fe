import "server-only";
import { sql } from "drizzle-orm";
import type { Db } from "@/db/client";

/** How many migrations the database has seen. @throws when the database does not answer. */
export async function appliedMigrations(db: Db): Promise<number> {
  const [row] = await db.execute<{ n: number }>(
    sql`select count(*)::int as n from drizzle.__drizzle_migrations`,
  );
  return row?.n ?? 0;
}
