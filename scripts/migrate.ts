// Applies the migrations the database has not seen yet. Prints nothing when it worked.
// Run: node --conditions=react-server --import tsx scripts/migrate.ts
import path from "node:path";
import { migrate } from "drizzle-orm/postgres-js/migrator";
import { connect } from "@/db/client";
import { env } from "@/lib/config/env";

const { db, close } = connect(env().DATABASE_URL, 1);
try {
  await migrate(db, { migrationsFolder: path.join(import.meta.dirname, "..", "db", "migrations") });
} finally {
  await close();
}
