import "server-only";
import { getDb } from "@/db/client";
import { type Allowance, takePoint } from "@/db/rate-limit-store";
import { AppError } from "@/lib/shared/errors";

/** What may be done how often. Counted in PostgreSQL. */
const ALLOWANCES = {
  "sign-in-address": { name: "sign-in-address", points: 60, durationS: 900 },
  "sign-in-person": { name: "sign-in-person", points: 10, durationS: 900 },
  "link-address": { name: "link-address", points: 20, durationS: 3600 },
  "link-person": { name: "link-person", points: 5, durationS: 3600 },
  "invite-person": { name: "invite-person", points: 60, durationS: 3600 },
  "report-person": { name: "report-person", points: 120, durationS: 3600 },
  "write-person": { name: "write-person", points: 1200, durationS: 3600 },
  "photo-person": { name: "photo-person", points: 300, durationS: 3600 },
  "verdict-address": { name: "verdict-address", points: 1200, durationS: 600 },
} as const satisfies Record<string, Allowance>;

export type AllowanceName = keyof typeof ALLOWANCES;

/** Takes one point; @throws AppError `rate_limited` with the seconds to wait when there is none left. */
export async function limitRate(allowance: AllowanceName, key: string): Promise<void> {
  const waitS = await takePoint(getDb(), ALLOWANCES[allowance], key);
  if (waitS > 0) {
    throw new AppError("rate_limited", `Too many tries. Wait ${waitInWords(waitS)} and try again.`, {
      retryAfterS: waitS,
    });
  }
}

function waitInWords(seconds: number): string {
  if (seconds < 90) return `${seconds} seconds`;
  return `${Math.ceil(seconds / 60)} minutes`;
}
