// npm run check: everything that can be said without running the program. All steps run; one failure fails it.
import { availableParallelism } from "node:os";
import { copyMapWorker } from "./lib/build.mjs";
import { root } from "./lib/paths.mjs";
import { collect } from "./lib/run.mjs";
import { heading, say, since } from "./lib/say.mjs";

/** The other steps read the types it writes. */
const first = ["types of the pages", ["next", "typegen"]];

/** Longest first, as they run two at a time. Sizes of functions are warnings and stay quiet here. */
const others = [
  ["lint and layers", ["eslint", "--quiet", "."]],
  ["types", ["tsc", "--noEmit"]],
  ["format", ["prettier", "--check", "--log-level", "warn", "."]],
  ["import cycles", ["depcruise", "--config", ".dependency-cruiser.cjs", "app", "components", "db", "lib"]],
  ["dead code", ["knip", "--no-config-hints"]],
];

/** @returns how many steps passed and failed. */
export async function check() {
  copyMapWorker();
  const waiting = [...others];
  const passed = [await step(first)];
  const worker = async () => {
    for (let next = waiting.shift(); next; next = waiting.shift()) passed.push(await step(next));
  };
  await Promise.all(Array.from({ length: Math.min(2, availableParallelism()) }, worker));
  return { passed: passed.filter(Boolean).length, failed: passed.filter((ok) => !ok).length };
}

async function step([name, command]) {
  const begun = Date.now();
  const { code, output } = await collect("npx", ["--no-install", ...command], { cwd: root });
  if (code !== 0) console.log(output.trimEnd());
  say(`${code === 0 ? "ok  " : "FAIL"} ${name} (${since(begun)})`);
  return code === 0;
}

if (process.argv[1]?.endsWith("check.mjs")) {
  heading("Static checks");
  const { failed } = await check();
  process.exitCode = failed === 0 ? 0 : 1;
}
