// Finds PostgreSQL's programs and the system user to run them as.
import { existsSync, readdirSync, statSync } from "node:fs";
import path from "node:path";
import { capture } from "./run.mjs";

const oldestMajor = 15;
const debianHome = "/usr/lib/postgresql";

/** The newest PostgreSQL (15 or later) of Debian's that has PostGIS beside it; null when there is none. */
export function findPostgres() {
  if (!existsSync(debianHome)) return null;
  const majors = readdirSync(debianHome)
    .map(Number)
    .filter((major) => major >= oldestMajor)
    .filter((major) => existsSync(`${debianHome}/${major}/bin/initdb`))
    .filter((major) => existsSync(`/usr/share/postgresql/${major}/extension/postgis.control`))
    .sort((a, b) => b - a);
  const major = majors[0];
  return major === undefined ? null : { major, bin: path.join(debianHome, String(major), "bin") };
}

/**
 * Who the server runs as: `{}` for the current user, or a uid and gid when we are root, because PostgreSQL
 * refuses to run as root. An existing data directory keeps its owner.
 */
export function serverUser(dataDirectory) {
  if (process.getuid?.() !== 0) return {};
  if (existsSync(dataDirectory)) {
    const { uid, gid } = statSync(dataDirectory);
    if (uid !== 0) return { uid, gid };
  }
  return {
    uid: Number(capture("id", ["-u", "postgres"])),
    gid: Number(capture("id", ["-g", "postgres"])),
  };
}
