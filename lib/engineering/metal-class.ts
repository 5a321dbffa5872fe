import type { Acceptance, ResistanceClass } from "./corrosion";
import { isOneOf, PLATED, RESISTANCE_CLASSES, TITANIUM } from "./corrosion";

/**
 * Whether a metal reaches the corrosion resistance class a place asks for.
 *
 * The table gives each stainless grade its class; a higher class always replaces a lower one.
 * Titanium is outside the table and passes every class ("beyond"; commercially pure grades preferred).
 * Plated carbon steel is outside it too and is never accepted here: ask for its zinc life instead.
 *
 * Not for: stress corrosion. A grade may meet the class and still crack; see `stress-corrosion`.
 *
 * Not known. No metal, or one not listed, is `unknown-metal`. A class of null is `place-unknown`, unless the
 * metal passes every class there is.
 *
 * Source: EN 1993-1-4:2006+A1:2015 Annex A, table A.3 (grades restated by independent public papers).
 * Worked example (also a test): 1.4401 is class III; a place of class V is two classes above it.
 */
export function metalAgainstClass(metal: string | null, crc: ResistanceClass | null): Acceptance {
  if (metal !== null && isOneOf(PLATED, metal))
    return { accepted: false, reason: "plated", metalClass: null };
  const metalClass = metal === null ? null : classOf(metal);
  if (metalClass === null) return { accepted: false, reason: "unknown-metal", metalClass: null };
  if (metalClass === "beyond" || metalClass === "V") {
    return { accepted: true, reason: "class-met", metalClass };
  }
  if (crc === null) return { accepted: false, reason: "place-unknown", metalClass };
  const accepted = rank(metalClass) >= rank(crc);
  return { accepted, reason: accepted ? "class-met" : "class-short", metalClass };
}

/** Grades by class. */
const GRADES: Readonly<Record<ResistanceClass, readonly string[]>> = {
  I: ["1.4003", "1.4016", "1.4512"],
  II: ["1.4301", "1.4306", "1.4307", "1.4311", "1.4318", "1.4482", "1.4541", "1.4567"],
  III: [
    "1.4401",
    "1.4404",
    "1.4429",
    "1.4432",
    "1.4435",
    "1.4571",
    "1.4578",
    "1.4062",
    "1.4162",
    "1.4362",
    "1.4662",
  ],
  IV: ["1.4439", "1.4462", "1.4539"],
  V: ["1.4410", "1.4501", "1.4507", "1.4529", "1.4547", "1.4565"],
};

/** The class of a metal, "beyond" for titanium, null for plated steel and for what is not listed. */
export function classOf(metal: string): ResistanceClass | "beyond" | null {
  if (isOneOf(TITANIUM, metal)) return "beyond";
  return RESISTANCE_CLASSES.find((crc) => GRADES[crc].includes(metal)) ?? null;
}

/** 1 for class I to 5 for class V. */
export function rank(crc: ResistanceClass): number {
  return RESISTANCE_CLASSES.indexOf(crc) + 1;
}
