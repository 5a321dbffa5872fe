// What every way of running Byssus needs before the application itself: a database and its content.
import path from "node:path";
import { closeCluster, openCluster } from "./cluster.mjs";
import { ensurePostgres } from "./debian.mjs";
import { databaseScript } from "./database-scripts.mjs";
import { hold, release } from "./holders.mjs";
import { local, makeLocal } from "./paths.mjs";
import { say } from "./say.mjs";
import { databaseName } from "./settings.mjs";

const clusterHome = path.join(local, "pg");

/** The database given from outside, or one in a cluster of our own. @returns its address. */
export async function openDatabase({ mode, givenUrl }) {
  makeLocal();
  if (givenUrl) {
    say("Using the database of DATABASE_URL.");
    return givenUrl;
  }
  await ensurePostgres();
  hold(clusterHome);
  const cluster = await openCluster({ home: clusterHome });
  cluster.ensureDatabase(databaseName(mode));
  say(`The database answers on 127.0.0.1:${cluster.port} (its files are under .local/pg).`);
  return cluster.url(databaseName(mode));
}

/** Lets go of the cluster of our own; the last one to leave stops it. */
export function leaveDatabase() {
  if (release(clusterHome)) closeCluster(clusterHome);
}

/**
 * Brings the database up to this version, and fills an empty demo.
 * Throws when the demo would run on a real register, or a real installation on the demo's accounts.
 */
export async function fillDatabase({ mode, env }) {
  const [outdated] = await databaseScript("migrate", env);
  say("The database has every migration.");
  if (outdated !== "0") say(`${outdated} anchors were judged again by the rules of this version.`);
  const [kind] = await databaseScript("seed", env, mode === "demo" ? ["--fill-empty"] : []);
  if (mode === "demo" && kind === "empty") say("The Isle of Tarrow was written into the empty database.");
  if (mode === "demo" && kind === "real") {
    throw new Error(
      "this database holds a real register. Set BYSSUS_DEMO=0, or give the demo another database.",
    );
  }
  if (mode !== "demo" && kind === "demo") {
    throw new Error("this database holds the demo, whose passwords are public. Give it another database.");
  }
}
