// npm run db:reset: empties the database of the demo (or of DATABASE_URL with --yes), migrates and fills it again.
import { databaseScript } from "./lib/database-scripts.mjs";
import { closeCluster } from "./lib/cluster.mjs";
import { release } from "./lib/holders.mjs";
import { checkNode, ensurePackages } from "./lib/packages.mjs";
import { clusterHome, fillDatabase, openDatabase } from "./lib/prepare.mjs";
import { fail, heading, say } from "./lib/say.mjs";
import { applicationEnv, readSettings } from "./lib/settings.mjs";

try {
  const { mode, givenUrl } = readSettings();
  if ((givenUrl || mode !== "demo") && !process.argv.includes("--yes")) {
    throw new Error("this database may hold real records. Add -- --yes if all of it may go.");
  }
  heading("Emptying the database");
  checkNode();
  await ensurePackages();
  const databaseUrl = await openDatabase({ mode, givenUrl });
  const env = applicationEnv({ mode, databaseUrl, address: "http://127.0.0.1:3000", sinkPort: 2525 });
  await databaseScript("drop-all", env);
  await fillDatabase({ mode, env });
  say("Done.");
} catch (error) {
  fail(error);
} finally {
  if (release(clusterHome)) closeCluster(clusterHome);
}
