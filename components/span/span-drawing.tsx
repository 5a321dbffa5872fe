import { MarkPath } from "@/components/finding/condition-mark";
import type { SpanView } from "@/lib/schemas/views/register";
import { formatBearingDeg, formatQuantity } from "@/lib/shared/format";
import { MARK_SHAPES, type MarkTone, markOf } from "@/lib/map/marks";

const WIDTH = 420;
const LEFT = 52;
const RIGHT = WIDTH - LEFT;
/** A steeper line than this would leave the drawing; the height is then cut and the number tells. */
const MOST_RISE = 50;

const FILLS: Readonly<Record<MarkTone, string>> = {
  calm: "text-calm-fill",
  warn: "text-warn-fill",
  stop: "text-stop-fill",
  info: "text-info-fill",
  muted: "text-muted",
};

/**
 * The line between its two ends, seen from the side: length between the anchors along the line, the difference in
 * height to the same scale. Sag is not drawn: it is not computed here.
 */
export function SpanDrawing({ span }: { span: SpanView }) {
  const { lengthM, heightDifferenceM, bearingDeg } = span;
  const scale = lengthM ? (RIGHT - LEFT) / lengthM : 0;
  const rise = Math.max(-MOST_RISE, Math.min(MOST_RISE, (heightDifferenceM ?? 0) * scale));
  const yA = 62 + Math.max(0, rise);
  const yB = yA - rise;
  const bottom = Math.max(yA, yB) + 70;
  const length = lengthM === null ? "length not shown" : formatQuantity(lengthM, "m", { digits: 1 });
  const words = [
    `${span.a.code} to ${span.b.code}, ${length}`,
    bearingDeg === null ? null : `bearing ${formatBearingDeg(bearingDeg)} true`,
    heightDifferenceM === null
      ? "difference in height not known"
      : `B ${formatQuantity(heightDifferenceM, "m", { signed: true, digits: 1 })} from A`,
  ];
  return (
    <figure className="grid gap-1">
      <svg
        viewBox={`0 0 ${WIDTH} ${bottom}`}
        role="img"
        aria-label={`${words.filter((word) => word !== null).join("; ")}.`}
        className="block h-auto w-full max-w-2xl font-label text-text [font-stretch:80%]"
      >
        <Rim x={0} to={LEFT} y={yA} bottom={bottom} />
        <Rim x={RIGHT} to={WIDTH} y={yB} bottom={bottom} />
        <line x1={LEFT} y1={yA} x2={RIGHT} y2={yB} className="stroke-action" strokeWidth="2.4" />
        <Dimension yA={yA} yB={yB} label={length} />
        <End x={LEFT} y={yA} end={span.a} name="A" />
        <End x={RIGHT} y={yB} end={span.b} name="B" />
      </svg>
      <figcaption className="text-sm text-muted">
        {heightDifferenceM === null ? "Heights are not recorded: drawn level. " : ""}Sag and swing are not
        drawn.
      </figcaption>
    </figure>
  );
}

/** The edge of the rock an end stands on. */
function Rim({ x, to, y, bottom }: { x: number; to: number; y: number; bottom: number }) {
  const lip = x === 0 ? to : x;
  const back = x === 0 ? x : to;
  return (
    <path
      d={`M${back} ${y + 12} L${lip} ${y + 12} L${lip + (x === 0 ? -6 : 6)} ${y + 44} L${lip + (x === 0 ? -1 : 1)} ${bottom - 26} L${lip + (x === 0 ? -12 : 12)} ${bottom} L${back} ${bottom} Z`}
      className="fill-rock stroke-rock-line"
      strokeWidth="1.4"
    />
  );
}

/** The length, above the line, between two end strokes. */
function Dimension({ yA, yB, label }: { yA: number; yB: number; label: string }) {
  const y = Math.min(yA, yB) - 36;
  return (
    <g className="stroke-muted" fill="none">
      <path d={`M${LEFT} ${y}H${RIGHT}M${LEFT} ${yA - 16}V${y - 8}M${RIGHT} ${yB - 16}V${y - 8}`} />
      <path d={`M${LEFT - 5} ${y + 5}l10-10M${RIGHT - 5} ${y + 5}l10-10`} strokeWidth="1.8" />
      <text
        x={WIDTH / 2}
        y={y + 7}
        fontSize="19"
        textAnchor="middle"
        className="fill-text stroke-surface font-semibold [paint-order:stroke]"
        strokeWidth="14"
      >
        {label}
      </text>
    </g>
  );
}

function End({ x, y, end, name }: { x: number; y: number; end: SpanView["a"]; name: "A" | "B" }) {
  const mark = markOf(end.condition, end.verdict);
  return (
    <g>
      <circle cx={x} cy={y} r="15" className="fill-surface" />
      <g transform={`translate(${x - 12} ${y - 12})`} className={FILLS[MARK_SHAPES[mark].tone]}>
        <MarkPath mark={mark} />
      </g>
      <text
        x={name === "A" ? x + 16 : x - 16}
        y={y + 28}
        fontSize="14"
        textAnchor={name === "A" ? "start" : "end"}
        className="fill-text font-semibold"
      >
        {name} · {end.code}
      </text>
    </g>
  );
}
