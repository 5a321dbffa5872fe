"use server";

import { revalidatePath } from "next/cache";
import { changeRole } from "@/lib/commands/account/change-role";
import { inviteMember } from "@/lib/commands/account/invite-member";
import { removeMember } from "@/lib/commands/account/remove-member";
import { revokeInvitation } from "@/lib/commands/account/revoke-invitation";
import { commandContext } from "@/lib/commands/context";
import { action } from "@/lib/http/action";
import { changeRoleInput, idOnly, inviteInput, removeMemberInput } from "@/lib/schemas/account";

export const invite = action(
  inviteInput,
  async ({ input, ...door }) => {
    await inviteMember(commandContext(door), input);
    revalidatePath("/people");
    return { email: input.email };
  },
  { limit: "invite-person" },
);

export const takeInvitationBack = action(idOnly, async ({ input, ...door }) => {
  await revokeInvitation(commandContext(door), input);
  revalidatePath("/people");
});

export const giveRole = action(changeRoleInput, async ({ input, ...door }) => {
  await changeRole(commandContext(door), input);
  revalidatePath("/people");
});

export const endMembership = action(removeMemberInput, async ({ input, ...door }) => {
  await removeMember(commandContext(door), input);
  revalidatePath("/people");
});
