import "server-only";
import { requirePerson } from "@/lib/commands/writing/authorize";
import type { Actor, Person } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

/** The person at the keyboard: a program with a token may not change the account it belongs to. */
export function requireSelf(actor: Actor): Person {
  const person = requirePerson(actor);
  if (person.tokenScopes) throw new AppError("forbidden", "A token cannot change an account.");
  return person;
}
