// Runs the test tools and reads their own reports. A run that leaves no report counts as one failure, and a
// skipped test counts as failed: it proved nothing.
import { readFileSync, rmSync } from "node:fs";
import path from "node:path";
import { root } from "./paths.mjs";
import { show } from "./run.mjs";
import { say } from "./say.mjs";

/** One vitest project. `args`: files or options for vitest. */
export async function vitest(project, { env, folder, args = [] }) {
  const report = path.join(folder, `${project}.json`);
  const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${report}`];
  const code = await tool(["vitest", "run", `--project=${project}`, ...reporters, ...args], env, report);
  return totals(code, report, (results) => ({
    passed: results.numPassedTests,
    failed: results.numFailedTests,
    skipped: results.numPendingTests + results.numTodoTests,
  }));
}

/** The browser tests. A test that passed only when tried again counts as failed. */
export async function playwright({ env, folder, args = [] }) {
  const report = path.join(folder, "e2e.json");
  const code = await tool(
    ["playwright", "test", ...args],
    { ...env, PLAYWRIGHT_JSON_OUTPUT_NAME: report },
    report,
  );
  return totals(code, report, ({ stats }) => ({
    passed: stats.expected,
    failed: stats.unexpected + stats.flaky,
    skipped: stats.skipped,
  }));
}

function tool(command, env, report) {
  rmSync(report, { force: true });
  return show("npx", ["--no-install", ...command], { cwd: root, env });
}

function totals(code, report, read) {
  try {
    const { passed, failed, skipped } = read(JSON.parse(readFileSync(report, "utf8")));
    if (skipped > 0) say(`${skipped} skipped tests count as failed.`);
    const notPassed = failed + skipped;
    return { passed, failed: notPassed === 0 && code !== 0 ? 1 : notPassed };
  } catch {
    return { passed: 0, failed: 1 };
  }
}
