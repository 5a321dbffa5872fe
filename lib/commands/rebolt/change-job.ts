import "server-only";
import type { CommandContext } from "@/lib/commands/context";
import { assignJob } from "@/lib/commands/rebolt/assign-job";
import { completeJob } from "@/lib/commands/rebolt/complete-job";
import { decideJob } from "@/lib/commands/rebolt/decide-job";
import { moveJob } from "@/lib/commands/rebolt/move-job";
import type { JobRef } from "@/lib/commands/rebolt/on-job";
import type { JobActionInput } from "@/lib/schemas/rebolt";

/** Whatever may be done with an entry of the queue, by the name of the action. */
export function changeJob(
  ctx: CommandContext,
  ref: JobRef,
  input: JobActionInput,
): Promise<{ id: string; version: number }> {
  switch (input.action) {
    case "decide":
      return decideJob(ctx, ref, input);
    case "assign":
      return assignJob(ctx, ref, input);
    case "move":
      return moveJob(ctx, ref, input);
    case "complete":
      return completeJob(ctx, ref, input);
  }
}
