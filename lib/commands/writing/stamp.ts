import "server-only";
import type { Person } from "@/lib/shared/actor";

/** Who made a record and when, for its audit columns. */
export function createdBy(person: Person | null, now: Date) {
  const userId = person?.userId ?? null;
  return { createdAt: now, createdBy: userId, updatedAt: now, updatedBy: userId };
}

/** Who changes a record and when. */
export function by(person: Person, now: Date): { userId: string; now: Date } {
  return { userId: person.userId, now };
}

/** The fields of a record that a change touches, as they were: for the audit trail. */
export function before<T extends object>(stored: T, change: object): Record<string, unknown> {
  const touched = new Set(Object.keys(change));
  return Object.fromEntries(Object.entries(stored).filter(([key]) => touched.has(key)));
}
