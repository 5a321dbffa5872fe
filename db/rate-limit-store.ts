import "server-only";
import { RateLimiterDrizzle, RateLimiterRes } from "rate-limiter-flexible";
import type { Db } from "@/db/client";
import { rateLimits } from "@/db/schema";

export interface Allowance {
  /** Prefix of the key, so that counters do not mix. */
  name: string;
  points: number;
  durationS: number;
}

/**
 * Takes one point of an allowance kept in PostgreSQL, so that it holds over restarts and processes.
 * @returns 0 when there was one left, else the seconds until there is.
 */
export async function takePoint(
  db: Db,
  { name, points, durationS }: Allowance,
  key: string,
): Promise<number> {
  const limiter = new RateLimiterDrizzle({
    storeClient: db,
    schema: rateLimits,
    keyPrefix: name,
    points,
    duration: durationS,
    clearExpiredByTimeout: false,
  });
  try {
    await limiter.consume(key);
    return 0;
  } catch (refusal) {
    if (refusal instanceof RateLimiterRes) return Math.max(1, Math.ceil(refusal.msBeforeNext / 1000));
    throw refusal;
  }
}
