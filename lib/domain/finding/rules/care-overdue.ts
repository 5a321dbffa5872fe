import type { LoadPolicy } from "@/lib/domain/policy";
import { addMonths } from "@/lib/domain/finding/dates";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { isSerious } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";

/**
 * care.overdue: time since somebody had a hand on it. An install counts as a check, however well its date
 * is known. Never checked asks in a serious use and is a note elsewhere. The day an interval ends is still
 * in time.
 */
export function careOverdue(e: BoltEvidence, policy: LoadPolicy): Finding | null {
  if (e.context === "choosing") return null;
  const months = policy.checkIntervalMonths[e.use];
  const last = [e.care?.lastCheckOn ?? null, e.bolt.installedOn]
    .filter((day) => day !== null)
    .sort()
    .at(-1);
  const source = {
    mark: "common_practice",
    name: "Check intervals of the area; EN 365 asks for 12 months",
  } as const;
  if (last === undefined) {
    return {
      code: "care.overdue",
      level: isSerious(e.use) ? "ask" : "note",
      title: "No check on record",
      text: `Neither an install nor a check is on record; every ${months} months is agreed for this use.`,
      clearsWhen: "a check by hand is recorded",
      numbers: { lastCheckOn: null, intervalMonths: months, askedFor: e.onDate },
      assumed: [],
      source,
    };
  }
  if (e.onDate <= addMonths(last, months)) return null;
  return {
    code: "care.overdue",
    level: e.onDate > addMonths(last, 2 * months) ? "limit" : "note",
    title: "Check overdue",
    text: `Last checked on ${last}; every ${months} months is agreed for this use.`,
    clearsWhen: "a check by hand is recorded",
    numbers: {
      lastCheckOn: last,
      intervalMonths: months,
      dueOn: addMonths(last, months),
      askedFor: e.onDate,
    },
    assumed: [],
    source,
  };
}
