import "server-only";
import type { EvidenceRows } from "@/db/repositories/evidence";
import type { OpenReportFacts } from "@/lib/domain/finding/evidence";
import { reportFacts } from "@/lib/domain/report/report-facts";

export type ReportEntry = EvidenceRows["reports"][number];

/** The reports of an anchor, sorted by what they are about. */
export interface ReportsByBolt {
  /** About the placement a bolt stands in. What was answered when a bolt was replaced is answered. */
  ofPlacement: (placementId: string) => ReportEntry[];
  /** About the anchor, its rock or a fitting. */
  ofAnchor: ReportEntry[];
  all: readonly ReportEntry[];
}

export function reportsByBolt(entries: readonly ReportEntry[]): ReportsByBolt {
  return {
    ofPlacement: (placementId) => entries.filter(({ report }) => report.placementId === placementId),
    ofAnchor: entries.filter(({ report }) => report.placementId === null),
    all: entries,
  };
}

export function openFacts(entries: readonly ReportEntry[]): OpenReportFacts[] {
  return entries
    .filter(({ report }) => report.state === "open")
    .map(({ report }) =>
      reportFacts({
        reportId: report.id,
        kind: report.kind,
        depth: report.depth,
        observedAt: report.observedAt.toISOString(),
        grade: report.grade,
        confirmed: report.confirmed,
        measured: report.measured,
      }),
    );
}

/**
 * The last check by hand that found the bolt sound, made by a member of the area: nobody else's counts for
 * putting it back in service. A check of the bolt that stood there before says nothing about this one.
 */
export function handCheckOf(boltId: string, entries: readonly ReportEntry[]): ReportEntry | null {
  return (
    entries
      .filter(
        ({ report, byMember }) =>
          byMember &&
          report.boltId === boltId &&
          report.foundSound &&
          report.confirmed &&
          report.depth !== "seen",
      )
      .toSorted((a, b) => a.report.observedAt.getTime() - b.report.observedAt.getTime())
      .at(-1) ?? null
  );
}

/** Date of the last check that was at least handled; one of the whole anchor counts for each bolt. */
export function lastCheckOn(boltId: string, entries: readonly ReportEntry[]): string | null {
  return (
    entries
      .filter(
        ({ report }) =>
          report.kind === "routine_check" &&
          report.confirmed &&
          report.depth !== "seen" &&
          (report.boltId === boltId || (report.boltId === null && report.placementId === null)),
      )
      .map(({ report }) => report.observedAt.toISOString().slice(0, 10))
      .toSorted()
      .at(-1) ?? null
  );
}
