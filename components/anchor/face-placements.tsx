import type { DrawnPlacement, FaceDrawing } from "@/components/anchor/face-primitives";
import { PlacementGlyph } from "@/components/anchor/placement-glyph";
import { BalloonShape } from "@/components/anchor/reason-balloon";
import { MarkPath } from "@/components/finding/condition-mark";
import { cx } from "@/components/ui/cx";
import type { Condition } from "@/lib/domain/vocabulary";

const TONES: Readonly<Record<Condition, string>> = {
  in_service: "text-text",
  check_first: "text-text",
  out_of_use: "text-stop",
  removed: "text-muted",
};

const MARK_TONES: Readonly<Record<Condition, string>> = {
  in_service: "text-calm-fill",
  check_first: "text-warn-fill",
  out_of_use: "text-stop-fill",
  removed: "text-muted",
};

/** Everything that sits in the rock, with its number, its state and the balloons of its reasons. */
export function DrawnPlacements({ drawing }: { drawing: FaceDrawing }) {
  return (
    <g>
      {drawing.placements.map((placement) => (
        <OnePlacement key={placement.number} placement={placement} strip={drawing.kind === "row"} />
      ))}
    </g>
  );
}

function OnePlacement({ placement, strip }: { placement: DrawnPlacement; strip: boolean }) {
  const { x, y, condition, balloons, moreReasons } = placement;
  const first = balloons[0];
  const last = balloons[balloons.length - 1];
  return (
    <g>
      {first && strip ? (
        <line x1={x + 78} y1={y} x2={first.x} y2={first.y} className="stroke-muted" strokeWidth="0.8" />
      ) : null}
      <g
        transform={`translate(${x} ${y}) scale(${strip ? 0.78 : 1}) rotate(${placement.turnDeg.toFixed(1)})`}
        className={cx(condition && TONES[condition])}
        strokeDasharray={condition === "removed" ? "2.5 2" : undefined}
      >
        <PlacementGlyph kind={placement.kind} form={placement.form} />
      </g>
      {condition === "out_of_use" ? (
        <line x1={x - 15} y1={y + 12} x2={x + 15} y2={y - 4} className="stroke-stop-fill" strokeWidth="3.2" />
      ) : null}
      <Name placement={placement} />
      {balloons.map((balloon) => (
        <BalloonShape key={balloon.number} balloon={balloon} />
      ))}
      {moreReasons > 0 && last ? (
        <text x={last.x + 13} y={last.y + 4} fontSize="12.5" className="fill-muted font-medium">
          {`+${moreReasons}`}
        </text>
      ) : null}
    </g>
  );
}

/** Half widths of what is wider than a bolt. */
const WIDE: Partial<Record<DrawnPlacement["kind"], number>> = { tree: 17, boulder: 18, thread: 17 };

/** Number, state and what else must be known, beside the glyph; the state's mark stands on its left. */
function Name({ placement }: { placement: DrawnPlacement }) {
  const { x, y, number, condition, tag, kind } = placement;
  const left = placement.numberSide === "left";
  const gap = WIDE[kind] ?? 14;
  const marked = condition !== null && condition !== "in_service";
  return (
    <g>
      <text
        x={left ? x - gap : x + gap}
        y={y + 4.5}
        fontSize="16"
        textAnchor={left ? "end" : "start"}
        className="fill-text stroke-rock font-bold [paint-order:stroke]"
        strokeWidth="4"
        strokeLinejoin="round"
      >
        {number}
        {tag ? (
          <tspan dx="5" fontSize="12.5" className="font-medium">
            {tag}
          </tspan>
        ) : null}
      </text>
      {marked ? (
        <g
          transform={`translate(${x - (left ? gap + 28 : 31)} ${y - 8}) scale(0.66)`}
          className={MARK_TONES[condition]}
        >
          <MarkPath mark={condition} />
        </g>
      ) : null}
    </g>
  );
}
