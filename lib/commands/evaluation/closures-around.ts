import "server-only";
import type { EvidenceRows } from "@/db/repositories/evidence";
import type { CareFacts } from "@/lib/domain/finding/evidence";

type ClosureRow = EvidenceRows["closures"][number];
type ClosureFacts = CareFacts["closures"][number];

/** The closures that hold for an anchor, yearly seasons as the dates of the years around the day asked for. */
export function closuresAround(
  rows: readonly ClosureRow[],
  at: { areaId: string; siteId: string; anchorId: string; onDate: string },
): ClosureFacts[] {
  return rows
    .filter(
      (row) =>
        row.areaId === at.areaId &&
        (row.siteId === null || row.siteId === at.siteId) &&
        (row.anchorId === null || row.anchorId === at.anchorId),
    )
    .flatMap((row) => (row.yearly ? seasons(row, at.onDate) : [facts(row, row.startsOn, row.endsOn)]))
    .filter(({ endsOn }) => endsOn === null || endsOn >= at.onDate);
}

function facts({ id, reason }: ClosureRow, startsOn: string, endsOn: string | null): ClosureFacts {
  return { closureId: id, reason, startsOn, endsOn };
}

/** A season may run over the turn of the year. Without an end it is the day it starts on. */
function seasons(row: ClosureRow, onDate: string): ClosureFacts[] {
  const year = Number(onDate.slice(0, 4));
  const from = row.startsOn.slice(4);
  const to = (row.endsOn ?? row.startsOn).slice(4);
  return [year - 1, year, year + 1].map((y) => facts(row, `${y}${from}`, `${to < from ? y + 1 : y}${to}`));
}
