"use server";

import { revalidatePath } from "next/cache";
import { commandContext } from "@/lib/commands/context";
import { closeBatchWarning } from "@/lib/commands/stewarding/close-batch-warning";
import { publishBatchWarning } from "@/lib/commands/stewarding/publish-batch-warning";
import { action } from "@/lib/http/action";
import { formInput } from "@/lib/schemas/form-input";
import { batchWarningInput, closeWarningForm } from "@/lib/schemas/steward";

export const publishWarning = action(formInput(batchWarningInput), async ({ input, ...door }) => {
  const { anchorsHit } = await publishBatchWarning(commandContext(door), input);
  revalidatePath("/", "layout");
  return { anchorsHit };
});

export const closeWarning = action(closeWarningForm, async ({ input, ...door }) => {
  await closeBatchWarning(commandContext(door), input);
  revalidatePath("/", "layout");
});
