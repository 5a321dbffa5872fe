import "server-only";
import path from "node:path";
import { sql } from "drizzle-orm";
import { migrate } from "drizzle-orm/postgres-js/migrator";
import type { Db } from "@/db/client";

/** Any number of our own: two starts at once must not migrate at once. */
const MIGRATION_LOCK = 7_311_947;

/**
 * Applies the migrations the database has not seen yet.
 * @param db a handle with one connection: the lock belongs to the connection that took it.
 */
export async function migrateDatabase(db: Db): Promise<void> {
  await db.execute(sql`select pg_advisory_lock(${MIGRATION_LOCK})`);
  try {
    await migrate(db, { migrationsFolder: path.join(process.cwd(), "db", "migrations") });
  } finally {
    await db.execute(sql`select pg_advisory_unlock(${MIGRATION_LOCK})`);
  }
}
