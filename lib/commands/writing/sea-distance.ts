import "server-only";
import type { LonLat } from "@/db/columns/point";
import type { Tx } from "@/db/client";
import { seaDistanceAt } from "@/db/repositories/coast";

/** Error taken for a distance measured by hand when none is given, m: a tape or a rangefinder. */
const MEASURED_ERROR_M = 5;

/** Distance to the sea as measured by hand, else from the coast on record, else not known. */
export async function seaDistanceColumns(
  tx: Tx,
  point: LonLat,
  typed: { seaDistanceM?: number | null; seaDistanceErrorM?: number | null; seaDistanceNote?: string | null },
) {
  if (typeof typed.seaDistanceM === "number") {
    return {
      seaDistanceM: typed.seaDistanceM,
      seaDistanceSource: "measured" as const,
      seaDistanceErrorM: typed.seaDistanceErrorM ?? MEASURED_ERROR_M,
      seaDistanceNote: typed.seaDistanceNote ?? null,
    };
  }
  const found = await seaDistanceAt(tx, point);
  return {
    seaDistanceM: found?.distanceM ?? null,
    seaDistanceSource: found ? ("coast" as const) : null,
    seaDistanceErrorM: found?.errorM ?? null,
    seaDistanceNote: found?.source ?? null,
  };
}
