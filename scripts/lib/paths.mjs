// Where things live. Everything a start makes is under `.local/`, which Git does not see.
import { chmodSync, mkdirSync } from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";

export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), "..", "..");
export const local = path.join(root, ".local");

/** Makes `.local/`: others may pass through it (the database runs as its own user) but not list it. */
export function makeLocal() {
  mkdirSync(local, { recursive: true });
  chmodSync(local, 0o711);
  return local;
}
