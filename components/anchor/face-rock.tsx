import type { Dimension, DrawnEdge, FaceDrawing } from "@/components/anchor/face-primitives";
import { cx } from "@/components/ui/cx";

/** What everything is drawn on: rock, its hatched border, the measuring grid, edges, old holes, blocks, dimensions. */
export function FaceRock({ drawing, id }: { drawing: FaceDrawing; id: string }) {
  const { width, height, grid } = drawing;
  return (
    <g>
      <defs>
        <pattern
          id={`${id}-hatch`}
          width="7"
          height="7"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <line x1="0" y1="0" x2="0" y2="7" className="stroke-rock-line" strokeWidth="1.4" />
        </pattern>
      </defs>
      <rect width={width} height={height} className="fill-rock" />
      {grid ? (
        <g className="stroke-rock-line" strokeWidth="0.5" opacity="0.6">
          {grid.xs.map((x) => (
            <line key={x} x1={x} y1="0" x2={x} y2={height} />
          ))}
          {grid.ys.map((y) => (
            <line key={y} x1="0" y1={y} x2={width} y2={y} />
          ))}
        </g>
      ) : null}
      <path
        d={`M0 0H${width}V${height}H0ZM8 8V${height - 8}H${width - 8}V8Z`}
        fillRule="evenodd"
        fill={`url(#${id}-hatch)`}
      />
      {drawing.setAside ? <SetAside box={drawing.setAside} /> : null}
      {drawing.bodies.map((body) => (
        <BodyOutline key={body.label} body={body} />
      ))}
      {drawing.edges.map((edge) => (
        <EdgeLine key={edge.label} edge={edge} />
      ))}
      {drawing.deadHoles.map((hole) => (
        <g key={`${hole.x} ${hole.y}`} className="stroke-muted" strokeWidth="1.4">
          <circle cx={hole.x} cy={hole.y} r="4" fill="none" />
          <path d={`M${hole.x - 6} ${hole.y + 6}L${hole.x + 6} ${hole.y - 6}`} />
        </g>
      ))}
      {drawing.dimensions.map((dimension) => (
        <DimensionLine key={`${dimension.from.x} ${dimension.to.x}`} dimension={dimension} />
      ))}
    </g>
  );
}

/** A block that is not part of the cliff: a chain line round what sits in it. */
function BodyOutline({ body }: { body: FaceDrawing["bodies"][number] }) {
  return (
    <g>
      <rect
        x={body.at.x}
        y={body.at.y}
        width={body.width}
        height={body.height}
        rx="18"
        fill="none"
        className="stroke-warn-fill"
        strokeWidth="1.6"
        strokeDasharray="9 4 2 4"
      />
      <text
        x={body.at.x + 10}
        y={body.at.y + body.height + 14}
        fontSize="12.5"
        className="fill-warn font-medium"
      >
        {body.label}
      </text>
    </g>
  );
}

function SetAside({ box }: { box: NonNullable<FaceDrawing["setAside"]> }) {
  return (
    <g>
      <rect
        x={box.at.x}
        y={box.at.y}
        width={box.width}
        height={box.height}
        className="fill-surface stroke-line-strong"
        strokeDasharray="5 3"
      />
      <text x={box.at.x + 8} y={box.at.y + 15} fontSize="12.5" className="fill-muted font-medium">
        position not measured
      </text>
    </g>
  );
}

/** A sharp edge is a heavy line, a rounded one double, a smooth one thin; the strokes lie on the rock side. */
function EdgeLine({ edge }: { edge: DrawnEdge }) {
  const { from, to, rockSide } = edge;
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const along = { x: (to.x - from.x) / (length || 1), y: (to.y - from.y) / (length || 1) };
  const strokes = Array.from({ length: Math.floor(length / 9) }, (_, index) => {
    const x = from.x + along.x * (index + 0.5) * 9;
    const y = from.y + along.y * (index + 0.5) * 9;
    return `M${x.toFixed(1)} ${y.toFixed(1)}l${((rockSide.x - along.x) * 6).toFixed(1)} ${((rockSide.y - along.y) * 6).toFixed(1)}`;
  });
  const line = `M${from.x} ${from.y}L${to.x} ${to.y}`;
  return (
    <g className="stroke-text">
      <path d={strokes.join("")} strokeWidth="1" fill="none" />
      <path d={line} strokeWidth={edge.sharpness === "sharp" ? 3 : 1.4} fill="none" />
      {edge.sharpness === "rounded" ? (
        <path
          d={line}
          strokeWidth="1.4"
          fill="none"
          transform={`translate(${-rockSide.x * 4} ${-rockSide.y * 4})`}
        />
      ) : null}
      <text
        x={Math.max(16, Math.min(from.x, to.x) + 4)}
        y={(from.x <= to.x ? from.y : to.y) + (rockSide.y <= 0 ? 16 : -8)}
        fontSize="12.5"
        className={cx("fill-text stroke-none font-medium")}
      >
        {`${edge.label} (${edge.sharpness})`}
      </text>
    </g>
  );
}

function DimensionLine({ dimension }: { dimension: Dimension }) {
  const { from, to, feet, label } = dimension;
  const middle = (from.x + to.x) / 2;
  return (
    <g className="stroke-muted" strokeWidth="0.8" fill="none">
      <path
        d={`M${from.x} ${from.y - 5}V${feet[0].y - 14}M${to.x} ${to.y - 5}V${feet[1].y - 14}`}
        opacity="0.55"
      />
      <path d={`M${from.x} ${from.y}H${to.x}`} />
      <path d={`M${from.x - 4} ${from.y + 4}l8-8M${to.x - 4} ${to.y + 4}l8-8`} strokeWidth="1.4" />
      <text
        x={middle}
        y={from.y - 4}
        fontSize="12.5"
        textAnchor="middle"
        className="fill-text stroke-none font-medium"
      >
        {label}
      </text>
    </g>
  );
}
