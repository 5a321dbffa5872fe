import { Fact, Facts } from "@/components/ui/facts";
import { Quantity } from "@/components/ui/quantity";
import { type Measurement, REPORT_MEASUREMENTS } from "@/lib/domain/report/report-measurements";
import type { ReportView } from "@/lib/schemas/views/register";

/** What was measured, with the names and units it was asked for under. Nothing measured is said too. */
export function MeasuredFacts({ report }: { report: Pick<ReportView, "kind" | "measured" | "grade"> }) {
  const asked = REPORT_MEASUREMENTS[report.kind].filter(({ key }) => isGiven(report.measured[key]));
  if (asked.length === 0 && report.grade === null) {
    return <p className="text-muted">Nothing was measured.</p>;
  }
  return (
    <Facts>
      {asked.map((measurement) => (
        <Fact key={measurement.key} name={measurement.label}>
          <Measured measurement={measurement} value={report.measured[measurement.key] ?? null} />
        </Fact>
      ))}
      {report.grade === null ? null : (
        <Fact name="Grade of the worst part">
          <span className="type-figure">{report.grade}</span> of 4: {GRADES[report.grade] ?? "not known"}
        </Fact>
      )}
    </Facts>
  );
}

const GRADES: readonly string[] = [
  "as new",
  "slight, no effect",
  "clear, watch it",
  "serious",
  "failed or about to",
];

function Measured({
  measurement,
  value,
}: {
  measurement: Measurement;
  value: number | string | boolean | null;
}) {
  if (typeof value === "boolean") return value ? "yes" : "no";
  if (typeof value === "number" && measurement.type === "number") {
    return <Quantity value={value} unit={measurement.unit} digits={measurement.whole ? 0 : undefined} />;
  }
  return value;
}

function isGiven(value: unknown): boolean {
  return value !== undefined && value !== null;
}
