"use server";

import { revalidatePath } from "next/cache";
import { commandContext } from "@/lib/commands/context";
import { openReboltJob } from "@/lib/commands/open-rebolt-job";
import { action } from "@/lib/http/action";
import { openReboltJobForm } from "@/lib/schemas/rebolt";

export const openRebolt = action(openReboltJobForm, async ({ input, ...door }) => {
  const { id } = await openReboltJob(commandContext(door), input);
  revalidatePath("/", "layout");
  return { id };
});
