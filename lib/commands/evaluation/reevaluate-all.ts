import "server-only";
import { type Db, inTransaction } from "@/db/client";
import { listAnchorIds, listAnchorIdsWithHardware, lockAnchors } from "@/db/repositories/anchors";
import { listAnchorsCuredSince, listAnchorsEvaluatedBefore } from "@/db/repositories/evaluation";
import { type EvaluatedAnchor, evaluateAnchors } from "@/lib/commands/evaluation/evaluate-anchors";

/** Anchors a transaction holds at a time. */
const BATCH = 50;
const DAY_MS = 86_400_000;

/** Which anchors: of an area, a site, with a type or an adhesive. Nothing: all. */
export interface Reach {
  areaId?: string | null;
  siteId?: string | null;
  boltTypeId?: string | null;
  adhesiveId?: string | null;
}

/** Judges many anchors again, in batches of one transaction each. @returns how many. */
export async function reevaluateAll(
  db: Db,
  { now, ...reach }: Reach & { now: Date },
  onProgress: (done: number, of: number) => void = () => undefined,
): Promise<number> {
  const byHardware = reach.boltTypeId ?? reach.adhesiveId;
  const ids = byHardware ? await listAnchorIdsWithHardware(db, reach) : await listAnchorIds(db, reach);
  for (let from = 0; from < ids.length; from += BATCH) {
    await evaluateBatch(db, ids.slice(from, from + BATCH), now);
    onProgress(Math.min(from + BATCH, ids.length), ids.length);
  }
  return ids.length;
}

/**
 * What time alone changes: glue that cured, checks that became overdue, closures that begin or end. Called now
 * and then; takes one batch and says how many it did, so the caller can go on while there is more.
 */
export async function reevaluateDue(db: Db, now: Date): Promise<number> {
  const cured = await listAnchorsCuredSince(db, now, BATCH);
  const old =
    cured.length < BATCH ? await listAnchorsEvaluatedBefore(db, new Date(now.getTime() - DAY_MS), BATCH) : [];
  const ids = [...new Set([...cured, ...old])].slice(0, BATCH).toSorted();
  await evaluateBatch(db, ids, now);
  return ids.length;
}

async function evaluateBatch(db: Db, ids: readonly string[], now: Date): Promise<EvaluatedAnchor[]> {
  return inTransaction(db, async (tx) => {
    const locked = await lockAnchors(tx, ids);
    return evaluateAnchors(
      tx,
      locked.map((row) => row.id),
      { now },
    );
  });
}
