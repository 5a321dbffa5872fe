// node scripts/cluster.mjs up|down - the database of the demo without the application.
import { writeFileSync } from "node:fs";
import path from "node:path";
import { closeCluster, openCluster } from "./lib/cluster.mjs";
import { hold, keptUp, release } from "./lib/holders.mjs";
import { local, makeLocal } from "./lib/paths.mjs";
import { fail, say } from "./lib/say.mjs";

const home = path.join(local, "pg");

async function up() {
  makeLocal();
  const cluster = await openCluster({ home });
  cluster.ensureDatabase("byssus_demo");
  hold(home, keptUp);
  const file = path.join(local, "dev-url");
  writeFileSync(file, `${cluster.url("byssus_demo")}\n`, { mode: 0o600 });
  say(`The database answers on 127.0.0.1:${cluster.port}. Its address is in .local/dev-url.`);
}

function down() {
  if (!release(home, keptUp)) throw new Error("an application still uses the database.");
  closeCluster(home);
  say("The database has stopped.");
}

try {
  if (process.argv[2] === "up") await up();
  else if (process.argv[2] === "down") down();
  else throw new Error("use node scripts/cluster.mjs up or node scripts/cluster.mjs down.");
} catch (error) {
  fail(error);
}
