// Fills an empty database with the Isle of Tarrow and judges every anchor. Prints "seeded" or "not empty".
// Run: node --conditions=react-server --import tsx scripts/seed.ts
import { connect } from "@/db/client";
import { isEmptyRegister } from "@/db/repositories/health-read";
import { seedTarrow } from "@/db/seed";
import { reevaluateAll } from "@/lib/commands/evaluation/reevaluate-all";
import { now } from "@/lib/config/clock";
import { env } from "@/lib/config/env";

const { db, close } = connect(env().DATABASE_URL, 4);
try {
  if (await isEmptyRegister(db)) {
    const at = now();
    await seedTarrow(db, at);
    await reevaluateAll(db, { now: at });
    process.stdout.write("seeded\n");
  } else {
    process.stdout.write("not empty\n");
  }
} finally {
  await close();
}
