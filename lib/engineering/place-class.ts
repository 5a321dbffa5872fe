import type { Place, PlaceClass, ResistanceClass } from "./corrosion";
import { requireNotNegative } from "./guard";

/**
 * How hard a place is on stainless steel: the corrosion resistance factor CRF and the class CRC it asks for.
 *
 *     CRF = F1 + F2 + F3
 *
 *   F1  chlorides, from the distance M to the sea and S to a salted road; the worse of the two
 *   F2  sulphur dioxide: 0, -5, -10 for the low, medium and high band
 *   F3  washing: 0 washed by rain, -2 cleaned by a regime, -7 neither; 0 whenever F1 + F2 >= 0
 *
 *     CRF     1      0 .. > -7    -7 .. > -15    -15 .. -20    < -20
 *     CRC     I         II            III            IV          V
 *
 * Coasts. M <= 0.25 km is -10 on the German North Sea and every Baltic coast, -15 on every other one.
 * `strict` is a published southern-African adaptation for warm or surf coasts outside the standard's scope:
 * M <= 0.25 km -15, <= 0.5 km -10, <= 5 km -7, <= 10 km -3.
 *
 * Not for: stress corrosion (see `stress-corrosion`; the class says nothing about cracking), plated steel,
 * pool halls, or anything wetted by sea water.
 *
 * Not known. Washing null counts as not washed (careful side); SO2 null as low; a road of null as none near.
 * A sea distance of null gives null, unless no distance at all could change F1 (indoors, or a salted tunnel
 * beside a Baltic coast). Which end of a band is inclusive is quoted from memory: the upper end belongs
 * to the harder band, the careful reading.
 *
 * Two readings of CRF = -20: class IV in the standard as remembered, V in a paper that restates it. The
 * standard is followed here, because its vectors are.
 *
 * Source: EN 1993-1-4:2006+A1:2015 Annex A, tables A.1 and A.2 (values published, F3 and the class
 * boundaries restated by independent public papers).
 * Worked example (also a test): 100 m from an open coast, never washed: -15 + 0 - 7 = -22, class V.
 *
 * @throws RangeError when a distance is negative or not finite.
 */
export function placeClass(p: Place): PlaceClass | null {
  if (p.seaDistanceM !== null) requireNotNegative("seaDistanceM", p.seaDistanceM);
  if (p.saltedRoadDistanceM !== null) requireNotNegative("saltedRoadDistanceM", p.saltedRoadDistanceM);

  const f1 = chlorides(p);
  if (f1 === null) return null;
  const f2 = { low: 0, medium: -5, high: -10 }[p.so2 ?? "low"];
  const f3 = f1 + f2 >= 0 ? 0 : { rain: 0, cleaned: -2, none: -7 }[p.washing ?? "none"];
  const crf = f1 + f2 + f3;
  return { f1, f2, f3, crf, crc: classFor(crf) };
}

/** F1, or null when the sea distance is not known and some distance would change it. */
function chlorides(p: Place): number | null {
  if (p.indoor) return 1;
  const land = Math.min(p.saltTunnel ? -10 : 0, fromRoad(p.saltedRoadDistanceM));
  if (p.seaDistanceM !== null) return Math.min(land, fromSea(p.seaDistanceM, p.coast));
  const atTheSurf = Math.min(land, fromSea(0, p.coast));
  return atTheSurf === land ? land : null;
}

function fromRoad(distanceM: number | null): number {
  if (distanceM === null || distanceM > 100) return 0;
  return distanceM > 10 ? -3 : -7;
}

function fromSea(distanceM: number, coast: Place["coast"]): number {
  if (distanceM > 10_000) return 0;
  if (coast === "strict") {
    if (distanceM > 5_000) return -3;
    if (distanceM > 500) return -7;
    return distanceM > 250 ? -10 : -15;
  }
  if (distanceM > 1_000) return -3;
  if (distanceM > 250) return -7;
  return coast === "baltic-or-german-north-sea" ? -10 : -15;
}

function classFor(crf: number): ResistanceClass {
  if (crf > 0) return "I";
  if (crf > -7) return "II";
  if (crf > -15) return "III";
  return crf >= -20 ? "IV" : "V";
}
