// npm start and npm run dev: from a fresh checkout to a running application, explaining itself on the way.
import { copyMapWorker, ensureBuild } from "./lib/build.mjs";
import { databaseScript } from "./lib/database-scripts.mjs";
import { checkNode, ensurePackages } from "./lib/packages.mjs";
import { freePort } from "./lib/ports.mjs";
import { fillDatabase, leaveDatabase, openDatabase } from "./lib/prepare.mjs";
import { stopRunning } from "./lib/run.mjs";
import { clearLeftover, forget, remember } from "./lib/running.mjs";
import { fail, heading, say, since } from "./lib/say.mjs";
import { startServer, untilAnswering } from "./lib/server.mjs";
import { applicationEnv, readSettings } from "./lib/settings.mjs";
import { whenStopped } from "./lib/stopping.mjs";

const dev = process.argv.includes("--dev");
const begun = Date.now();
let server = null;
let stopping = false;

async function main() {
  const settings = readSettings();
  const { mode, host, givenUrl } = settings;
  heading(`Byssus ${mode === "demo" ? "with the demo island" : "as a real installation"}`);
  checkNode();
  await ensurePackages();
  const databaseUrl = await openDatabase({ mode, givenUrl });
  clearLeftover();
  const nodeEnv = dev ? "development" : "production";
  const envAt = (port, sinkPort) =>
    applicationEnv({ mode, databaseUrl, address: addressOf(host, port), sinkPort, nodeEnv });
  await fillDatabase({ mode, env: envAt(settings.port, 0) });
  if (dev) copyMapWorker();
  else await ensureBuild(envAt(settings.port, 0));
  if (stopping) return;
  // Only now: a port that was free before a build may be taken after it.
  const port = await freePort(settings.port);
  if (port !== settings.port) say(`Port ${settings.port} is taken by another program; using ${port}.`);
  const address = addressOf(host, port);
  const env = envAt(port, await freePort(2525));
  say("Starting the application.");
  server = startServer({ dev, host, port, env });
  remember({ server: server.pid, address });
  await untilAnswering(server, `${address}/api/health`);
  await tell({ address, mode, env });
  await server.exited;
  if (!stopping) throw new Error("the application ended by itself; its last lines are above.");
}

const addressOf = (host, port) => `http://${host === "0.0.0.0" ? "127.0.0.1" : host}:${port}`;

async function tell({ address, mode, env }) {
  heading(`Ready after ${since(begun)}: ${address}`);
  if (mode === "demo") {
    say("Everything on the island is invented. Sign in as one of");
    say("admin@ steward@ bolter@ rigger@ visitor@ demo.byssus.example");
    say("with the password tarrow-demo-2026. Mail is caught at /mailbox.");
  } else {
    const [link] = await databaseScript("first-run", env);
    if (link) say(`Open this link once to become the administrator: ${link}`);
  }
  say("Ctrl-C stops what was started here and loses nothing.");
}

/** Ends everything that was started here. It may be called again while it works. */
async function cleanUp() {
  await server?.stop();
  forget();
  leaveDatabase();
}

whenStopped((code) => {
  stopping = true;
  say("Stopping.");
  stopRunning("SIGTERM");
  cleanUp()
    .catch(fail)
    .finally(() => process.exit(code));
});

try {
  await main();
} catch (error) {
  if (!stopping) fail(error);
}
if (!stopping) await cleanUp().catch(fail);
