// Keeps node_modules equal to the lock file.
import { existsSync, readFileSync } from "node:fs";
import path from "node:path";
import { root } from "./paths.mjs";
import { showOrThrow } from "./run.mjs";
import { say } from "./say.mjs";

/** Throws unless this is the Node the packages were chosen for. */
export function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split(".").map(Number);
  if (major === 20 && minor >= 19) return;
  throw new Error(`Byssus needs Node 20 (20.19 or later); this is Node ${process.versions.node}.`);
}

/** Runs `npm ci` when a package is missing or differs from the lock file. */
export async function ensurePackages() {
  const difference = firstDifference();
  if (difference === null) return;
  say(`${difference} Running npm ci; this takes a minute or two.`);
  await showOrThrow("npm", ["ci", "--include=dev", "--no-audit", "--no-fund"], { cwd: root });
}

/** What npm left in node_modules is described in a lock file of its own; null when it fits ours. */
function firstDifference() {
  const file = path.join(root, "node_modules", ".package-lock.json");
  if (!existsSync(file)) return "The packages are not installed yet.";
  const wanted = packagesOf(path.join(root, "package-lock.json"));
  const installed = packagesOf(file);
  for (const [name, { version, optional }] of Object.entries(wanted)) {
    if (name === "" || (optional && !installed[name])) continue;
    if (installed[name]?.version !== version) return `${name} is not installed as ${version}.`;
  }
  return null;
}

const packagesOf = (file) => JSON.parse(readFileSync(file, "utf8")).packages;
