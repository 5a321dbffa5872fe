"use server";

import { revalidatePath } from "next/cache";
import { commandContext } from "@/lib/commands/context";
import { openReboltJob } from "@/lib/commands/open-rebolt-job";
import { action } from "@/lib/http/action";
import { formInput } from "@/lib/schemas/form-input";
import { openReboltJobInput } from "@/lib/schemas/rebolt";

export const openRebolt = action(formInput(openReboltJobInput), async ({ input, ...door }) => {
  const { id } = await openReboltJob(commandContext(door), input);
  revalidatePath("/", "layout");
  return { id };
});
