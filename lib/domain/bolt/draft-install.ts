import type { Form, Method } from "@/lib/domain/vocabulary";
import type { FieldProblem } from "@/lib/shared/errors";

/** What is said about an install, as far as the checks need it. */
export interface InstallFactsToCheck {
  form?: Form | undefined;
  method?: Method | null | undefined;
  adhesiveId?: string | null | undefined;
  installedOn?: string | null | undefined;
  recheckDueOn?: string | null | undefined;
}

export interface InstallSurroundings {
  /** The catalogue type; null: none was named. */
  type: { name: string; form: Form; allowedMethods: readonly Method[] } | null;
  /** Date the bolt that stands in the hole was set; null: no bolt, or not known. */
  formerInstalledOn: string | null;
  /** The day it is at the place. */
  today: string;
}

const GLUED_FORMS: readonly Form[] = ["glued_stud_hanger", "glued_bent_rod", "glued_eye"];

/** Set with glue, by its build or its method. */
export function isSetWithGlue(form: Form, method: Method | null | undefined): boolean {
  return GLUED_FORMS.includes(form) || (typeof method === "string" && method !== "mechanical");
}

/** The build of the bolt, from its type or as described; null when neither says. */
export function formOf(facts: InstallFactsToCheck, type: InstallSurroundings["type"]): Form | null {
  return type?.form ?? facts.form ?? null;
}

/** What cannot be about an install or a correction of one; every problem with the path of its field. */
export function installProblems(facts: InstallFactsToCheck, around: InstallSurroundings): FieldProblem[] {
  const { type, formerInstalledOn, today } = around;
  const { method, adhesiveId, installedOn } = facts;
  const form = formOf(facts, type);
  const problem = (path: string, message: string, when: boolean) => (when ? [{ path, message }] : []);
  return [
    ...problem("boltTypeId", "Choose a type, or say what it looks like.", form === null),
    ...problem(
      "form",
      "The chosen type looks different: leave this out or choose another type.",
      type !== null && facts.form !== undefined && facts.form !== type.form,
    ),
    ...problem(
      "method",
      `${type?.name ?? "This type"} is not set this way.`,
      type !== null && !!method && type.allowedMethods.length > 0 && !type.allowedMethods.includes(method),
    ),
    ...problem(
      "method",
      "A glued build is not set mechanically.",
      form !== null && GLUED_FORMS.includes(form) && method === "mechanical",
    ),
    ...problem("adhesiveId", "A mechanical bolt has no glue.", method === "mechanical" && !!adhesiveId),
    ...problem("installedOn", "This lies in the future.", !!installedOn && installedOn > today),
    ...problem(
      "installedOn",
      `The bolt it replaces was set on ${formerInstalledOn}.`,
      !!installedOn && formerInstalledOn !== null && installedOn < formerInstalledOn,
    ),
  ];
}
