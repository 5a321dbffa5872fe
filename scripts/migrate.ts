// Applies the migrations the database has not seen yet, then judges again what other rules had judged.
// Prints how many anchors that were.
// Run: node --conditions=react-server --import tsx scripts/migrate.ts
import { connect } from "@/db/client";
import { migrateDatabase } from "@/db/migrate";
import { reevaluateOutdated } from "@/lib/commands/evaluation/reevaluate-outdated";
import { now } from "@/lib/config/clock";
import { env } from "@/lib/config/env";

// One connection: the lock that keeps two starts apart belongs to it.
const { db, close } = connect(env().DATABASE_URL, 1);
try {
  await migrateDatabase(db);
  process.stdout.write(`${await reevaluateOutdated(db, now())}\n`);
} finally {
  await close();
}
