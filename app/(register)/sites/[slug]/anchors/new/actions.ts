"use server";

import { revalidatePath } from "next/cache";
import { commandContext } from "@/lib/commands/context";
import { createAnchor } from "@/lib/commands/create-anchor";
import { action } from "@/lib/http/action";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";
import { createAnchorInput } from "@/lib/schemas/anchor";
import { formInput } from "@/lib/schemas/form-input";

export const registerAnchor = action(formInput(createAnchorInput), async ({ input, actor, ...door }) => {
  const { id } = await createAnchor(commandContext({ actor, ...door }), input);
  revalidatePath("/", "layout");
  return { code: (await getAnchorSheet(actor, { id })).code };
});
