import { type Actor, type Role, ROLES } from "@/lib/shared/actor";

/**
 * Every right in the product, with the least role that holds it in the subject's area.
 * `person`: anybody signed in. `admin`: administrators of the installation only.
 */
const LEAST_ROLE = {
  "report.file": "person",
  "watch.set": "person",
  "report.view-private": "rigger",
  "export.read": "rigger",
  "load-check.create": "rigger",
  "photo.add": "person",
  "anchor.create": "bolter",
  "anchor.edit": "bolter",
  "anchor.move": "bolter",
  "placement.create": "bolter",
  "span.create": "bolter",
  "span.edit": "bolter",
  "bolt.install": "bolter",
  "bolt.edit": "bolter",
  "pull-test.record": "bolter",
  "job.complete": "bolter",
  "queue.view": "bolter",
  "record.strike": "steward",
  "report.handle": "steward",
  "condition.decide": "steward",
  "service.return": "steward",
  "job.open": "steward",
  "job.decide": "steward",
  "job.assign": "steward",
  "warning.write": "steward",
  "closure.write": "steward",
  "policy.write": "steward",
  "site.edit": "steward",
  "people.manage": "steward",
  "mail.view-failed": "steward",
  "area.create": "admin",
  "catalogue.write": "admin",
} as const satisfies Record<string, Role | "person" | "admin">;

export type Action = keyof typeof LEAST_ROLE;

/** All actions, for tests that walk the whole matrix. */
export const ACTIONS: readonly Action[] = Object.keys(LEAST_ROLE).filter(
  (key): key is Action => key in LEAST_ROLE,
);

export interface Subject {
  /** The area the thing belongs to; null: it belongs to the installation (catalogue) or to no area yet. */
  areaId: string | null;
  /** For `job.complete`: bolters complete only what is assigned to them; stewards any. */
  assignedTo?: readonly string[];
}

/** Whether the actor may do it. Buttons ask out of courtesy, commands ask again. */
export function can(actor: Actor, action: Action, subject: Subject): boolean {
  if (actor.kind === "visitor") return false;
  if (actor.tokenScopes && !actor.tokenScopes.includes(neededScope(action))) return false;
  if (actor.isAdmin) return true;
  const least = LEAST_ROLE[action];
  if (least === "person") return true;
  if (least === "admin" || subject.areaId === null) return false;
  const role = actor.roles[subject.areaId];
  if (!role || ROLES.indexOf(role) < ROLES.indexOf(least)) return false;
  if (action === "job.complete" && role !== "steward" && subject.assignedTo) {
    return subject.assignedTo.includes(actor.userId);
  }
  return true;
}

function neededScope(action: Action) {
  if (action === "report.file" || action === "photo.add") return "report" as const;
  if (action === "report.view-private" || action === "export.read" || action === "queue.view")
    return "read" as const;
  return "write" as const;
}

/** The role the actor holds in an area; administrators count as stewards everywhere. */
export function roleIn(actor: Actor, areaId: string): Role | null {
  if (actor.kind === "visitor") return null;
  return actor.isAdmin ? "steward" : (actor.roles[areaId] ?? null);
}
