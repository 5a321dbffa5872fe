import type { Place, PlaceClass } from "@/lib/engineering";
import { placeClass } from "@/lib/engineering";
import type { PlaceFacts } from "@/lib/domain/finding/evidence";
import { distance } from "@/lib/domain/finding/words";

/** One distance inside every band any rule uses, m: a distance that is not known is tried at each. */
export const PLAUSIBLE_SEA_M: readonly number[] = [100, 400, 800, 4_000, 8_000, 50_000, 200_000];

/** The careful side of the distance to the sea, m: the record less the doubt about it. Null: not known. */
export function carefulSeaM(place: PlaceFacts): number | null {
  return place.seaDistanceM === null ? null : Math.max(0, place.seaDistanceM - place.seaDistanceErrorM);
}

/** The place as the corrosion formulas want it. */
export function placeOf(place: PlaceFacts): Place {
  return {
    seaDistanceM: carefulSeaM(place),
    coast: place.coast === "baltic_or_german_north_sea" ? "baltic-or-german-north-sea" : place.coast,
    saltedRoadDistanceM: place.saltedRoadDistanceM,
    so2: place.so2,
    washing: place.washing,
    warmDry: place.warmDry,
  };
}

/**
 * Every place it may be: unknown distance and washing at each plausible value. One entry when both are
 * known.
 */
export function everyPlace(place: PlaceFacts): readonly Place[] {
  const known = placeOf(place);
  const distances = known.seaDistanceM === null ? PLAUSIBLE_SEA_M : [known.seaDistanceM];
  const washings = known.washing === null ? (["rain", "none"] as const) : [known.washing];
  return distances.flatMap((seaDistanceM) =>
    washings.map((washing) => ({ ...known, seaDistanceM, washing })),
  );
}

/** What the place asks of stainless steel; null when the distance to the sea is not known and matters. */
export function placeClassOf(place: PlaceFacts): PlaceClass | null {
  return placeClass(placeOf(place));
}

/** The place in words: "80 m from the sea, never washed by rain". */
export function placeInWords(place: PlaceFacts): string {
  const sea =
    place.seaDistanceM === null
      ? "distance to the sea not known"
      : `${distance(place.seaDistanceM)} from the sea`;
  const washed = {
    rain: "washed by rain",
    cleaned: "not washed by rain, cleaned",
    none: "never washed by rain",
  };
  return `${sea}, ${place.washing === null ? "washing not known" : washed[place.washing]}`;
}

/** What was taken for granted about the place, in words. */
export function placeAssumed(place: PlaceFacts): string[] {
  return [
    place.so2 === null ? "sulphur dioxide taken as low: not recorded" : null,
    place.saltedRoadDistanceM === null ? "no salted road near" : null,
    place.seaDistanceM !== null && place.seaDistanceErrorM > 0
      ? `the near side of ${distance(place.seaDistanceM)} ± ${distance(place.seaDistanceErrorM)}`
      : null,
  ].filter((words) => words !== null);
}

/** What is missing about the place, in words that finish "when … is recorded". */
export function placeMissing(place: PlaceFacts): string[] {
  return [
    place.seaDistanceM === null ? "the distance to the sea" : null,
    place.washing === null ? "whether rain washes the place" : null,
  ].filter((words) => words !== null);
}
