import { describe, expect, it } from "vitest";
import { MAX_ATTEMPTS, nextAttempt } from "@/lib/mail/backoff";

const NOON = new Date("2026-06-01T12:00:00Z");

describe("waiting before the next try of a mail", () => {
  it("grows with every failure, starting at a minute", () => {
    const waits = Array.from({ length: MAX_ATTEMPTS - 1 }, (_, index) => {
      const at = nextAttempt(index + 1, NOON);
      return at === null ? 0 : at.getTime() - NOON.getTime();
    });
    expect(waits[0]).toBe(60_000);
    expect(waits).toEqual(waits.toSorted((a, b) => a - b));
    expect(new Set(waits).size).toBe(waits.length);
  });

  it("ends: the mail is given up", () => {
    expect(nextAttempt(MAX_ATTEMPTS, NOON)).toBeNull();
    expect(nextAttempt(MAX_ATTEMPTS + 1, NOON)).toBeNull();
  });
});
