import type { FieldProblem } from "@/lib/shared/errors";
import type { Depth, Form, ReportKind } from "@/lib/domain/vocabulary";
import { isOutOfUseAtOnce } from "@/lib/domain/finding/out-of-use";
import type { Measurement } from "@/lib/domain/report/report-measurements";
import { REPORT_MEASUREMENTS } from "@/lib/domain/report/report-measurements";

export type MeasuredValue = number | string | boolean | null;

export interface ReportInput {
  kind: ReportKind;
  depth: Depth;
  /** UTC instant. */
  observedAt: string;
  measured: Readonly<Record<string, MeasuredValue>>;
  /** Worst component grade, 0-4; null: not graded. */
  grade: number | null;
}

/** What is known of the thing the report is about. */
export interface ReportTarget {
  anchorId: string | null;
  /** The report names a point of its own. */
  hasPoint: boolean;
  /** Build of the bolt it is about; null: not about one bolt. */
  form: Form | null;
  /** Diameter when new of the bolt or fitting; null: not known. */
  nominalDiameterMm: number | null;
}

export interface ReportDraft extends ReportInput {
  /** Takes the bolt and its anchor out of use the moment it is filed, when the reporter has an account. */
  outOfUseAtOnce: boolean;
  /** A check by hand that found nothing: evidence for putting back in service. */
  foundSound: boolean;
}

export type DraftResult = { ok: true; draft: ReportDraft } | { ok: false; problems: readonly FieldProblem[] };

/** A clock that runs ahead by this much is no lie. */
const CLOCK_SLACK_MS = 10 * 60_000;
/** Nobody reports what was seen before drilled bolts were in use. */
const EARLIEST = "1950-01-01";
/** Builds that have a hanger, and a nut or head that can be turned. */

const WITH_HANGER: readonly Form[] = [
  "expansion_stud_hanger",
  "glued_stud_hanger",
  "sleeve_hanger",
  "screw_hanger",
];
const GLUED: readonly Form[] = ["glued_stud_hanger", "glued_bent_rod", "glued_eye"];

/** Refuses what cannot be and completes what can; all problems at once, each with the path of its field. */
export function draftReport(input: ReportInput, target: ReportTarget, now: string): DraftResult {
  const problems = [
    ...whenProblems(input.observedAt, now),
    ...gradeProblems(input.grade),
    ...measuredProblems(input),
    ...targetProblems(input, target),
  ];
  if (problems.length > 0) return { ok: false, problems };

  const measured = Object.fromEntries(Object.entries(input.measured).filter(([, value]) => value !== null));
  const yes = (key: string) => (typeof measured[key] === "boolean" ? measured[key] : null);
  const angle = measured["bendAngleDeg"];
  const outOfUseAtOnce = isOutOfUseAtOnce({
    kind: input.kind,
    bendAngleDeg: typeof angle === "number" ? angle : null,
    metalCracked: yes("metalCracked"),
    crackNew: yes("crackNew"),
    crackMoves: yes("crackMoves"),
    soundsHollow: yes("soundsHollow"),
  });
  const foundSound = input.kind === "routine_check" && input.grade === 0 && input.depth !== "seen";
  return { ok: true, draft: { ...input, measured, outOfUseAtOnce, foundSound } };
}

function problem(path: string, message: string): FieldProblem {
  return { path, message };
}

function whenProblems(observedAt: string, now: string): FieldProblem[] {
  const at = new Date(observedAt).getTime();
  if (Number.isNaN(at)) return [problem("observedAt", "This is not a time.")];
  if (at > new Date(now).getTime() + CLOCK_SLACK_MS)
    return [problem("observedAt", "This lies in the future.")];
  return at < new Date(EARLIEST).getTime() ? [problem("observedAt", `This lies before ${EARLIEST}.`)] : [];
}

function gradeProblems(grade: number | null): FieldProblem[] {
  const fits = grade === null || (Number.isInteger(grade) && grade >= 0 && grade <= 4);
  return fits ? [] : [problem("grade", "A grade is 0, 1, 2, 3 or 4.")];
}

function measuredProblems({ kind, measured }: ReportInput): FieldProblem[] {
  const asked = REPORT_MEASUREMENTS[kind];
  return Object.entries(measured).flatMap(([key, value]) => {
    const path = `measured.${key}`;
    const measurement = asked.find((one) => one.key === key);
    if (measurement === undefined) return [problem(path, "This kind of report does not ask for it.")];
    const message = value === null ? null : valueProblem(measurement, value);
    return message === null ? [] : [problem(path, message)];
  });
}

function valueProblem(measurement: Measurement, value: Exclude<MeasuredValue, null>): string | null {
  switch (measurement.type) {
    case "yes_no":
      return typeof value === "boolean" ? null : "Yes or no is wanted here.";
    case "choice":
      return typeof value === "string" && measurement.options.includes(value)
        ? null
        : `One of ${measurement.options.join(", ")} is wanted here.`;
    case "number": {
      const { min, max, unit, whole } = measurement;
      if (typeof value !== "number" || !Number.isFinite(value)) return "A number is wanted here.";
      if (value < min || value > max) return `Between ${min} and ${max} ${unit} is possible.`;
      return whole && !Number.isInteger(value) ? "A whole number is wanted here." : null;
    }
  }
}

function targetProblems({ kind, depth, measured }: ReportInput, target: ReportTarget): FieldProblem[] {
  const { form, nominalDiameterMm } = target;
  const left = measured["diameterLeftMm"];
  return [
    target.anchorId === null && !target.hasPoint
      ? problem("anchorId", "Say where: an anchor or a point on the map.")
      : null,
    kind === "not_in_register" && !target.hasPoint
      ? problem("point", "Say where it is: a point on the map.")
      : null,
    kind === "glue_in_moves" && form !== null && !GLUED.includes(form)
      ? problem("kind", "This bolt is not glued in.")
      : null,
    (kind === "nut_loose" || kind === "stud_turns") && form !== null && !WITH_HANGER.includes(form)
      ? problem("kind", "This bolt has no nut or stud to turn.")
      : null,
    kind === "hanger_spins" && form !== null && !WITH_HANGER.includes(form)
      ? problem("kind", "This bolt has no hanger.")
      : null,
    depth === "torqued" && form !== null && !WITH_HANGER.includes(form)
      ? problem("depth", "This bolt has nothing to put a torque wrench on.")
      : null,
    kind === "deformation" && measured["bendAngleDeg"] === 0
      ? problem("measured.bendAngleDeg", "0° is no bend: file a routine check.")
      : null,
    typeof left === "number" && nominalDiameterMm !== null && left > nominalDiameterMm
      ? problem("measured.diameterLeftMm", `It was ${nominalDiameterMm} mm when new.`)
      : null,
  ].filter((one) => one !== null);
}
