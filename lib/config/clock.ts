import "server-only";

/** The only place that asks the machine for the time; everything else is handed an instant. */
export function now(): Date {
  return new Date();
}
