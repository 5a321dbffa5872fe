import { BALLOON, type Balloon } from "@/components/anchor/face-primitives";
import { cx } from "@/components/ui/cx";
import type { Level } from "@/lib/domain/vocabulary";

const LOOKS: Readonly<Record<Level, { shape: string; number: string }>> = {
  stop: { shape: "fill-stop stroke-stop", number: "fill-surface" },
  ask: { shape: "fill-info-ground stroke-info-fill", number: "fill-info" },
  limit: { shape: "fill-warn-ground stroke-warn-fill", number: "fill-warn" },
  note: { shape: "fill-surface stroke-line-strong", number: "fill-text" },
};

/** The number of a reason, inside a drawing; a "stop" is filled, so that it stands out in black and white too. */
export function BalloonShape({ balloon }: { balloon: Balloon }) {
  const look = LOOKS[balloon.level];
  return (
    <g>
      <circle cx={balloon.x} cy={balloon.y} r={BALLOON} className={look.shape} strokeWidth="1.8" />
      <text
        x={balloon.x}
        y={balloon.y + 4.2}
        fontSize="12"
        textAnchor="middle"
        className={cx("font-bold", look.number)}
      >
        {balloon.number}
      </text>
    </g>
  );
}
