// Small wrappers around child processes. Plain Node: this runs before the packages are installed.
import { spawn, spawnSync } from "node:child_process";

/** Wording of a command for a message, e.g. `npm ci`. */
const wording = (command, args) => [command, ...args].join(" ");

/**
 * Runs a command to its end and returns what it printed.
 * Options are those of `spawn`, and `input` is written to its standard input.
 * Throws an error that carries the end of the output when the command fails.
 */
export function capture(command, args, options = {}) {
  const result = spawnSync(command, args, { encoding: "utf8", maxBuffer: 64 * 1024 * 1024, ...options });
  if (result.error) throw new Error(`${command} could not be run: ${result.error.message}`);
  if (result.status !== 0) {
    const tail = `${result.stdout}\n${result.stderr}`.trim().split("\n").slice(-15).join("\n");
    throw new Error(`${wording(command, args)} failed:\n${tail}`);
  }
  return result.stdout.trim();
}

/** True when the command can be run and ends well; prints nothing. */
export function succeeds(command, args, options = {}) {
  return spawnSync(command, args, { stdio: "ignore", ...options }).status === 0;
}

/** Commands that have not ended. */
const running = new Set();

/** Has `stopRunning` pass signals on to this child while it runs. @returns the child. */
export function track(child) {
  running.add(child);
  child.once("close", () => running.delete(child));
  return child;
}

/** Passes a signal on to every tracked command that still runs. */
export const stopRunning = (signal) => running.forEach((child) => child.kill(signal));

/** Runs a command with its output on the screen. Resolves to the exit code; never rejects. */
export function show(command, args, options = {}) {
  return new Promise((resolve) => {
    const child = track(spawn(command, args, { stdio: "inherit", ...options }));
    child.once("error", (error) => {
      console.error(`${command} could not be run: ${error.message}`);
      resolve(1);
    });
    child.once("exit", (code, signal) => {
      if (signal) console.error(`${command} was ended by ${signal}.`);
      resolve(code ?? 1);
    });
  });
}

/** Runs a command and keeps what it prints. Resolves to the exit code and the output; never rejects. */
export function collect(command, args, options = {}) {
  return new Promise((resolve) => {
    const child = track(spawn(command, args, { stdio: ["ignore", "pipe", "pipe"], ...options }));
    let output = "";
    for (const stream of [child.stdout, child.stderr]) {
      stream.setEncoding("utf8").on("data", (chunk) => (output += chunk));
    }
    child.once("error", (error) =>
      resolve({ code: 1, output: `${command} could not be run: ${error.message}` }),
    );
    child.once("close", (code) => resolve({ code: code ?? 1, output }));
  });
}

/** Like `show`, but throws when the command fails. */
export async function showOrThrow(command, args, options = {}) {
  const code = await show(command, args, options);
  if (code !== 0) throw new Error(`${wording(command, args)} failed with exit code ${code}.`);
}
