import "server-only";
import type { Tx } from "@/db/client";
import {
  deleteFindings,
  type FindingRow,
  insertFindings,
  type NewFinding,
} from "@/db/repositories/evaluation";
import type { AnchorVerdict, UsedFinding } from "@/lib/domain/finding/evaluate-anchor";

/** Writes what appeared and removes what cleared; a reason that says the same as before keeps its row. */
export async function storeFindings(
  tx: Tx,
  stored: readonly FindingRow[],
  judged: readonly { anchor: { id: string }; result: AnchorVerdict }[],
): Promise<void> {
  const wanted = judged.flatMap(({ anchor, result }) => [
    ...result.findings.map((finding) => rowOf(anchor.id, finding, null)),
    ...result.bolts.flatMap((bolt) => bolt.findings.map((finding) => rowOf(anchor.id, finding, bolt))),
  ]);
  const before = new Map(stored.map((row) => [keyOf(row), row.id]));
  const after = new Set(wanted.map(keyOf));
  await deleteFindings(
    tx,
    stored.filter((row) => !after.has(keyOf(row))).map((row) => row.id),
  );
  await insertFindings(
    tx,
    wanted.filter((row) => !before.has(keyOf(row))),
  );
}

function rowOf(
  anchorId: string,
  finding: UsedFinding,
  bolt: { boltId: string; placementNumber: number } | null,
): NewFinding {
  const { fittingId } = finding.numbers;
  return {
    anchorId,
    boltId: bolt?.boltId ?? null,
    placementNumber: bolt?.placementNumber ?? null,
    fittingId: typeof fittingId === "string" ? fittingId : null,
    uses: [...finding.uses],
    code: finding.code,
    level: finding.level,
    title: finding.title,
    text: finding.text,
    clearsWhen: finding.clearsWhen,
    numbers: { ...finding.numbers },
    assumed: [...finding.assumed],
    sourceMark: finding.source.mark,
    sourceName: finding.source.name,
  };
}

/** All that is said, in one line: jsonb does not keep the order of keys, so they are sorted. */
function keyOf(row: NewFinding | FindingRow): string {
  const numbers = Object.entries(row.numbers).toSorted(([a], [b]) => (a < b ? -1 : 1));
  return JSON.stringify([
    row.anchorId,
    row.boltId,
    row.code,
    row.level,
    row.title,
    row.text,
    row.clearsWhen,
    row.uses,
    row.assumed,
    row.sourceName,
    numbers,
  ]);
}
