"use server";

import { revalidatePath } from "next/cache";
import { createApiToken, revokeApiToken } from "@/lib/commands/account/api-tokens";
import { renameAccount } from "@/lib/commands/account/rename-account";
import { changePassword } from "@/lib/commands/account/set-password";
import { signOutEverywhere } from "@/lib/commands/account/sign-out-everywhere";
import { commandContext } from "@/lib/commands/context";
import { action } from "@/lib/http/action";
import {
  changePasswordInput,
  createTokenInput,
  idOnly,
  nothingSent,
  renameInput,
} from "@/lib/schemas/account";

export const saveName = action(renameInput, async ({ input, ...door }) => {
  await renameAccount(commandContext(door), input);
  revalidatePath("/", "layout");
});

/** A wrong current password counts like a wrong password at the door. */
export const savePassword = action(
  changePasswordInput,
  ({ input, ...door }) => changePassword(commandContext(door), input),
  { limit: "sign-in-person" },
);

export const endAllSessions = action(nothingSent, (door) => signOutEverywhere(commandContext(door)));

export const makeToken = action(createTokenInput, async ({ input, ...door }) => {
  const made = await createApiToken(commandContext(door), input);
  revalidatePath("/settings");
  return made;
});

export const endToken = action(idOnly, async ({ input, ...door }) => {
  await revokeApiToken(commandContext(door), input);
  revalidatePath("/settings");
});
