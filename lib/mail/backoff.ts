import "server-only";

const MINUTE_MS = 60_000;

/** Waits before the 2nd, 3rd … try, minutes: quick while a server restarts, then patient for a day and a half. */
const WAITS_MIN = [1, 5, 15, 60, 240, 720, 1440] as const;

/** Tries in all before a mail is given up. */
export const MAX_ATTEMPTS = WAITS_MIN.length + 1;

/**
 * When to try again after a failure; null: give up.
 * @param attempts tries made so far, the failed one included
 */
export function nextAttempt(attempts: number, now: Date): Date | null {
  const waitMin = WAITS_MIN[attempts - 1];
  return waitMin === undefined ? null : new Date(now.getTime() + waitMin * MINUTE_MS);
}
