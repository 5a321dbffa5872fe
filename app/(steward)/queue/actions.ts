"use server";

import { revalidatePath } from "next/cache";
import { commandContext } from "@/lib/commands/context";
import { assignJob } from "@/lib/commands/rebolt/assign-job";
import { completeJob } from "@/lib/commands/rebolt/complete-job";
import { decideJob } from "@/lib/commands/rebolt/decide-job";
import { moveJob } from "@/lib/commands/rebolt/move-job";
import { recordHandCheck } from "@/lib/commands/record-hand-check";
import { returnToService } from "@/lib/commands/return-to-service";
import { action } from "@/lib/http/action";
import { formInput } from "@/lib/schemas/form-input";
import { assignJobForm, completeJobForm, decideJobForm, moveJobForm } from "@/lib/schemas/rebolt";
import { handCheckInput, returnToServiceInput } from "@/lib/schemas/report";

export const decide = action(decideJobForm, async ({ input: { id, version, ...input }, ...door }) => {
  await decideJob(commandContext(door), { id, version }, { action: "decide", ...input });
  revalidatePath("/", "layout");
});

export const assign = action(assignJobForm, async ({ input: { id, version, userIds }, ...door }) => {
  await assignJob(commandContext(door), { id, version }, { action: "assign", userIds });
  revalidatePath("/", "layout");
});

export const move = action(moveJobForm, async ({ input: { id, version, ...input }, ...door }) => {
  await moveJob(commandContext(door), { id, version }, { action: "move", ...input });
  revalidatePath("/", "layout");
});

export const complete = action(completeJobForm, async ({ input: { id, version, ...input }, ...door }) => {
  await completeJob(commandContext(door), { id, version }, { action: "complete", ...input });
  revalidatePath("/", "layout");
});

export const checkByHand = action(
  formInput(handCheckInput),
  async ({ input, ...door }) => {
    const { id } = await recordHandCheck(commandContext(door), input);
    return { id };
  },
  { limit: "report-person" },
);

export const putBack = action(formInput(returnToServiceInput), async ({ input, ...door }) => {
  const done = await returnToService(commandContext(door), input);
  revalidatePath("/", "layout");
  return done;
});
