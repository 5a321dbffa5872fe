// npm test: static checks, unit, integration and browser tests on a database of their own. Ends with the totals.
// npm test -- check|unit|integration|e2e [files…]: only that part.
import { mkdirSync, readdirSync, rmSync } from "node:fs";
import path from "node:path";
import { check } from "./check.mjs";
import { ensureBuild } from "./lib/build.mjs";
import { closeCluster, openCluster } from "./lib/cluster.mjs";
import { databaseScript } from "./lib/database-scripts.mjs";
import { ensureChromium, ensurePostgres } from "./lib/debian.mjs";
import { isAlive } from "./lib/holders.mjs";
import { checkNode, ensurePackages } from "./lib/packages.mjs";
import { local, makeLocal } from "./lib/paths.mjs";
import { freePort } from "./lib/ports.mjs";
import { playwright, vitest } from "./lib/results.mjs";
import { stopRunning } from "./lib/run.mjs";
import { fail, heading, say, since } from "./lib/say.mjs";
import { startServer, untilAnswering } from "./lib/server.mjs";
import { applicationEnv } from "./lib/settings.mjs";
import { whenStopped } from "./lib/stopping.mjs";

/** The seed of the property tests where a run has to come out the same every time. */
const CI_SEED = "20260601";

const begun = Date.now();
const home = path.join(local, `test-${process.pid}`);
const folder = path.join(local, "test-results");
const [only, ...args] = process.argv.slice(2);
const total = { passed: 0, failed: 0 };
let server = null;
let stopping = false;

/** Runs one part and counts it. A part that breaks counts as one failure and the others go on. */
async function part(name, title, run) {
  if (stopping || (only !== undefined && only !== name)) return;
  heading(title);
  const start = Date.now();
  let result = { passed: 0, failed: 1 };
  try {
    result = await run();
  } catch (error) {
    fail(error);
  }
  total.passed += result.passed;
  total.failed += result.failed;
  say(`${title}: ${result.passed} passed, ${result.failed} failed (${since(start)})`);
}

async function main() {
  heading("Preparing");
  if (only !== undefined && !["check", "unit", "integration", "e2e"].includes(only)) {
    throw new Error(`there is no part "${only}": use check, unit, integration or e2e.`);
  }
  checkNode();
  await ensurePackages();
  await ensurePostgres();
  if (only === undefined || only === "e2e") await ensureChromium();
  makeLocal();
  mkdirSync(folder, { recursive: true });
  clearLeftovers();
  const cluster = await openCluster({ home, firstPort: 54400, throwAway: true });
  cluster.ensureDatabase("byssus_test");
  const seed = process.env.FAST_CHECK_SEED ?? (process.env.CI ? CI_SEED : String(Date.now() % 2_147_483_647));
  say(`Property tests use the seed FAST_CHECK_SEED=${seed}.`);
  const env = {
    ...process.env,
    NODE_ENV: "test",
    DATABASE_URL: cluster.url("byssus_test"),
    FAST_CHECK_SEED: seed,
  };
  await part("check", "Static checks", check);
  await part("unit", "Unit tests", () => vitest("unit", { env, folder, args }));
  await part("integration", "Integration tests", () => vitest("integration", { env, folder, args }));
  await part("e2e", "Browser tests", () => browserTests(cluster, seed));
}

/** The built application on its own port, with its own island, photos and mail sink. */
async function browserTests(cluster, seed) {
  cluster.ensureDatabase("byssus_e2e");
  const port = await freePort(3900);
  const address = `http://127.0.0.1:${port}`;
  const sinkPort = await freePort(4525);
  const env = {
    ...applicationEnv({ mode: "demo", databaseUrl: cluster.url("byssus_e2e"), address, sinkPort }),
    BYSSUS_DATA_DIR: path.join(home, "photos"),
    BYSSUS_URL: address,
    NEXTAUTH_URL: address,
    LOG_LEVEL: "warn",
    FAST_CHECK_SEED: seed,
  };
  await databaseScript("migrate", env);
  await databaseScript("seed", env, ["--fill-empty"]);
  await ensureBuild(env);
  if (stopping) throw new Error("stopped.");
  server = startServer({ host: "127.0.0.1", port, env });
  await untilAnswering(server, `${address}/api/health`);
  return playwright({ env: { ...env, BYSSUS_E2E_URL: address }, folder, args });
}

/** Clusters of runs that were killed. */
function clearLeftovers() {
  for (const name of readdirSync(local)) {
    const pid = /^test-(\d+)$/.exec(name)?.[1];
    if (pid !== undefined && !isAlive(Number(pid))) remove(path.join(local, name));
  }
}

function remove(testHome) {
  closeCluster(testHome);
  rmSync(testHome, { recursive: true, force: true });
}

async function cleanUp() {
  await server?.stop();
  remove(home);
}

whenStopped((code) => {
  stopping = true;
  stopRunning("SIGTERM");
  cleanUp()
    .catch(fail)
    .finally(() => process.exit(code));
});

try {
  await main();
} catch (error) {
  fail(error);
  total.failed += 1;
}
if (!stopping) {
  await cleanUp().catch(fail);
  say(`Everything took ${since(begun)}.`);
  console.log(`\n${total.passed} passed, ${total.failed} failed`);
  process.exitCode = total.failed === 0 && total.passed > 0 ? 0 : 1;
}
