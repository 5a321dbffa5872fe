import { expect } from "vitest";

/** Within a relative distance; a value that is not there fails. */
export function expectClose(actual: number | null | undefined, expected: number, relative = 1e-6): void {
  if (actual === null || actual === undefined) throw new Error("no value");
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(relative * Math.abs(expected));
}
