import "server-only";
import type { RevisionView } from "@/lib/schemas/views/anchor";

interface EventRow {
  at: Date;
  actorName: string;
  summary: string;
  reason: string | null;
}

/** The revision table of a sheet: its events in order, lettered A, B … Z, AA, newest last. */
export function revisionsOf(events: readonly EventRow[]): RevisionView[] {
  return events.map((event, index) => ({
    letter: revisionLetter(index),
    at: event.at.toISOString(),
    by: event.actorName,
    summary: event.summary,
    reason: event.reason,
  }));
}

/** 0 → A, 23 → Z, 24 → AA. I and O are left out, as in drawing practice: they read as digits. */
export function revisionLetter(index: number): string {
  const letters = "ABCDEFGHJKLMNPQRSTUVWXYZ";
  const rest = Math.floor(index / letters.length);
  const letter = letters[index % letters.length] ?? "A";
  return rest === 0 ? letter : revisionLetter(rest - 1) + letter;
}
