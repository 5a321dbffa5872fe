// Prints what the database is: "empty", "demo" or "real". With --fill-empty an empty one is filled with the
// Isle of Tarrow and every anchor judged.
// Run: node --conditions=react-server --import tsx scripts/seed.ts --fill-empty
import { connect } from "@/db/client";
import { installationKind } from "@/db/repositories/installation";
import { seedTarrow } from "@/db/seed";
import { reevaluateOutdated } from "@/lib/commands/evaluation/reevaluate-outdated";
import { now } from "@/lib/config/clock";
import { env } from "@/lib/config/env";

const { db, close } = connect(env().DATABASE_URL, 4);
try {
  const kind = await installationKind(db);
  process.stdout.write(`${kind}\n`);
  if (kind === "empty" && process.argv.includes("--fill-empty")) {
    const at = now();
    await seedTarrow(db, at);
    await reevaluateOutdated(db, at);
  }
} finally {
  await close();
}
