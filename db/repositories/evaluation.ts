import "server-only";
import { and, asc, eq, gt, inArray, notInArray, sql } from "drizzle-orm";
import type { Handle, Tx } from "@/db/client";
import { anchorEval, anchors, boltEval, bolts, findings } from "@/db/schema";

export type FindingRow = typeof findings.$inferSelect;
export type NewFinding = typeof findings.$inferInsert;
export type NewAnchorEval = typeof anchorEval.$inferInsert;
export type NewBoltEval = typeof boltEval.$inferInsert;

/** What was found before, for telling what changed. */
export async function loadStoredResults(db: Handle, anchorIds: readonly string[]) {
  const ids = [...anchorIds];
  return {
    findings: await db
      .select()
      .from(findings)
      .where(inArray(findings.anchorId, ids))
      .orderBy(asc(findings.id)),
    evals: await db.select().from(anchorEval).where(inArray(anchorEval.anchorId, ids)),
  };
}

export async function deleteFindings(tx: Tx, ids: readonly number[]): Promise<void> {
  if (ids.length > 0) await tx.delete(findings).where(inArray(findings.id, [...ids]));
}

export async function insertFindings(tx: Tx, rows: readonly NewFinding[]): Promise<void> {
  for (let from = 0; from < rows.length; from += 500) {
    await tx.insert(findings).values(rows.slice(from, from + 500));
  }
}

export async function upsertAnchorEvals(tx: Tx, rows: readonly NewAnchorEval[]): Promise<void> {
  if (rows.length === 0) return;
  await tx
    .insert(anchorEval)
    .values([...rows])
    .onConflictDoUpdate({
      target: anchorEval.anchorId,
      set: {
        verdict: sql`excluded.verdict`,
        utilisation: sql`excluded.utilisation`,
        findingCount: sql`excluded.finding_count`,
        codes: sql`excluded.codes`,
        helpMost: sql`excluded.help_most`,
        placeClass: sql`excluded.place_class`,
        engineVersion: sql`excluded.engine_version`,
        policyVersion: sql`excluded.policy_version`,
        evaluatedAt: sql`excluded.evaluated_at`,
      },
    });
}

/** Replaces the results of all bolts of these anchors: a bolt that came out has none any more. */
export async function replaceBoltEvals(
  tx: Tx,
  anchorIds: readonly string[],
  rows: readonly NewBoltEval[],
): Promise<void> {
  const kept = rows.map((row) => row.boltId);
  await tx
    .delete(boltEval)
    .where(
      and(
        inArray(boltEval.anchorId, [...anchorIds]),
        kept.length > 0 ? notInArray(boltEval.boltId, kept) : undefined,
      ),
    );
  if (rows.length === 0) return;
  await tx
    .insert(boltEval)
    .values([...rows])
    .onConflictDoUpdate({
      target: boltEval.boltId,
      set: {
        anchorId: sql`excluded.anchor_id`,
        verdict: sql`excluded.verdict`,
        utilisation: sql`excluded.utilisation`,
        engineVersion: sql`excluded.engine_version`,
        policyVersion: sql`excluded.policy_version`,
        evaluatedAt: sql`excluded.evaluated_at`,
      },
    });
}

type ConditionChange = Pick<typeof anchors.$inferInsert, "condition" | "derivedCondition" | "outOfUseSince">;

/** Conditions follow from evidence: they raise no version, so nobody's edit becomes stale by them. */
export async function setAnchorCondition(tx: Tx, id: string, change: ConditionChange): Promise<void> {
  await tx.update(anchors).set(change).where(eq(anchors.id, id));
}

export async function setBoltCondition(tx: Tx, id: string, change: ConditionChange): Promise<void> {
  await tx.update(bolts).set(change).where(eq(bolts.id, id));
}

/** The next anchors, by id after `after`, without a verdict or with one by another version of the rules. */
export async function listAnchorsOfOtherEngine(
  db: Handle,
  engineVersion: string,
  after: string | null,
  limit: number,
): Promise<string[]> {
  const rows = await db
    .select({ id: anchors.id })
    .from(anchors)
    .leftJoin(anchorEval, eq(anchorEval.anchorId, anchors.id))
    .where(
      and(
        sql`${anchors.struckAt} is null`,
        after === null ? undefined : gt(anchors.id, after),
        sql`${anchorEval.engineVersion} is distinct from ${engineVersion}`,
      ),
    )
    .orderBy(anchors.id)
    .limit(limit);
  return rows.map((row) => row.id);
}

/** Anchors whose answer may have changed by time alone: not evaluated since that instant, oldest first. */
export async function listAnchorsEvaluatedBefore(
  db: Handle,
  instant: Date,
  limit: number,
): Promise<string[]> {
  const rows = await db
    .select({ id: anchors.id })
    .from(anchors)
    .leftJoin(anchorEval, eq(anchorEval.anchorId, anchors.id))
    .where(
      and(
        sql`${anchors.struckAt} is null`,
        sql`(${anchorEval.evaluatedAt} is null or ${anchorEval.evaluatedAt} < ${instant.toISOString()})`,
      ),
    )
    .orderBy(sql`${anchorEval.evaluatedAt} asc nulls first`)
    .limit(limit);
  return rows.map((row) => row.id);
}

/** Anchors with glue that has cured between their last evaluation and now. */
export async function listAnchorsCuredSince(db: Handle, now: Date, limit: number): Promise<string[]> {
  const rows = await db
    .selectDistinct({ id: boltEval.anchorId })
    .from(boltEval)
    .innerJoin(bolts, eq(bolts.id, boltEval.boltId))
    .where(sql`${bolts.usableFrom} > ${boltEval.evaluatedAt} and ${bolts.usableFrom} <= ${now.toISOString()}`)
    .limit(limit);
  return rows.map((row) => row.id);
}
