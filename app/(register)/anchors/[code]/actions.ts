"use server";

import { commandContext } from "@/lib/commands/context";
import { setWatch } from "@/lib/commands/set-watch";
import { action } from "@/lib/http/action";
import { formInput } from "@/lib/schemas/form-input";
import { watchInput } from "@/lib/schemas/steward";

export const followAnchor = action(formInput(watchInput), async ({ input, ...door }) => {
  await setWatch(commandContext(door), input);
  return { on: input.on };
});
