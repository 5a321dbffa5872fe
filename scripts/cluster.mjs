// node scripts/cluster.mjs up|down - the development database without the application.
import { writeFileSync } from "node:fs";
import path from "node:path";
import { closeCluster, openCluster } from "./lib/cluster.mjs";
import { makeLocal } from "./lib/paths.mjs";

const home = path.join(makeLocal(), "pg");

switch (process.argv[2]) {
  case "up": {
    const cluster = await openCluster({ home });
    cluster.ensureDatabase("byssus");
    const file = path.join(makeLocal(), "dev-url");
    writeFileSync(file, `${cluster.url("byssus")}\n`, { mode: 0o600 });
    console.log(`The database answers on 127.0.0.1:${cluster.port}. Its address is in ${path.relative(".", file)}.`);
    break;
  }
  case "down":
    closeCluster(home);
    console.log("The database has stopped.");
    break;
  default:
    console.error("Use: node scripts/cluster.mjs up|down");
    process.exitCode = 2;
}
