import { metalAgainstClass, metalAgainstStressCorrosion, placeClass } from "@/lib/engineering";
import { familyOf, METALS, metalName } from "@/lib/domain/catalogue/metals";
import type { PlaceFacts } from "@/lib/domain/finding/evidence";
import { everyPlace } from "@/lib/domain/finding/place";
import { list } from "@/lib/domain/finding/words";

/**
 * The metals a bolt in this place may be of, in words: those that reach its class and cannot be expected to
 * crack, at every value a fact that is not known may have. Titanium is named once.
 */
export function metalsThatPass(facts: PlaceFacts): string {
  const places = everyPlace(facts);
  const stainless = METALS.filter(
    (metal) =>
      familyOf(metal) === "stainless" &&
      places.every((place) => {
        const level = metalAgainstStressCorrosion(metal, place).level;
        const wanted = placeClass(place)?.crc ?? null;
        return metalAgainstClass(metal, wanted).accepted && (level === "ok" || level === "note");
      }),
  );
  return list([...stainless.map(metalName), "titanium"]);
}
