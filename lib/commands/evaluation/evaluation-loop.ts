import "server-only";
import { getDb } from "@/db/client";
import { reevaluateDue } from "@/lib/commands/evaluation/reevaluate-all";
import { now } from "@/lib/config/clock";
import { log } from "@/lib/config/log";

const EVERY_MS = 300_000;

declare global {
  // On the global object because pages, routes and instrumentation may each hold a copy of this module.
  var byssusEvaluationLoop: NodeJS.Timeout | undefined;
}

/** Judges again, every few minutes, what time alone has changed: cured glue, overdue checks, closures. */
export function startEvaluationLoop(): void {
  if (globalThis.byssusEvaluationLoop) return;
  let running = false;
  const run = async () => {
    if (running) return;
    running = true;
    try {
      while ((await reevaluateDue(getDb(), now())) > 0);
    } catch (error) {
      log().error({ err: error }, "judging again failed; it is tried again");
    } finally {
      running = false;
    }
  };
  globalThis.byssusEvaluationLoop = setInterval(() => void run(), EVERY_MS).unref();
  void run();
}
