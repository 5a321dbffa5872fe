// npm test: static checks, unit, integration and browser tests on a database of their own. Ends with the totals.
import { readFileSync, rmSync } from "node:fs";
import path from "node:path";
import { check } from "./check.mjs";
import { ensureBuild } from "./lib/build.mjs";
import { closeCluster, openCluster } from "./lib/cluster.mjs";
import { databaseScript } from "./lib/database-scripts.mjs";
import { ensureChromium, ensurePostgres } from "./lib/debian.mjs";
import { checkNode, ensurePackages } from "./lib/packages.mjs";
import { local, makeLocal, root } from "./lib/paths.mjs";
import { freePort } from "./lib/ports.mjs";
import { show, stopRunning } from "./lib/run.mjs";
import { fail, heading, say, since } from "./lib/say.mjs";
import { startServer, untilAnswering } from "./lib/server.mjs";
import { applicationEnv } from "./lib/settings.mjs";

const begun = Date.now();
const home = path.join(local, "test-pg");
const only = process.argv.slice(2);
const wants = (part) => only.length === 0 || only.includes(part);
const total = { passed: 0, failed: 0 };
let server = null;

function count(part, { passed, failed }) {
  total.passed += passed;
  total.failed += failed;
  say(`${part}: ${passed} passed, ${failed} failed (${since(begun)} since the start)`);
}

/** Runs one vitest project and reads its own report. A run that leaves none counts as one failure. */
async function vitest(project, env) {
  const report = path.join(local, `${project}.json`);
  rmSync(report, { force: true });
  const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${report}`];
  const code = await show("npx", ["--no-install", "vitest", "run", `--project=${project}`, ...reporters], {
    cwd: root,
    env,
  });
  try {
    const { numPassedTests, numFailedTests, numPendingTests, numTodoTests } = JSON.parse(
      readFileSync(report, "utf8"),
    );
    const skipped = numPendingTests + numTodoTests;
    if (skipped > 0) say(`${skipped} skipped tests count as failed.`);
    const failed = numFailedTests + skipped;
    return { passed: numPassedTests, failed: failed === 0 && code !== 0 ? 1 : failed };
  } catch {
    return { passed: 0, failed: 1 };
  }
}

async function browser(env) {
  const report = path.join(local, "e2e.json");
  rmSync(report, { force: true });
  const code = await show("npx", ["--no-install", "playwright", "test"], {
    cwd: root,
    env: { ...env, PLAYWRIGHT_JSON_OUTPUT_NAME: report },
  });
  try {
    const { stats } = JSON.parse(readFileSync(report, "utf8"));
    const failed = stats.unexpected + stats.flaky + stats.skipped;
    return { passed: stats.expected, failed: failed === 0 && code !== 0 ? 1 : failed };
  } catch {
    return { passed: 0, failed: 1 };
  }
}

async function endToEnd(cluster, seed) {
  await ensureChromium();
  cluster.ensureDatabase("byssus_e2e");
  const port = await freePort(3900);
  const address = `http://127.0.0.1:${port}`;
  const env = {
    ...applicationEnv({
      mode: "demo",
      databaseUrl: cluster.url("byssus_e2e"),
      address,
      sinkPort: await freePort(4525),
    }),
    BYSSUS_DATA_DIR: path.join(local, "test-data"),
    BYSSUS_URL: address,
    NEXTAUTH_URL: address,
    LOG_LEVEL: "warn",
    FAST_CHECK_SEED: seed,
  };
  await databaseScript("migrate", env);
  await databaseScript("seed", env);
  await ensureBuild(env);
  server = startServer({ host: "127.0.0.1", port, env });
  await untilAnswering(server, `${address}/api/health`);
  return browser({ ...env, BYSSUS_E2E_URL: address });
}

async function main() {
  checkNode();
  heading("Preparing");
  await ensurePackages();
  await ensurePostgres();
  makeLocal();
  closeCluster(home);
  rmSync(home, { recursive: true, force: true });
  const cluster = await openCluster({ home, firstPort: 54400, throwAway: true });
  cluster.ensureDatabase("byssus_test");
  const seed =
    process.env.FAST_CHECK_SEED ?? (process.env.CI ? "20260601" : String(Date.now() % 2_147_483_647));
  say(`Property tests use the seed ${seed} (FAST_CHECK_SEED).`);
  const env = {
    ...process.env,
    DATABASE_URL: cluster.url("byssus_test"),
    FAST_CHECK_SEED: seed,
    CI: process.env.CI ?? "",
  };
  if (wants("check")) {
    heading("Static checks");
    count("Static checks", await check());
  }
  if (wants("unit")) {
    heading("Unit tests");
    count("Unit tests", await vitest("unit", env));
  }
  if (wants("integration")) {
    heading("Integration tests");
    count("Integration tests", await vitest("integration", env));
  }
  if (wants("e2e")) {
    heading("Browser tests");
    count("Browser tests", await endToEnd(cluster, seed));
  }
}

async function cleanUp() {
  await server?.stop();
  closeCluster(home);
  rmSync(home, { recursive: true, force: true });
}

for (const signal of ["SIGINT", "SIGTERM"]) {
  process.on(signal, () => {
    stopRunning(signal);
    void cleanUp().finally(() => process.exit(1));
  });
}
try {
  await main();
} catch (error) {
  fail(error);
  total.failed += 1;
} finally {
  await cleanUp();
}
console.log(`\n${total.passed} passed, ${total.failed} failed`);
process.exitCode = total.failed === 0 && total.passed > 0 ? 0 : 1;
