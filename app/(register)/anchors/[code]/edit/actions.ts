"use server";

import { revalidatePath } from "next/cache";
import { addPlacement } from "@/lib/commands/add-placement";
import { commandContext } from "@/lib/commands/context";
import { moveAnchor } from "@/lib/commands/move-anchor";
import { updateAnchor } from "@/lib/commands/update-anchor";
import { action } from "@/lib/http/action";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";
import { addPlacementInput, changeAnchorForm, moveAnchorForm } from "@/lib/schemas/anchor";
import { changedFacts } from "@/lib/schemas/anchor-facts";
import { formInput } from "@/lib/schemas/form-input";
import { AppError } from "@/lib/shared/errors";

export const changeAnchor = action(
  changeAnchorForm,
  async ({ input: { id, version, ...facts }, actor, ...door }) => {
    const sheet = await getAnchorSheet(actor, { id });
    const change = changedFacts(sheet, facts);
    if (Object.keys(change).length === 0 && sheet.version === version)
      throw new AppError("invalid_input", "Nothing differs from what is stored.");
    await updateAnchor(commandContext({ actor, ...door }), { id, version, change });
    revalidatePath("/", "layout");
  },
);

export const relocateAnchor = action(moveAnchorForm, async ({ input: { id, version, ...move }, ...door }) => {
  await moveAnchor(commandContext(door), { id, version, move });
  revalidatePath("/", "layout");
});

export const addNatural = action(formInput(addPlacementInput), async ({ input, ...door }) => {
  const { number } = await addPlacement(commandContext(door), input);
  revalidatePath("/", "layout");
  return { number };
});
