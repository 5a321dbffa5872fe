import "server-only";
import { type Db, inTransaction } from "@/db/client";
import { lockAnchors } from "@/db/repositories/anchors";
import { listAnchorsOfOtherEngine } from "@/db/repositories/evaluation";
import { evaluateAnchors } from "@/lib/commands/evaluation/evaluate-anchors";
import { ENGINE_VERSION } from "@/lib/domain/finding/engine";

/** Anchors a transaction holds at a time. */
const BATCH = 50;

/**
 * Judges every anchor that has no verdict yet or one of other rules than this program's. Called once before
 * a new version serves. @returns how many.
 */
export async function reevaluateOutdated(db: Db, now: Date): Promise<number> {
  let done = 0;
  let last: string | null = null;
  for (;;) {
    const ids: string[] = await listAnchorsOfOtherEngine(db, ENGINE_VERSION, last, BATCH);
    if (ids.length === 0) return done;
    await inTransaction(db, async (tx) => {
      const locked = await lockAnchors(tx, ids);
      await evaluateAnchors(
        tx,
        locked.map((row) => row.id),
        { now },
      );
    });
    done += ids.length;
    last = ids.at(-1) ?? null;
  }
}
