// npm run db:reset: empties the database of the demo, migrates and fills it again. A database that may hold
// real records (DATABASE_URL, BYSSUS_DEMO=0) only with -- --yes.
import { rmSync } from "node:fs";
import { databaseScript } from "./lib/database-scripts.mjs";
import { checkNode, ensurePackages } from "./lib/packages.mjs";
import { fillDatabase, leaveDatabase, openDatabase } from "./lib/prepare.mjs";
import { fail, heading, say } from "./lib/say.mjs";
import { applicationEnv, ownPhotos, readSettings } from "./lib/settings.mjs";

async function main() {
  const { mode, givenUrl } = readSettings();
  const mayHoldRecords = givenUrl !== null || mode !== "demo";
  if (mayHoldRecords && !process.argv.includes("--yes")) {
    throw new Error(
      "this database may hold real records. Say npm run db:reset -- --yes if all of it may go.",
    );
  }
  heading("Emptying the database");
  checkNode();
  await ensurePackages();
  const databaseUrl = await openDatabase({ mode, givenUrl });
  const env = applicationEnv({ mode, databaseUrl, address: "http://127.0.0.1:3000", sinkPort: 2525 });
  await databaseScript("drop-all", env);
  if (!mayHoldRecords) rmSync(ownPhotos(mode), { recursive: true, force: true });
  await fillDatabase({ mode, env });
  say("Done.");
}

try {
  await main();
} catch (error) {
  fail(error);
} finally {
  leaveDatabase();
}
