// Who uses the database cluster of this folder, so that the last one to leave stops it.
import { existsSync, mkdirSync, readdirSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";

/** Name of the holder that keeps the cluster up without an application. */
export const keptUp = "kept-up";

const directory = (home) => path.join(home, "holders");

export function hold(home, name = String(process.pid)) {
  mkdirSync(directory(home), { recursive: true });
  writeFileSync(path.join(directory(home), name), "");
}

/** Lets go. True when nobody else holds on; holders whose process is gone do not count. */
export function release(home, name = String(process.pid)) {
  if (!existsSync(directory(home))) return true;
  rmSync(path.join(directory(home), name), { force: true });
  for (const other of readdirSync(directory(home))) {
    if (other === keptUp || isAlive(Number(other))) return false;
    rmSync(path.join(directory(home), other), { force: true });
  }
  return true;
}

export function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === "EPERM";
  }
}
