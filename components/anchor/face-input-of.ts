import type { FaceInput } from "@/components/anchor/face-input";
import { FORM_LABELS, metalLabel } from "@/lib/domain/labels";
import type { AnchorSheet } from "@/lib/schemas/views/anchor";

/** What the drawing needs of an anchor sheet. */
export function faceInputOf(sheet: AnchorSheet): FaceInput {
  return {
    placements: sheet.placements.map(({ bolt, ...placement }) => ({
      ...placement,
      bolt: bolt && {
        form: bolt.form,
        condition: bolt.condition,
        words: bolt.typeName ?? `${FORM_LABELS[bolt.form]}, ${metalLabel(bolt.boltMetal)}`,
      },
    })),
    masterpoint: sheet.masterpoint,
    rigging: sheet.rigging,
    edges: sheet.edges,
    rockBodies: sheet.rockBodies,
    faceAzimuthDeg: sheet.faceAzimuthDeg,
    faceDipDeg: sheet.faceDipDeg,
    designAzimuthDeg: sheet.designAzimuthDeg,
    designElevationDeg: sheet.designElevationDeg,
    reasons: onceAtEach(sheet.findings),
    isRow: sheet.rowName !== null,
  };
}

/** A reason stands once beside a placement, however many findings of that placement share it. */
function onceAtEach(findings: AnchorSheet["findings"]): FaceInput["reasons"] {
  const byPlace = new Map(
    findings.map(({ number, level, placementNumber }) => [
      `${number}/${placementNumber ?? ""}`,
      { number, level, placementNumber },
    ]),
  );
  return [...byPlace.values()];
}
