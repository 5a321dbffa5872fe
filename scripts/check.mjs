// npm run check: everything that can be said without running the program. All steps run; one failure fails it.
import { copyMapWorker } from "./lib/build.mjs";
import { root } from "./lib/paths.mjs";
import { show } from "./lib/run.mjs";
import { heading, say, since } from "./lib/say.mjs";

const steps = [
  ["types of the pages", ["next", "typegen"]],
  ["types", ["tsc", "--noEmit"]],
  ["lint and layers", ["eslint", "--quiet", "."]],
  ["format", ["prettier", "--check", "--log-level", "warn", "."]],
  ["dead code", ["knip"]],
  ["import cycles", ["depcruise", "--config", ".dependency-cruiser.cjs", "app", "components", "db", "lib"]],
];

/** @returns how many steps passed and failed. */
export async function check() {
  copyMapWorker();
  const result = { passed: 0, failed: 0 };
  for (const [name, command] of steps) {
    const begun = Date.now();
    const code = await show("npx", ["--no-install", ...command], { cwd: root });
    say(`${code === 0 ? "ok  " : "FAIL"} ${name} (${since(begun)})`);
    if (code === 0) result.passed += 1;
    else result.failed += 1;
  }
  return result;
}

if (process.argv[1]?.endsWith("check.mjs")) {
  heading("Static checks");
  const { failed } = await check();
  process.exitCode = failed === 0 ? 0 : 1;
}
