import type { OpenReportFacts } from "@/lib/domain/finding/evidence";

/**
 * Whether what a report says takes the bolt and its anchor out of use the moment it is filed: a permanent
 * bend, a moving glue-in, cracked metal, or a new, moving or hollow rock crack. A deformation whose angle
 * was not measured counts as a bend. Who may do so at once (`confirmed`) is for the caller: an unconfirmed
 * one means "check first".
 */
export function isOutOfUseAtOnce(
  report: Pick<
    OpenReportFacts,
    "kind" | "bendAngleDeg" | "metalCracked" | "crackNew" | "crackMoves" | "soundsHollow"
  >,
): boolean {
  if (report.metalCracked === true || report.kind === "glue_in_moves") return true;
  if (report.kind === "deformation") return report.bendAngleDeg === null || report.bendAngleDeg > 0;
  if (report.bendAngleDeg !== null && report.bendAngleDeg > 0) return true;
  if (report.kind !== "rock") return false;
  return report.crackNew === true || report.crackMoves === true || report.soundsHollow === true;
}
