import type { Level, ReportKind } from "@/lib/domain/vocabulary";
import type { CareFacts, OpenReportFacts } from "@/lib/domain/finding/evidence";
import { isOutOfUseAtOnce } from "@/lib/domain/finding/out-of-use";
import { severity } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";

const LOOSE: readonly ReportKind[] = ["nut_loose", "hanger_spins", "stud_turns"];
const DEPTH = { seen: 0, handled: 1, torqued: 2, pulled: 3 } as const;

/**
 * care.report-open: the worst report nobody has answered yet.
 *
 * What takes a bolt out of use counts until it is answered. Everything else is ordered by when it was observed: a newer
 * routine check that found nothing, made at least as close up, supersedes it. A report through a tag without an
 * account is not proof: what would stop asks until a member confirms it. A missing bolt stops.
 */
export function careReportOpen(e: { care: CareFacts | null }): Finding | null {
  const reports = e.care?.openReports ?? [];
  const found = reports
    .filter((report) => lasts(report) || !isSuperseded(report, reports))
    .map((report) => ({ report, level: levelOf(report) }))
    .filter((one): one is typeof one & { level: Level } => one.level !== null)
    .sort(
      (a, b) =>
        severity(b.level) - severity(a.level) || a.report.observedAt.localeCompare(b.report.observedAt),
    );
  const [worst] = found;
  if (worst === undefined) return null;
  const { report, level } = worst;
  return {
    code: "care.report-open",
    level,
    title: TITLES[report.kind],
    text: `${seen(report)}${measured(report)}${found.length > 1 ? ` ${found.length - 1} more open.` : ""}`,
    clearsWhen:
      level === "ask"
        ? "a member confirms or answers the report"
        : "the report is answered: mended, replaced, or found wrong",
    numbers: {
      reportId: report.reportId,
      kind: report.kind,
      grade: report.grade,
      bendAngleDeg: report.bendAngleDeg,
      observedAt: report.observedAt,
      open: found.length,
    },
    assumed: [],
    source: {
      mark: "common_practice",
      name: "A report stands until it is answered; the worst component decides",
    },
  };
}

const TITLES: Readonly<Record<ReportKind, string>> = {
  routine_check: "Something found at a check",
  deformation: "Bend reported",
  corrosion: "Corrosion reported",
  nut_loose: "Loose nut reported",
  hanger_spins: "Spinning hanger reported",
  stud_turns: "Turning stud reported",
  glue_in_moves: "Moving glue-in reported",
  rock: "Rock damage reported",
  wear: "Wear reported",
  after_storm: "Storm or big load reported",
  missing: "Reported missing",
  not_in_register: "Report of something not in the register",
  other: "Open report",
};

/** Counts until answered, whatever was seen later. */
function lasts(report: OpenReportFacts): boolean {
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

function seen(report: OpenReportFacts): string {
  const by = report.confirmed ? "" : ", through a tag without an account and not confirmed";
  return `Observed on ${report.observedAt.slice(0, 10)} (${report.depth})${by}.`;
}

function measured(report: OpenReportFacts): string {
  const facts = [
    report.bendAngleDeg === null ? null : `bent by ${report.bendAngleDeg}°`,
    report.metalCracked === true ? "metal cracked" : null,
    report.crackNew === true ? "new crack in the rock" : null,
    report.crackMoves === true ? "crack moves" : null,
    report.soundsHollow === true ? "sounds hollow" : null,
    report.grade === null ? null : `grade ${report.grade} of 4`,
  ].filter((words) => words !== null);
  return facts.length === 0 ? "" : ` Found: ${facts.join(", ")}.`;
}
