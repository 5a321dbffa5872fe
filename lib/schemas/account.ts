import { z } from "zod";
import { ROLES, TOKEN_SCOPES } from "@/lib/shared/actor";

/** An address is kept and compared in lower case. */
const email = z
  .string("Write an e-mail address.")
  .trim()
  .toLowerCase()
  .max(254, "That is too long for an e-mail address.")
  .pipe(z.email("This does not look like an e-mail address."));

const name = z
  .string("Write a name.")
  .trim()
  .min(1, "Write a name.")
  .max(80, "A name has 80 characters at most.")
  .regex(/^[^\p{Cc}]*$/u, "A name is one line of text.");

const MIN_PASSWORD = 10;

/** Length is what counts; no rules about kinds of characters. */
const newPassword = z
  .string("Choose a password.")
  .min(MIN_PASSWORD, `A password has at least ${MIN_PASSWORD} characters.`)
  .max(200, "A password has 200 characters at most.");

/** The secret of a mailed or printed link. */
const secret = z.string().regex(/^[\w-]{20,100}$/, "This link is not complete. Open it again from the mail.");
const id = z.uuid();
const role = z.enum(ROLES, "Choose a role.");
const version = z.coerce.number().int().positive();

export const emailOnly = z.object({ email });
export const idOnly = z.object({ id });
export const nothingSent = z.object({});

export const renameInput = z.object({ name });

/** `current` is empty for somebody who has no password yet. */
export const changePasswordInput = z.object({
  current: z.string().max(200).default(""),
  password: newPassword,
});
export const resetPasswordInput = z.object({ secret, password: newPassword });

export const inviteInput = z.object({ id, areaId: id, email, role });

/** Name and password are for people who have no account yet; an empty password means: sign in by link. */
export const acceptInvitationInput = z.object({
  secret,
  name: z.literal("").or(name).optional(),
  password: z.literal("").or(newPassword).optional(),
});

export const changeRoleInput = z.object({ areaId: id, userId: id, role, version });
export const removeMemberInput = z.object({ areaId: id, userId: id });

/** Days until the token ends; null: until it is revoked. */
export const createTokenInput = z.object({
  id,
  name: z.string("Name the token.").trim().min(1, "Name the token.").max(60, "60 characters at most."),
  scopes: z.array(z.enum(TOKEN_SCOPES), "Choose what it may do.").min(1, "Choose what it may do."),
  expiresInDays: z
    .enum(["30", "90", "365", "never"], "Choose how long it works.")
    .transform((days) => (days === "never" ? null : Number(days))),
});

export const firstAdministratorInput = z.object({ secret, name, email, password: newPassword });

export type InviteInput = z.output<typeof inviteInput>;
export type AcceptInvitationInput = z.output<typeof acceptInvitationInput>;
export type ChangeRoleInput = z.output<typeof changeRoleInput>;
export type CreateTokenInput = z.output<typeof createTokenInput>;
export type FirstAdministratorInput = z.output<typeof firstAdministratorInput>;
