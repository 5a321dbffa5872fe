import type { PlaceFacts } from "@/lib/domain/finding/evidence";

export interface PlaceKind {
  key: string;
  label: string;
  place: PlaceFacts;
}

/** A typical place: low sulphur dioxide, no salted road, an open coast. */
function kind(key: string, label: string, seaDistanceM: number, washing: "rain" | "none"): PlaceKind {
  return {
    key,
    label,
    place: {
      seaDistanceM,
      seaDistanceErrorM: 0,
      coast: "other",
      washing,
      so2: "low",
      saltedRoadDistanceM: null,
      warmDry: false,
    },
  };
}

/**
 * The kinds of place a type is held against, mildest first. Sheltered: neither rain nor a regime washes it.
 */
export const placeKinds: readonly PlaceKind[] = [
  kind("inland_washed", "Inland, washed by rain", 50_000, "rain"),
  kind("inland_sheltered", "Inland, sheltered", 50_000, "none"),
  kind("sea_5km_washed", "5 km from the sea, washed", 5_000, "rain"),
  kind("sea_5km_sheltered", "5 km from the sea, sheltered", 5_000, "none"),
  kind("sea_500m_washed", "500 m from the sea, washed", 500, "rain"),
  kind("sea_500m_sheltered", "500 m from the sea, sheltered", 500, "none"),
  kind("sea_100m_washed", "100 m from the sea, washed", 100, "rain"),
  kind("sea_100m_sheltered", "100 m from the sea, sheltered", 100, "none"),
];
