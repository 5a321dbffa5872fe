// npm start and npm run dev: from a fresh checkout to a running application, explaining itself on the way.
import { ensureBuild, copyMapWorker } from "./lib/build.mjs";
import { closeCluster } from "./lib/cluster.mjs";
import { databaseScript } from "./lib/database-scripts.mjs";
import { release } from "./lib/holders.mjs";
import { checkNode, ensurePackages } from "./lib/packages.mjs";
import { freePort } from "./lib/ports.mjs";
import { clusterHome, fillDatabase, openDatabase } from "./lib/prepare.mjs";
import { stopRunning } from "./lib/run.mjs";
import { fail, heading, say, since } from "./lib/say.mjs";
import { startServer, untilAnswering } from "./lib/server.mjs";
import { applicationEnv, readSettings } from "./lib/settings.mjs";

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
  const port = await freePort(settings.port);
  if (port !== settings.port) say(`Port ${settings.port} is taken by another program; using ${port}.`);
  const address = `http://${host}:${port}`;
  const sinkPort = await freePort(2525);
  const nodeEnv = dev ? "development" : "production";
  const env = applicationEnv({ mode, databaseUrl, address, sinkPort, nodeEnv });
  await fillDatabase({ mode, env });
  if (dev) copyMapWorker();
  else await ensureBuild(env);
  if (stopping) return;
  server = startServer({ dev, host, port, env });
  await untilAnswering(server, `${address}/api/health`);
  await tell({ address, mode, env });
  await server.exited;
  if (!stopping) throw new Error("the application ended by itself; its last lines are above.");
}

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

async function stop(signal) {
  if (stopping) return;
  stopping = true;
  stopRunning(signal);
  await server?.stop();
  leave();
  process.exit(signal === "SIGINT" ? 130 : 143);
}

/** The last one to leave stops the cluster. */
function leave() {
  try {
    if (release(clusterHome)) closeCluster(clusterHome);
  } catch (error) {
    fail(error);
  }
}

process.on("SIGINT", () => void stop("SIGINT"));
process.on("SIGTERM", () => void stop("SIGTERM"));
try {
  await main();
} catch (error) {
  if (!stopping) fail(error);
} finally {
  await server?.stop();
  if (!stopping) leave();
}
