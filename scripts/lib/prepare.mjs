// What every way of running Byssus needs before the application itself: packages, a database, its content.
import path from "node:path";
import { openCluster } from "./cluster.mjs";
import { ensurePostgres } from "./debian.mjs";
import { databaseScript } from "./database-scripts.mjs";
import { hold } from "./holders.mjs";
import { local, makeLocal } from "./paths.mjs";
import { say } from "./say.mjs";
import { databaseName } from "./settings.mjs";

export const clusterHome = path.join(local, "pg");

/** The database given from outside, or one in a cluster of our own. @returns its address. */
export async function openDatabase({ mode, givenUrl }) {
  makeLocal();
  if (givenUrl) {
    say("Using the database of DATABASE_URL.");
    return givenUrl;
  }
  await ensurePostgres();
  const cluster = await openCluster({ home: clusterHome });
  hold(clusterHome);
  cluster.ensureDatabase(databaseName(mode));
  say(`The database answers on 127.0.0.1:${cluster.port} (its files are under .local/pg).`);
  return cluster.url(databaseName(mode));
}

/** Migrates, and fills an empty demo. */
export async function fillDatabase({ mode, env }) {
  await databaseScript("migrate", env);
  say("The database has every migration.");
  if (mode !== "demo") return;
  const [answer] = await databaseScript("seed", env);
  if (answer === "seeded") say("The Isle of Tarrow was written into the empty database.");
}
