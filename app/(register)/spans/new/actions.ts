"use server";

import { revalidatePath } from "next/cache";
import { commandContext } from "@/lib/commands/context";
import { createSpan } from "@/lib/commands/create-span";
import { action } from "@/lib/http/action";
import { createSpanInput } from "@/lib/schemas/anchor";
import { formInput } from "@/lib/schemas/form-input";

export const registerSpan = action(formInput(createSpanInput), async ({ input, ...door }) => {
  const { id } = await createSpan(commandContext(door), input);
  revalidatePath("/", "layout");
  return { id };
});
