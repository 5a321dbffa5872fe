import "server-only";
import type { EvidenceRows } from "@/db/repositories/evidence";
import { handCheckOf, openFacts, type ReportsByBolt } from "@/lib/commands/evaluation/reports-by-bolt";
import type { AnchorForCondition, BoltForCondition, Decision } from "@/lib/domain/condition/derive-condition";
import { standsSince } from "@/lib/domain/condition/stands-since";

type BoltEntry = EvidenceRows["bolts"][number];

/** Rows of one anchor, as the derivation of its condition wants them. */
export function assembleCondition(
  anchor: EvidenceRows["heads"][number]["anchor"],
  placements: EvidenceRows["placements"],
  bolts: readonly BoltEntry[],
  reports: ReportsByBolt,
  now: Date,
): AnchorForCondition {
  const onlyBolts = placements.every((placement) => placement.kind === "bolt");
  return {
    uses: anchor.uses,
    // With a tree left to tie to, the anchor is not gone when its bolts are.
    bolts: bolts
      .filter(({ bolt }) => onlyBolts || bolt.removedOn === null)
      .map((entry) => boltForCondition(entry, placements, reports, now)),
    openReports: openFacts(reports.ofAnchor),
    events: reports.all
      .filter(({ report }) => report.tookOutOfUse && report.confirmed)
      .map(({ report }) => ({ observedAt: report.observedAt.toISOString() })),
    decided: decisionOf(anchor),
  };
}

function boltForCondition(
  { bolt }: BoltEntry,
  placements: EvidenceRows["placements"],
  reports: ReportsByBolt,
  now: Date,
): BoltForCondition {
  const removed = bolt.removedOn !== null;
  const about = reports.ofPlacement(bolt.placementId);
  return {
    boltId: bolt.id,
    role: placements.find((placement) => placement.id === bolt.placementId)?.role ?? "main",
    removed,
    standsSince: standsSince(bolt),
    openReports: removed ? [] : openFacts(about),
    curing: bolt.usableFrom !== null && bolt.usableFrom > now,
    handCheckedAt: handCheckOf(bolt.id, about)?.report.observedAt.toISOString() ?? null,
    decided: decisionOf(bolt),
  };
}

function decisionOf(row: {
  decidedCondition: Decision["condition"] | null;
  decidedAt: Date | null;
}): Decision | null {
  if (row.decidedCondition === null || row.decidedAt === null) return null;
  return { condition: row.decidedCondition, at: row.decidedAt.toISOString() };
}
