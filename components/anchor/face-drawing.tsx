import { useId } from "react";
import { buildFaceDrawing } from "@/components/anchor/face-drawing-model";
import type { FaceInput } from "@/components/anchor/face-input";
import { DrawnPlacements } from "@/components/anchor/face-placements";
import type { FaceDrawing as Drawing } from "@/components/anchor/face-primitives";
import { FaceRock } from "@/components/anchor/face-rock";
import { FaceTwin } from "@/components/anchor/face-twin";
import { BalloonShape } from "@/components/anchor/reason-balloon";
import { cx } from "@/components/ui/cx";

/**
 * The anchor as it sits in the rock, to scale from what was measured, with the numbers of the reasons beside what
 * they are about. A list below says everything that is drawn.
 */
export function FaceDrawing({
  input,
  name,
  className,
}: {
  input: FaceInput;
  /** Names the drawing: "Face drawing of Mouth, north end". */
  name: string;
  className?: string;
}) {
  const id = useId();
  const drawing = buildFaceDrawing(input);
  return (
    <figure className={cx("w-full max-w-[36rem]", className)}>
      <svg
        viewBox={`0 0 ${drawing.width} ${drawing.height}`}
        role="img"
        aria-labelledby={`${id}-name`}
        className="block h-auto w-full border border-frame bg-surface font-label tracking-wide text-text [font-stretch:80%] print:max-h-[120mm]"
      >
        <title id={`${id}-name`}>{`${name}. The list below says what it shows.`}</title>
        <FaceRock drawing={drawing} id={id} />
        <Lines drawing={drawing} />
        <DrawnPlacements drawing={drawing} />
        <Load drawing={drawing} id={id} />
        <Corners drawing={drawing} />
      </svg>
      <figcaption className="mt-2 grid gap-1 text-sm text-muted">
        {drawing.notes.map((note) => (
          <p key={note}>{note}</p>
        ))}
      </figcaption>
      <FaceTwin input={input} />
    </figure>
  );
}

/** Legs from the holes to the ring, and the line through a row. */
function Lines({ drawing }: { drawing: Drawing }) {
  return (
    <g fill="none">
      {drawing.line ? (
        <path d={drawing.line} className="stroke-text" strokeWidth="1" strokeDasharray="7 4" />
      ) : null}
      {drawing.legs.map((leg, index) => (
        <line
          key={index}
          x1={leg.from.x}
          y1={leg.from.y}
          x2={leg.to.x}
          y2={leg.to.y}
          className={leg.role === "main" ? "stroke-action" : "stroke-muted"}
          strokeWidth={leg.role === "main" ? 2.2 : 1.6}
          strokeDasharray={leg.role === "main" ? undefined : "6 4"}
        />
      ))}
      {drawing.masterpoint ? (
        <circle
          cx={drawing.masterpoint.x}
          cy={drawing.masterpoint.y}
          r="8"
          className="fill-surface stroke-action"
          strokeWidth="3.4"
        />
      ) : null}
      {drawing.masterpoint ? (
        <Label x={drawing.masterpoint.x - 15} y={drawing.masterpoint.y + 9} end text="masterpoint" />
      ) : null}
    </g>
  );
}

function Load({ drawing, id }: { drawing: Drawing; id: string }) {
  const { load } = drawing;
  if (load === null) return null;
  if ("out" in load) {
    return (
      <g className="text-text">
        <circle cx={load.at.x} cy={load.at.y} r="13" fill="none" stroke="currentColor" strokeWidth="2" />
        <circle cx={load.at.x} cy={load.at.y} r="3" fill="currentColor" />
        <Label x={load.at.x + 18} y={load.at.y + 20} text={load.label} />
      </g>
    );
  }
  const dx = load.to.x - load.from.x;
  const dy = load.to.y - load.from.y;
  const length = Math.hypot(dx, dy) || 1;
  const start = { x: load.from.x + (dx / length) * 11, y: load.from.y + (dy / length) * 11 };
  const right = load.to.x < drawing.width * 0.6;
  return (
    <g>
      <defs>
        <marker
          id={`${id}-arrow`}
          viewBox="0 0 10 10"
          refX="8"
          refY="5"
          markerWidth="5"
          markerHeight="5"
          orient="auto"
        >
          <path d="M0 0 10 5 0 10Z" className="fill-text" />
        </marker>
      </defs>
      <line
        x1={start.x}
        y1={start.y}
        x2={load.to.x}
        y2={load.to.y}
        className="stroke-text"
        strokeWidth="2.6"
        markerEnd={`url(#${id}-arrow)`}
      />
      <Label x={load.to.x + (right ? 10 : -10)} y={load.to.y + 2} end={!right} text={load.label} />
    </g>
  );
}

/** Words on a patch of ground, so that lines do not run through them. */
export function Label({ x, y, text, end }: { x: number; y: number; text: string; end?: boolean }) {
  return (
    <text
      x={x}
      y={y}
      fontSize="13"
      textAnchor={end ? "end" : "start"}
      className="fill-text stroke-rock font-medium [paint-order:stroke]"
      strokeWidth="4"
      strokeLinejoin="round"
    >
      {text}
    </text>
  );
}

/** What stands in the corners: scale, north, the word "not to scale", reasons about the whole anchor. */
function Corners({ drawing }: { drawing: Drawing }) {
  const { scaleBar, north, anchorBalloons } = drawing;
  const lastBalloon = anchorBalloons[anchorBalloons.length - 1];
  return (
    <g>
      {scaleBar ? <ScaleBar bar={scaleBar} /> : null}
      {drawing.kind === "schematic" ? <NotToScale bottom={drawing.height} /> : null}
      {north ? <NorthArrow north={north} /> : null}
      {anchorBalloons.map((balloon) => (
        <BalloonShape key={balloon.number} balloon={balloon} />
      ))}
      {lastBalloon ? <Label x={lastBalloon.x + 15} y={lastBalloon.y + 4.5} text="whole anchor" /> : null}
    </g>
  );
}

function ScaleBar({ bar }: { bar: NonNullable<Drawing["scaleBar"]> }) {
  const half = bar.length / 2;
  return (
    <g transform={`translate(${bar.at.x} ${bar.at.y})`}>
      <rect width={half} height="5" className="fill-text" />
      <rect x={half} width={half} height="5" className="fill-surface stroke-text" strokeWidth="1" />
      <Label x={0} y={-6} text="0" />
      <Label x={bar.length} y={-6} end text={bar.label} />
    </g>
  );
}

function NotToScale({ bottom }: { bottom: number }) {
  return (
    <g>
      <rect x="16" y={bottom - 42} width="126" height="26" className="fill-warn-ground stroke-warn-fill" />
      <text x="79" y={bottom - 24} fontSize="14" textAnchor="middle" className="fill-warn font-bold">
        NOT TO SCALE
      </text>
    </g>
  );
}

function NorthArrow({ north }: { north: NonNullable<Drawing["north"]> }) {
  const turn = (Math.atan2(north.dx, -north.dy) * 180) / Math.PI;
  return (
    <g transform={`translate(${north.at.x} ${north.at.y})`}>
      <circle r="16" className="fill-surface stroke-text" strokeWidth="1" />
      <path d="M0-12 4.2 8.5 0 5-4.2 8.5Z" transform={`rotate(${turn})`} className="fill-text" />
      <text
        x={north.dx * 24}
        y={north.dy * 24 + 4.5}
        fontSize="13"
        textAnchor="middle"
        className="fill-text stroke-rock font-bold [paint-order:stroke]"
        strokeWidth="3"
      >
        N
      </text>
    </g>
  );
}
