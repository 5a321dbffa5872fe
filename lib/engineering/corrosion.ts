/**
 * Words shared by the three corrosion questions: how hard is the place on stainless steel (`place-class`),
 * does a metal reach that class (`metal-class`), and can it crack from chloride (`stress-corrosion`).
 *
 * Source of the classes: EN 1993-1-4:2006+A1:2015, Annex A.
 */
export type Washing = "rain" | "cleaned" | "none";
export type So2Band = "low" | "medium" | "high";

export interface Place {
  /** Internally controlled environment. */
  indoor?: boolean;
  /** Road tunnel where de-icing salt is carried in. */
  saltTunnel?: boolean;
  /** Distance to the sea, m; null: not known. */
  seaDistanceM: number | null;
  coast: "baltic-or-german-north-sea" | "other" | "strict";
  /** Distance to a road that is salted in winter, m; null: none near. */
  saltedRoadDistanceM: number | null;
  /** SO2 band: low < 10, medium 10 to 90, high 90 to 250 µg/m³; null: taken as low. */
  so2: So2Band | null;
  /** rain: fully exposed to rain. cleaned: a cleaning regime is kept. none: neither. null: not known. */
  washing: Washing | null;
  /** Warm, dry, sun-baked: salt concentrates on the surface. */
  warmDry?: boolean;
}

/** Corrosion resistance class, I (mild) to V (severe). */
export type ResistanceClass = "I" | "II" | "III" | "IV" | "V";
/** The classes in ascending order. */
export const RESISTANCE_CLASSES = ["I", "II", "III", "IV", "V"] as const;

export interface PlaceClass {
  f1: number;
  f2: number;
  f3: number;
  /** Corrosion resistance factor, f1 + f2 + f3. */
  crf: number;
  crc: ResistanceClass;
}

export type Acceptance = {
  accepted: boolean;
  reason: "class-met" | "class-short" | "plated" | "stress-corrosion" | "unknown-metal" | "place-unknown";
  metalClass: ResistanceClass | "beyond" | null;
};

/** ASTM grades of titanium this register knows. */
export const TITANIUM = ["ti-1", "ti-2", "ti-3", "ti-4", "ti-5"] as const;
/** Carbon steel under zinc. */
export const PLATED = ["zinc-plated", "hot-dip-galvanised"] as const;

/** Whether the list holds the metal's designation. */
export function isOneOf(list: readonly string[], metal: string): boolean {
  return list.includes(metal);
}
