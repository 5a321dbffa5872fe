import type { AnchorChange } from "@/lib/schemas/anchor";
import type { AnchorSheet } from "@/lib/schemas/views/anchor";
import { flatValues } from "@/lib/shared/flat-values";

/** The facts of an anchor that can be corrected, as they are stored. */
export function anchorFactsOf(sheet: AnchorSheet): AnchorChange {
  const measured = sheet.sea?.source === "measured" ? sheet.sea : null;
  return {
    label: sheet.label,
    uses: sheet.uses,
    pointErrorM: sheet.pointErrorM,
    elevationM: sheet.elevationM,
    designAzimuthDeg: sheet.designAzimuthDeg,
    designElevationDeg: sheet.designElevationDeg,
    faceAzimuthDeg: sheet.faceAzimuthDeg,
    faceDipDeg: sheet.faceDipDeg,
    rigging: sheet.rigging,
    masterpointXMm: sheet.masterpoint?.xMm ?? null,
    masterpointYMm: sheet.masterpoint?.yMm ?? null,
    masterpointZMm: sheet.masterpoint?.zMm ?? null,
    washing: sheet.washingFrom === "anchor" ? sheet.washing : null,
    seaDistanceM: measured?.distanceM ?? null,
    seaDistanceErrorM: measured?.errorM ?? null,
    seaDistanceNote: measured?.note ?? null,
    rowName: sheet.rowName,
    rowLengthM: sheet.rowLengthM,
    note: sheet.note,
  };
}

/** Only what differs from what is stored: a revision names what was changed, and nothing else. */
export function changedFacts(sheet: AnchorSheet, wanted: AnchorChange): AnchorChange {
  const stored = new Map<string, unknown>(Object.entries(anchorFactsOf(sheet)));
  return Object.fromEntries(
    Object.entries(wanted).filter(([key, value]) => plain(value) !== plain(stored.get(key))),
  );
}

/**
 * Two values that mean the same as the same text: empty is nothing, what is stored may have its parts in another
 * order, and so may the words of a list.
 */
function plain(value: unknown): string {
  if (Array.isArray(value) && value.every((one) => typeof one === "string")) return value.toSorted().join();
  const parts = Object.entries(flatValues(value, "value")).filter(([, text]) => text !== "");
  return JSON.stringify(parts.toSorted(([a], [b]) => a.localeCompare(b)));
}
