// Runs the scripts that use the application's own database code. They need the packages to be installed.
import path from "node:path";
import { spawn } from "node:child_process";
import { root } from "./paths.mjs";
import { track } from "./run.mjs";

/**
 * Runs `scripts/<name>.ts` with the application's environment and resolves to the lines it printed.
 * The condition makes `server-only` importable outside Next. Rejects when the script fails.
 */
export function databaseScript(name, env, args = []) {
  const file = path.join(root, "scripts", `${name}.ts`);
  const node = ["--conditions=react-server", "--import", "tsx"];
  const options = { cwd: root, env, stdio: ["ignore", "pipe", "inherit"] };
  const child = track(spawn(process.execPath, [...node, file, ...args], options));
  return new Promise((resolve, reject) => {
    let output = "";
    child.stdout.setEncoding("utf8").on("data", (chunk) => (output += chunk));
    child.once("error", reject);
    child.once("close", (code) => {
      if (code === 0) resolve(output.trim().split("\n").filter(Boolean));
      else reject(new Error(`${name} failed${output ? `:\n${output.trim()}` : "; see above."}`));
    });
  });
}
