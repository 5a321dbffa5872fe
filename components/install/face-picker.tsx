"use client";

import type { FacePlacement, FaceInput } from "@/components/anchor/face-input";

interface FacePickerProps {
  face: FaceInput;
  /** mm from placement 1; null: nothing picked yet. */
  picked: { xMm: number; yMm: number } | null;
  onPick: (at: { xMm: number; yMm: number }) => void;
}

/** Steps a tap is rounded to, mm: nobody taps finer. */
const STEP_MM = 10;
/** Rock shown around the outermost placement, mm. */
const MARGIN_MM = 600;

/** Tap where the new hole is. The numbers beside it say the same and can be typed instead. */
export function FacePicker({ face, picked, onPick }: FacePickerProps) {
  const known = face.placements.flatMap(measured);
  const points = [{ xMm: 0, yMm: 0 }, ...known, ...(picked ? [picked] : [])];
  const xs = points.map((point) => point.xMm);
  const ys = points.map((point) => point.yMm);
  const left = Math.min(...xs) - MARGIN_MM;
  const top = Math.max(...ys) + MARGIN_MM;
  const width = Math.max(...xs) + MARGIN_MM - left;
  const height = top - Math.min(...ys) + MARGIN_MM;
  const dot = Math.max(width, height) / 60;

  return (
    <figure className="grid gap-1">
      <svg
        viewBox={`0 0 ${width} ${height}`}
        className="max-h-96 w-full cursor-crosshair touch-manipulation border border-line-strong bg-rock"
        role="img"
        aria-label="The face, seen from the front. Tap to place the new hole, or type its position below."
        onClick={(event) => {
          const box = event.currentTarget.getBoundingClientRect();
          // The drawing keeps its proportions inside the box: undo the scale and the centring.
          const scale = Math.min(box.width / width, box.height / height);
          const x = (event.clientX - box.left - (box.width - width * scale) / 2) / scale;
          const y = (event.clientY - box.top - (box.height - height * scale) / 2) / scale;
          onPick({ xMm: rounded(left + x), yMm: rounded(top - y) });
        }}
      >
        <path
          d={`M0 ${top}H${width}M${-left} 0V${height}`}
          className="stroke-rock-line"
          strokeWidth={dot / 8}
          strokeDasharray={dot}
        />
        {known.map((placement) => (
          <g key={placement.number} transform={`translate(${placement.xMm - left} ${top - placement.yMm})`}>
            <circle r={dot * 0.8} className="fill-surface stroke-text" strokeWidth={dot / 5} />
            <text y={-dot * 1.4} textAnchor="middle" fontSize={dot * 1.8} className="fill-text font-label">
              {placement.number}
            </text>
          </g>
        ))}
        {picked ? (
          <g
            transform={`translate(${picked.xMm - left} ${top - picked.yMm})`}
            className="stroke-action"
            strokeWidth={dot / 4}
          >
            <circle r={dot} className="fill-calm-ground" />
            <path d={`M${-dot * 2} 0H${dot * 2}M0 ${-dot * 2}V${dot * 2}`} />
          </g>
        ) : null}
      </svg>
      <figcaption className="text-sm text-muted">
        Looking at the rock: right is positive x, up is positive y, measured from placement 1. A tap is
        rounded to {STEP_MM} mm.
      </figcaption>
    </figure>
  );
}

function measured(placement: FacePlacement): { number: number; xMm: number; yMm: number }[] {
  const { number, xMm, yMm } = placement;
  return xMm === null || yMm === null ? [] : [{ number, xMm, yMm }];
}

function rounded(mm: number): number {
  return Math.round(mm / STEP_MM) * STEP_MM;
}
