import type { OpenReportFacts } from "@/lib/domain/finding/evidence";
import type { MeasuredValue } from "@/lib/domain/report/draft-report";

/**
 * A stored report as the rules want it: the measurements that decide, by name. The rust grade counts as a
 * grade.
 */
export function reportFacts(
  report: Pick<OpenReportFacts, "reportId" | "kind" | "depth" | "observedAt" | "grade" | "confirmed"> & {
    measured: Readonly<Record<string, MeasuredValue>>;
  },
): OpenReportFacts {
  const { measured, ...rest } = report;
  const number = (key: string) => (typeof measured[key] === "number" ? measured[key] : null);
  const yes = (key: string) => (typeof measured[key] === "boolean" ? measured[key] : null);
  const grades = [report.grade, number("rustGrade")].filter((grade) => grade !== null);
  return {
    ...rest,
    grade: grades.length === 0 ? null : Math.max(...grades),
    bendAngleDeg: number("bendAngleDeg"),
    crackMoves: yes("crackMoves"),
    crackNew: yes("crackNew"),
    soundsHollow: yes("soundsHollow"),
    metalCracked: yes("metalCracked"),
  };
}
