import type { FaceInput, FacePlacement } from "@/components/anchor/face-input";
import { orientationNotes } from "@/components/anchor/face-orientation";
import {
  CONDITION_LABELS,
  PLACEMENT_KIND_LABELS,
  PLACEMENT_ROLE_LABELS,
  RIGGING_LABELS,
} from "@/lib/domain/labels";
import { formatBearingDeg, formatCount, formatList, formatQuantity } from "@/lib/shared/format";

/** One line of the list that says what the drawing shows. */
export interface TwinLine {
  name: string;
  words: string;
}

/** Everything that is drawn, in words: placements in order, ring, legs, edges, load, reasons about the whole. */
export function faceTwin(input: FaceInput): TwinLine[] {
  return [
    ...input.placements.map((placement) => ({
      name: `${PLACEMENT_KIND_LABELS[placement.kind]} ${placement.number}`,
      words: placementWords(placement, input),
    })),
    ...(input.masterpoint
      ? [
          {
            name: "masterpoint",
            words: `${position(input.masterpoint.xMm, input.masterpoint.yMm)} of placement 1.`,
          },
        ]
      : []),
    ...riggingLine(input),
    ...input.edges.map((edge) => ({
      name: "edge",
      words: `${edge.label}: ${edge.sharpness}${edge.paddingNeeded ? ", needs padding" : ""}${edge.x1Mm === null ? ", not drawn: its ends are not measured" : ""}.`,
    })),
    ...loadLine(input),
    { name: "view", words: orientationNotes(input).join(" ") },
    ...wholeLine(input),
  ];
}

function placementWords(placement: FacePlacement, input: FaceInput): string {
  const what = placement.bolt ? placement.bolt.words : placement.kind === "bolt" ? "empty hole" : null;
  const body = input.rockBodies.find(({ id }) => id === placement.rockBodyId);
  const reasons = input.reasons.filter((reason) => reason.placementNumber === placement.number);
  const parts = [
    PLACEMENT_ROLE_LABELS[placement.role],
    what,
    placement.bolt ? CONDITION_LABELS[placement.bolt.condition] : null,
    placement.number === 1 ? "the origin" : position(placement.xMm, placement.yMm),
    placement.sizeMm === null ? null : `${formatQuantity(placement.sizeMm, "mm", { digits: 0 })} across`,
    placement.deadHoles.length > 0 ? `${formatCount(placement.deadHoles.length, "dead hole")} near it` : null,
    body
      ? `in ${body.label} (${body.attachment === "unknown" ? "attachment not known" : body.attachment})`
      : null,
    reasons.length > 0 ? `reasons ${formatList(reasons.map(({ number }) => String(number)))}` : null,
  ];
  return `${parts.filter((part) => part !== null).join("; ")}.`;
}

/** `610, -140` → "610 mm right, 140 mm below". */
function position(xMm: number | null, yMm: number | null): string {
  if (xMm === null || yMm === null) return "position not measured";
  const mm = (value: number) => formatQuantity(Math.abs(value), "mm", { digits: 0 });
  const across = xMm === 0 ? null : `${mm(xMm)} ${xMm > 0 ? "right" : "left"}`;
  const up = yMm === 0 ? null : `${mm(yMm)} ${yMm > 0 ? "above" : "below"}`;
  return [across, up].filter((part) => part !== null).join(", ") || "at the same place";
}

function riggingLine({ rigging }: FaceInput): TwinLine[] {
  if (rigging === null) return [];
  const legs = rigging.legLengthsM.map((length) =>
    length === null ? "not recorded" : formatQuantity(length, "m", { digits: 2 }),
  );
  const words = `${RIGGING_LABELS[rigging.kind]}${legs.length > 0 ? `; legs of the main placements ${formatList(legs)}` : ""}.`;
  return [{ name: "rigging", words }];
}

function loadLine({ designAzimuthDeg, designElevationDeg }: FaceInput): TwinLine[] {
  if (designAzimuthDeg === null) return [];
  const elevation =
    designElevationDeg === null
      ? "elevation not recorded"
      : `${formatQuantity(Math.abs(designElevationDeg), "°")} ${designElevationDeg < 0 ? "below" : "above"} level`;
  return [{ name: "design load", words: `towards ${formatBearingDeg(designAzimuthDeg)}, ${elevation}.` }];
}

function wholeLine({ reasons }: FaceInput): TwinLine[] {
  const whole = reasons.filter(({ placementNumber }) => placementNumber === null);
  if (whole.length === 0) return [];
  return [
    { name: "whole anchor", words: `reasons ${formatList(whole.map(({ number }) => String(number)))}.` },
  ];
}
