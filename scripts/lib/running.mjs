// Remembers the server a start has going, so that one left behind by a start that was killed can be cleared.
import { readFileSync, readlinkSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { isAlive } from "./holders.mjs";
import { local, root } from "./paths.mjs";
import { say } from "./say.mjs";

const file = path.join(local, "running.json");

export const remember = (running) =>
  writeFileSync(file, `${JSON.stringify({ starter: process.pid, ...running })}\n`);

/** Forgets the server, unless another start has taken the place. */
export function forget() {
  if (read()?.starter === process.pid) rmSync(file, { force: true });
}

/** Ends a server whose start is gone; tells of one that is going. */
export function clearLeftover() {
  const running = read();
  if (!running) return;
  if (isAlive(running.starter)) {
    say(`Byssus runs from this folder already: ${running.address}. This is a second one beside it.`);
    return;
  }
  if (isAlive(running.server) && worksHere(running.server)) {
    process.kill(-running.server, "SIGTERM");
    say("Ended a server that an earlier start had left behind.");
  }
  rmSync(file, { force: true });
}

function read() {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch {
    return null;
  }
}

/** A process number is used again some day: only one that works in this folder is ours. */
function worksHere(pid) {
  try {
    return readlinkSync(`/proc/${pid}/cwd`) === root;
  } catch {
    return false;
  }
}
