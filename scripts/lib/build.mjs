// Builds the application when its sources changed since the last build.
import { createHash } from "node:crypto";
import {
  copyFileSync,
  existsSync,
  mkdirSync,
  readFileSync,
  readdirSync,
  rmSync,
  writeFileSync,
} from "node:fs";
import path from "node:path";
import { root } from "./paths.mjs";
import { showOrThrow } from "./run.mjs";
import { say } from "./say.mjs";

export const nextProgram = path.join(root, "node_modules", "next", "dist", "bin", "next");

const folders = ["app", "components", "db", "lib", "public"];
const output = path.join(root, process.env.BYSSUS_DIST_DIR ?? ".next");
const stampFile = path.join(output, "byssus-sources");

/** The map's worker is loaded by address, so it has to be a public file. */
export function copyMapWorker() {
  const vendor = path.join(root, "public", "vendor");
  mkdirSync(vendor, { recursive: true });
  const name = "maplibre-gl-worker.mjs";
  copyFileSync(path.join(root, "node_modules", "maplibre-gl", "dist", name), path.join(vendor, name));
}

export async function ensureBuild(env) {
  copyMapWorker();
  const stamp = sourcesStamp();
  if (existsSync(stampFile) && readFileSync(stampFile, "utf8") === stamp) {
    say("The built application fits the sources.");
    return;
  }
  say("Building the application; this takes a minute or two.");
  // A build that is broken off must not pass for the one before.
  rmSync(stampFile, { force: true });
  await showOrThrow(process.execPath, [nextProgram, "build"], { cwd: root, env });
  writeFileSync(stampFile, stamp);
}

/** A digest over the path and content of every file that goes into the build. */
function sourcesStamp() {
  const hash = createHash("sha256");
  const atTop = readdirSync(root, { withFileTypes: true })
    .filter(
      (entry) => entry.isFile() && /\.(ts|mjs|json)$/.test(entry.name) && entry.name !== "next-env.d.ts",
    )
    .map((entry) => path.join(root, entry.name));
  const below = folders.flatMap((folder) => filesBelow(path.join(root, folder)));
  for (const file of [...atTop, ...below].sort()) {
    hash
      .update(`${path.relative(root, file)}\0`)
      .update(readFileSync(file))
      .update("\0");
  }
  return hash.digest("hex");
}

function filesBelow(directory) {
  return readdirSync(directory, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.join(entry.parentPath, entry.name));
}
