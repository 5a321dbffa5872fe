import type { Tone } from "@/components/ui/badge";
import type { JobOutcome, JobState } from "@/lib/domain/vocabulary";
import { formatCount, formatRuns } from "@/lib/shared/format";

export const JOB_STATE_TONES: Readonly<Record<JobState, Tone>> = {
  proposed: "warn",
  accepted: "info",
  done: "calm",
  turned_down: "plain",
};

/** What each outcome means for the reports behind the job. */
export const OUTCOME_DETAILS: Readonly<Record<JobOutcome, string>> = {
  new_bolt: "A bolt went in. It answers for the hole it went into.",
  tightened: "Nut, hanger or stud sits again",
  link_swapped: "Ring, link or chain changed",
  tested: "Tried under load. Reports stay open until somebody judges them.",
  removed: "Taken out, nothing put in",
};

const DAY_MS = 86_400_000;

/** "43 days", from one instant to the next. */
export function waitingDays(since: string, now: string): string {
  const days = Math.max(0, Math.floor((Date.parse(now) - Date.parse(since)) / DAY_MS));
  return days === 0 ? "since today" : formatCount(days, "day");
}

/** "placements 1–3", "placement 2", "the whole anchor". */
export function placementsOf(numbers: readonly number[]): string {
  if (numbers.length === 0) return "the whole anchor";
  return `${numbers.length === 1 ? "placement" : "placements"} ${formatRuns(numbers)}`;
}
