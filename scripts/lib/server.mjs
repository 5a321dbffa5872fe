// The application's server process.
import { spawn } from "node:child_process";
import { setTimeout as sleep } from "node:timers/promises";
import { nextProgram } from "./build.mjs";
import { root } from "./paths.mjs";

/**
 * Starts Next and returns its handle. Next renames its process and may start others, so it gets a process
 * group of its own, and `stop` ends the whole group.
 */
export function startServer({ dev = false, host, port, env, stdio = ["ignore", "inherit", "inherit"] }) {
  const args = [nextProgram, dev ? "dev" : "start", "--hostname", host, "--port", String(port)];
  const child = spawn(process.execPath, args, { cwd: root, env, stdio, detached: true });
  let ended = false;
  const exited = new Promise((resolve) => {
    const done = () => {
      ended = true;
      resolve();
    };
    child.once("exit", done);
    child.once("error", done);
  });
  return {
    pid: child.pid,
    exited,
    hasEnded: () => ended,
    /** Asks the group to end, waits ten seconds, then ends it by force. */
    async stop() {
      signalGroup(child.pid, "SIGTERM");
      await Promise.race([exited, sleep(10_000, undefined, { ref: false })]);
      signalGroup(child.pid, "SIGKILL");
    },
  };
}

/** Waits until the server answers with anything but a fault of its own. */
export async function untilAnswering(server, url, { seconds = 90 } = {}) {
  const end = Date.now() + seconds * 1000;
  while (Date.now() < end) {
    if (server.hasEnded()) throw new Error("the application ended while starting; its last lines are above.");
    const status = await statusOf(url);
    if (status !== null && status < 500 && !server.hasEnded()) return;
    await sleep(250);
  }
  throw new Error(`the application did not answer on ${url} within ${seconds} seconds.`);
}

async function statusOf(url) {
  try {
    const response = await fetch(url, { redirect: "manual", signal: AbortSignal.timeout(20_000) });
    await response.body?.cancel();
    return response.status;
  } catch {
    return null;
  }
}

function signalGroup(pid, signal) {
  try {
    if (pid !== undefined) process.kill(-pid, signal);
  } catch {
    // The group has ended already.
  }
}
