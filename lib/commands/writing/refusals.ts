import "server-only";
import { AppError, type FieldProblem } from "@/lib/shared/errors";

/** Absent and not visible read the same, so that hidden things cannot be found by asking. */
export function notFound(): AppError {
  return new AppError("not_found", "There is nothing here, or it is not shown to you.");
}

/** Input that is well formed but cannot be. */
export function invalid(problems: readonly FieldProblem[]): AppError {
  const count = problems.length === 1 ? "One field" : `${problems.length} fields`;
  return new AppError("invalid_input", `${count} cannot be used as sent.`, { problems });
}

/** One field that cannot be used. */
export function invalidField(path: string, message: string): AppError {
  return invalid([{ path, message }]);
}

/** @throws AppError `stale_version` with the stored record, to be shown beside what was typed. */
export function refuseStale(stored: { version: number } & Record<string, unknown>, expected: number): void {
  if (stored.version === expected) return;
  const current = Object.fromEntries(Object.entries(stored).filter(([key]) => key !== "digest"));
  throw new AppError("stale_version", "Somebody saved this record before you. Compare and save again.", {
    current,
  });
}

/** A new id that is taken by another record, or was used for other content. */
export function idTaken(): AppError {
  return new AppError("conflict", "This id was already used for other content. Make a new one.");
}

/**
 * Whether a create is a repetition of one already stored.
 * @throws AppError `conflict` when the same id came with other content before.
 */
export function isReplay(stored: { digest: string | null } | null, digest: string): boolean {
  if (stored === null) return false;
  if (stored.digest !== digest) throw idTaken();
  return true;
}
