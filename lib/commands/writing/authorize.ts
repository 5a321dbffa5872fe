import "server-only";
import { type Action, can, type Subject } from "@/lib/policy/can";
import type { Actor, Person } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

/** @throws AppError `not_signed_in` for a visitor, `forbidden` without the right. */
export function authorize(actor: Actor, action: Action, subject: Subject): Person {
  const person = requirePerson(actor);
  if (!can(person, action, subject)) {
    throw new AppError("forbidden", "Your role in this area does not allow this.", {
      detail: `${action} in ${subject.areaId ?? "the installation"}`,
    });
  }
  return person;
}

/** @throws AppError `not_signed_in` */
export function requirePerson(actor: Actor): Person {
  if (actor.kind === "visitor") throw new AppError("not_signed_in", "Sign in first.");
  return actor;
}
