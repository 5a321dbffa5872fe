// Drops everything of ours from the database: tables, functions and the record of migrations. PostGIS stays.
// Run: node --conditions=react-server --import tsx scripts/drop-all.ts
import { connect } from "@/db/client";
import { dropEverything } from "@/db/repositories/installation";
import { env } from "@/lib/config/env";

const { db, close } = connect(env().DATABASE_URL, 1);
try {
  await dropEverything(db);
} finally {
  await close();
}
