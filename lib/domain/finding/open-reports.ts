import type { Level, ReportKind } from "@/lib/domain/vocabulary";
import type { OpenReportFacts } from "@/lib/domain/finding/evidence";
import { isOutOfUseAtOnce } from "@/lib/domain/finding/out-of-use";
import { severity } from "@/lib/domain/finding/traits";

const LOOSE: readonly ReportKind[] = ["nut_loose", "hanger_spins", "stud_turns"];
const DEPTH = { seen: 0, handled: 1, torqued: 2, pulled: 3 } as const;

/** A report that still counts, with the level it weighs. */
export interface StandingReport {
  report: OpenReportFacts;
  level: Level;
}

/**
 * The open reports that count, worst first, older first among equals.
 *
 * What takes a bolt out of use, and a bolt reported missing, counts until it is answered. Everything else
 * is ordered by when it was observed: a newer routine check that found nothing, made at least as close up,
 * supersedes it. A report through a tag without an account is not proof: what would stop asks until a
 * member confirms it.
 */
export function standingReports(reports: readonly OpenReportFacts[]): readonly StandingReport[] {
  return reports
    .filter((report) => lasts(report) || !isSuperseded(report, reports))
    .flatMap((report) => {
      const level = levelOf(report);
      return level === null ? [] : [{ report, level }];
    })
    .sort(
      (a, b) =>
        severity(b.level) - severity(a.level) || a.report.observedAt.localeCompare(b.report.observedAt),
    );
}

/** Counts until answered, whatever was seen later. */
export function lasts(report: OpenReportFacts): boolean {
  return isOutOfUseAtOnce(report) || report.kind === "missing";
}

function isSuperseded(report: OpenReportFacts, all: readonly OpenReportFacts[]): boolean {
  return all.some(
    (newer) =>
      newer.kind === "routine_check" &&
      newer.grade === 0 &&
      newer.confirmed &&
      newer.observedAt > report.observedAt &&
      DEPTH[newer.depth] >= DEPTH[report.depth],
  );
}

function levelOf(report: OpenReportFacts): Level | null {
  const level = levelIfTrue(report);
  return level === "stop" && !report.confirmed ? "ask" : level;
}

function levelIfTrue(report: OpenReportFacts): Level | null {
  if (lasts(report) || report.grade === 4) return "stop";
  if (report.grade === 3 || LOOSE.includes(report.kind)) return "limit";
  if (report.grade === 0) return null;
  return report.kind === "routine_check" && report.grade === null ? null : "note";
}
