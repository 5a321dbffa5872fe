import { useId } from "react";
import { cx } from "@/components/ui/cx";
import type { BoltTypeView } from "@/lib/schemas/views/register";

/** The right end of every strip, kN: one scale for all types, so that they can be held against each other. */
const FULL_KN = 60;
const STEP_KN = 10;

type Strengths = Pick<BoltTypeView, "bendOnsetLowKn" | "ratedRadialKn">;

/**
 * Bend before break, across the bolt: solid up to where it begins to bend, hatched from there to the breaking load
 * it is rated for; an empty dashed box where nobody knows when it bends. The numbers stand beside it in words.
 */
export function StrengthStrip({ type, className }: { type: Strengths; className?: string }) {
  const id = useId();
  const { bendOnsetLowKn: onset, ratedRadialKn: rated } = type;
  const end = rated ?? onset ?? 0;
  return (
    <svg aria-hidden="true" focusable="false" className={cx("block h-5 w-full overflow-visible", className)}>
      <defs>
        <pattern id={id} width="6" height="6" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <line y2="6" className="stroke-warn-fill" strokeWidth="3" />
        </pattern>
      </defs>
      {Array.from({ length: FULL_KN / STEP_KN + 1 }, (_, step) => (
        <line
          key={step}
          x1={percent(step * STEP_KN)}
          x2={percent(step * STEP_KN)}
          y1="14"
          y2={step % 3 === 0 ? "20" : "17"}
          className="stroke-line-strong"
        />
      ))}
      <line x2="100%" y1="14" y2="14" className="stroke-line-strong" />
      {onset === null ? (
        <rect
          y="3"
          width={percent(end)}
          height="11"
          className="fill-none stroke-info-fill"
          strokeDasharray="4 3"
        />
      ) : (
        <>
          <rect
            x={percent(onset)}
            y="3"
            width={percent(Math.max(0, end - onset))}
            height="11"
            fill={`url(#${id})`}
            className="stroke-warn-fill"
          />
          <rect y="3" width={percent(onset)} height="11" className="fill-calm-fill" />
        </>
      )}
      {rated === null ? null : (
        <line
          x1={percent(rated)}
          x2={percent(rated)}
          y1="0"
          y2="17"
          className="stroke-text"
          strokeWidth="2.5"
        />
      )}
    </svg>
  );
}

/** What the strips mean, once on a page. */
export function StripLegend() {
  return (
    <p className="max-w-prose text-sm text-muted">
      The strips run from 0 to {FULL_KN} kN across the bolt: solid until it begins to bend, hatched until the
      load it is rated to break at. A dashed box: nobody knows when it bends.
    </p>
  );
}

function percent(kn: number): string {
  return `${Math.min(100, (100 * kn) / FULL_KN).toFixed(2)}%`;
}
