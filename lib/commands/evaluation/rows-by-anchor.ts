import "server-only";
import type { EvidenceRows } from "@/db/repositories/evidence";
import type { AnchorRows } from "@/lib/commands/evaluation/assemble-evidence";
import { reportsByBolt } from "@/lib/commands/evaluation/reports-by-bolt";
import { DEFAULT_POLICY } from "@/lib/domain/policy";

/** One anchor's rows, with every bolt that ever stood there beside those in the rock now. */
export type RowsOfAnchor = Omit<AnchorRows, "outOfUseBoltIds" | "bolts"> & {
  bolts: EvidenceRows["bolts"];
  all: EvidenceRows["bolts"];
};

/** Sorts a batch of rows by anchor. */
export function rowsByAnchor(rows: EvidenceRows): RowsOfAnchor[] {
  const placements = grouped(rows.placements, (row) => row.anchorId);
  const bodies = grouped(rows.rockBodies, (row) => row.anchorId);
  const bolts = grouped(rows.bolts, (row) => row.anchorId);
  const fittings = grouped(rows.fittings, (row) => row.anchorId);
  const reports = grouped(rows.reports, ({ report }) => report.anchorId);
  return rows.heads.map((head) => {
    const { id } = head.anchor;
    const all = bolts.get(id) ?? [];
    return {
      head,
      policy: rows.policies.get(head.area.id) ?? DEFAULT_POLICY,
      placements: (placements.get(id) ?? []).toSorted((a, b) => a.number - b.number),
      rockBodies: bodies.get(id) ?? [],
      all,
      bolts: all.filter(({ bolt }) => bolt.removedOn === null),
      fittings: fittings.get(id) ?? [],
      reports: reportsByBolt(reports.get(id) ?? []),
      fracturedMetals: rows.fractures
        .filter((row) => row.siteId === head.site.id)
        .map((row) => row.metal)
        .filter((metal) => metal !== null),
      warnings: rows.warnings,
      closures: rows.closures,
    };
  });
}

function grouped<T, K>(rows: readonly T[], keyOf: (row: T) => K): Map<K, T[]> {
  const groups = new Map<K, T[]>();
  for (const row of rows) {
    const key = keyOf(row);
    const group = groups.get(key);
    if (group) group.push(row);
    else groups.set(key, [row]);
  }
  return groups;
}
