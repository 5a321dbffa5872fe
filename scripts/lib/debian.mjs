// Installs what is missing from Debian's own packages.
import { existsSync } from "node:fs";
import { findPostgres } from "./postgres.mjs";
import { showOrThrow, show, succeeds } from "./run.mjs";
import { say } from "./say.mjs";

export const chromium = "/usr/bin/chromium";

/** PostgreSQL with PostGIS, from Debian when it is missing. */
export async function ensurePostgres() {
  if (findPostgres()) return findPostgres();
  say("PostgreSQL with PostGIS is missing. Installing it from Debian's packages.");
  say("(Debian also sets up a database server of its own on port 5432. Byssus leaves that one alone.)");
  await install(["postgresql", "postgresql-postgis"], "or set DATABASE_URL to a database you have");
  const postgres = findPostgres();
  if (!postgres) {
    throw new Error(
      "Debian's PostgreSQL is older than 15 or has no PostGIS. Set DATABASE_URL to a newer one.",
    );
  }
  return postgres;
}

/** Debian's Chromium for the browser tests. */
export async function ensureChromium() {
  if (existsSync(chromium)) return;
  say("Chromium is missing. Installing it from Debian's packages.");
  await install(["chromium", "fonts-liberation"], "and start again");
}

async function install(packages, otherwise) {
  const byHand = `apt-get install ${packages.join(" ")}`;
  const because = (why) => new Error(`${why} Run this as root: ${byHand} - ${otherwise}.`);
  if (!existsSync("/usr/bin/apt-get")) throw because("This system has no apt-get.");
  const isRoot = process.getuid?.() === 0;
  if (!isRoot && !succeeds("sudo", ["--version"]))
    throw because("Installing packages needs root, and sudo is missing.");
  const [command, ...before] = [
    ...(isRoot ? [] : ["sudo"]),
    "env",
    "DEBIAN_FRONTEND=noninteractive",
    "apt-get",
  ];
  const updated = await show(command, [...before, "update", "-q"]);
  if (updated !== 0) say("The package lists could not be renewed; trying with the ones that are there.");
  try {
    await showOrThrow(command, [...before, "install", "-y", "-q", "--no-install-recommends", ...packages]);
  } catch (error) {
    throw because(`${error.message}`);
  }
}
