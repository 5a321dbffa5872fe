"use server";

import { limitRate } from "@/lib/auth/rate-limit";
import { acceptInvitation } from "@/lib/commands/account/accept-invitation";
import { enterDemo } from "@/lib/commands/account/enter-demo";
import { makeFirstAdministrator } from "@/lib/commands/account/make-first-administrator";
import { requestPasswordReset, requestSignInLink } from "@/lib/commands/account/request-sign-in-link";
import { resetPassword } from "@/lib/commands/account/set-password";
import { commandContext } from "@/lib/commands/context";
import { action } from "@/lib/http/action";
import {
  acceptInvitationInput,
  emailOnly,
  firstAdministratorInput,
  resetPasswordInput,
} from "@/lib/schemas/account";

const asksForMail = { signedIn: false, limit: "link-address" } as const;
const holdsLink = { signedIn: false, limit: "sign-in-address" } as const;

export const askForLink = action(
  emailOnly,
  async ({ input, ...door }) => {
    await limitRate("link-person", input.email);
    await requestSignInLink(commandContext(door), input);
    return input;
  },
  asksForMail,
);

export const askForReset = action(
  emailOnly,
  async ({ input, ...door }) => {
    await limitRate("link-person", input.email);
    await requestPasswordReset(commandContext(door), input);
    return input;
  },
  asksForMail,
);

export const setNewPassword = action(
  resetPasswordInput,
  ({ input, ...door }) => resetPassword(commandContext(door), input),
  holdsLink,
);

export const joinArea = action(
  acceptInvitationInput,
  ({ input, ...door }) => acceptInvitation(commandContext(door), input),
  holdsLink,
);

export const becomeAdministrator = action(
  firstAdministratorInput,
  ({ input, ...door }) => makeFirstAdministrator(commandContext(door), input),
  holdsLink,
);

export const enterAsDemoPerson = action(
  emailOnly,
  ({ input, ...door }) => enterDemo(commandContext(door), input),
  holdsLink,
);
