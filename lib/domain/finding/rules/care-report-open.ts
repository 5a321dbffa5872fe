import type { ReportKind } from "@/lib/domain/vocabulary";
import type { CareFacts, OpenReportFacts } from "@/lib/domain/finding/evidence";
import { standingReports } from "@/lib/domain/finding/open-reports";
import type { Finding } from "@/lib/domain/finding/types";

/** care.report-open: the worst report nobody has answered yet; see `standingReports` for which ones count. */
export function careReportOpen(e: { care: CareFacts | null }): Finding | null {
  const found = standingReports(e.care?.openReports ?? []);
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
