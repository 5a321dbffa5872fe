import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import type { Finding } from "@/lib/domain/finding/types";

/**
 * record.curing: glue that is not yet hard, and a torque re-check that is due.
 *
 * Asked about a date, the glue must be hard when that day begins; asked about now (`atUtc`), at that instant.
 */
export function recordCuring(e: BoltEvidence): Finding | null {
  const { usableFrom, recheckDueOn } = e.bolt;
  const asked = new Date(e.atUtc ?? `${e.onDate}T00:00:00Z`).getTime();
  if (usableFrom !== null && new Date(usableFrom).getTime() > asked) {
    return {
      code: "record.curing",
      level: "stop",
      title: "Glue not yet hard",
      text: `The glue may be loaded from ${usableFrom.slice(0, 16).replace("T", " ")} UTC.`,
      clearsWhen: `it is ${usableFrom.slice(0, 16).replace("T", " ")} UTC`,
      numbers: { usableFrom, askedFor: e.atUtc ?? e.onDate },
      assumed: [],
      source: { mark: "published", name: "Cure table of the adhesive's product sheet" },
    };
  }
  if (recheckDueOn === null || recheckDueOn > e.onDate) return null;
  return {
    code: "record.curing",
    level: "note",
    title: "Torque re-check due",
    text: `The torque was to be checked again from ${recheckDueOn}.`,
    clearsWhen: "the torque is checked and that is recorded",
    numbers: { recheckDueOn, askedFor: e.onDate },
    assumed: [],
    source: { mark: "common_practice", name: "Torque is checked again once the bolt has settled" },
  };
}
