"use server";

import { revalidatePath } from "next/cache";
import { commandContext } from "@/lib/commands/context";
import { liftClosure as lift } from "@/lib/commands/stewarding/lift-closure";
import { writeClosure } from "@/lib/commands/stewarding/write-closure";
import { action } from "@/lib/http/action";
import { formInput } from "@/lib/schemas/form-input";
import { closureInput, liftClosureForm } from "@/lib/schemas/steward";

export const addClosure = action(formInput(closureInput), async ({ input, ...door }) => {
  const { id } = await writeClosure(commandContext(door), input);
  revalidatePath("/", "layout");
  return { id };
});

export const liftClosure = action(liftClosureForm, async ({ input, ...door }) => {
  await lift(commandContext(door), input);
  revalidatePath("/", "layout");
});
