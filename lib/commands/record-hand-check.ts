import "server-only";
import type { CommandContext } from "@/lib/commands/context";
import { type FiledReport, fileReport } from "@/lib/commands/file-report";
import type { HandCheckInput } from "@/lib/schemas/report";

/** A check by hand of one bolt that found nothing: a routine check, graded 0. Photos are added to it afterwards. */
export function recordHandCheck(ctx: CommandContext, input: HandCheckInput): Promise<FiledReport> {
  return fileReport(ctx, { ...input, kind: "routine_check", grade: 0, measured: {} });
}
