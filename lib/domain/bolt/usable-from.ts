import type { CureRow } from "@/lib/engineering";
import { cureRow } from "@/lib/engineering";

export type UsableFrom =
  | {
      ok: true;
      /** UTC instant from which the bolt may be loaded. */ usableFrom: string;
      row: CureRow;
      coldestC: number;
    }
  | { ok: false; reason: string };

/**
 * When a glued bolt may be loaded: the install plus the cure time of the row its colder temperature falls in.
 *
 * The colder of glue (or air) and rock decides. Never between two rows, never below the first: there the
 * glue is not to be used and this refuses. Without both temperatures, or without a table, it refuses too: a
 * guess is not a time.
 */
export function usableFrom(i: {
  /** UTC instant at which the bolt was set. */
  installedAt: string;
  table: readonly CureRow[];
  glueTempC: number | null;
  rockTempC: number | null;
}): UsableFrom {
  if (i.table.length === 0) return { ok: false, reason: "The adhesive has no cure table on record." };
  if (i.glueTempC === null || i.rockTempC === null) {
    return {
      ok: false,
      reason: "Measure the temperature of the glue and of the rock: the colder one decides.",
    };
  }
  const coldestC = Math.min(i.glueTempC, i.rockTempC);
  const row = cureRow(i.table, coldestC);
  if (row === null) {
    const lowest = Math.min(...i.table.map((one) => one.minTempC));
    return {
      ok: false,
      reason: `At ${coldestC} °C this glue is not to be used: its table begins at ${lowest} °C.`,
    };
  }
  const usable = new Date(new Date(i.installedAt).getTime() + row.cureMin * 60_000);
  return { ok: true, usableFrom: usable.toISOString(), row, coldestC };
}
