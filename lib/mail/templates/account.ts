import "server-only";
import { compose, pageUrl } from "@/lib/mail/compose";
import type { Mail } from "@/lib/mail/mail";
import type { Role } from "@/lib/shared/actor";

const NOT_YOU = "If you did not ask for this, do nothing: without the link nothing happens.";

export function signInMail({ secret, minutes }: { secret: string; minutes: number }): Mail {
  return compose({
    kind: "sign_in",
    subject: "Your link to sign in to Byssus",
    text: ["Open this link and press the button to sign in:"],
    link: pageUrl("/sign-in/link", { secret }),
    after: [`It works once, for ${minutes} minutes. ${NOT_YOU}`],
  });
}

export function resetPasswordMail({ secret, minutes }: { secret: string; minutes: number }): Mail {
  return compose({
    kind: "reset_password",
    subject: "Set a new password for Byssus",
    text: ["Open this link to choose a new password:"],
    link: pageUrl("/reset", { secret }),
    after: [`It works once, for ${minutes} minutes. ${NOT_YOU}`],
  });
}

export function passwordChangedMail(): Mail {
  return compose({
    kind: "password_changed",
    subject: "Your Byssus password was changed",
    text: [
      "The password of your account was just changed, and you were signed out on every other device.",
      "If that was not you, set a new one now:",
    ],
    link: pageUrl("/forgot"),
  });
}

export function invitationMail(invitation: {
  secret: string;
  areaName: string;
  role: Role;
  invitedBy: string;
  days: number;
}): Mail {
  const { secret, areaName, role, invitedBy, days } = invitation;
  return compose({
    kind: "invitation",
    subject: `Invitation to ${areaName}`,
    text: [
      `${invitedBy} invites you to ${areaName} as a ${role}.`,
      ROLE_MEANS[role],
      "Open this link to accept:",
    ],
    link: pageUrl(`/invitation/${secret}`),
    after: [`It works once, for ${days} days. If you do not want to join, do nothing.`],
  });
}

export function roleChangedMail({ areaName, role }: { areaName: string; role: Role }): Mail {
  return compose({
    kind: "role_changed",
    subject: `You are now a ${role} in ${areaName}`,
    text: [`Your role in ${areaName} was changed to ${role}.`, ROLE_MEANS[role]],
    link: pageUrl("/"),
  });
}

export function membershipEndedMail({ areaName }: { areaName: string }): Mail {
  return compose({
    kind: "membership_ended",
    subject: `You are no longer a member of ${areaName}`,
    text: [
      `Your membership in ${areaName} has ended. What you recorded stays in the register under your name.`,
      "You can still read the public part and report what you see.",
    ],
    link: pageUrl("/"),
  });
}

const ROLE_MEANS: Record<Role, string> = {
  rigger: "A rigger sees every site of the area, reads and prints anchor sheets and reports what they saw.",
  bolter: "A bolter also logs installs, adds and corrects anchors, and does rebolt jobs.",
  steward:
    "A steward also runs the rebolt queue, decides conditions, answers reports and says who belongs to the area.",
};
