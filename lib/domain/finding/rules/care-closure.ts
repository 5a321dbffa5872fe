import { addDays } from "@/lib/domain/finding/dates";
import type { AnchorQuestion } from "@/lib/domain/finding/evidence";
import type { Finding } from "@/lib/domain/finding/types";

/** A closure that begins within this many days is announced (common practice). */
const SOON_DAYS = 30;

/** care.closure: closed on the date asked for, first and last day included, or soon. */
export function careClosure(e: AnchorQuestion): Finding | null {
  const closures = [...e.care.closures].sort((a, b) => a.startsOn.localeCompare(b.startsOn));
  const now = closures.find(
    ({ startsOn, endsOn }) => startsOn <= e.onDate && (endsOn === null || e.onDate <= endsOn),
  );
  const soon = closures.find(
    ({ startsOn }) => startsOn > e.onDate && startsOn <= addDays(e.onDate, SOON_DAYS),
  );
  const closure = now ?? soon;
  if (closure === undefined) return null;
  const until = closure.endsOn === null ? "until further notice" : `until ${closure.endsOn}`;
  return {
    code: "care.closure",
    level: now === undefined ? "note" : "stop",
    title: now === undefined ? "Closed soon" : "Closed on this date",
    text: `${closure.reason}: from ${closure.startsOn} ${until}.`,
    clearsWhen:
      now === undefined
        ? null
        : closure.endsOn === null
          ? "the closure is lifted"
          : `${closure.endsOn} is over`,
    numbers: {
      closureId: closure.closureId,
      startsOn: closure.startsOn,
      endsOn: closure.endsOn,
      askedFor: e.onDate,
    },
    assumed: [],
    source: { mark: "published", name: "Closures of the area" },
  };
}
