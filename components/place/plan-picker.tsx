"use client";

interface LonLat {
  lon: number;
  lat: number;
}

interface PlanPickerProps {
  /** What is there already. */
  marks: readonly (LonLat & { name: string })[];
  picked: LonLat | null;
  onPick: (at: LonLat) => void;
}

/** Metres of a degree of latitude on a sphere of the Earth's mean radius (6 371 km): for a drawing, not a survey. */
const METRES_PER_DEGREE = 111_195;
/** Ground shown around the outermost mark, m. */
const MARGIN_M = 60;

/** A plan of the anchors around, north up: tap where the anchor is. The numbers beside it say the same. */
export function PlanPicker({ marks, picked, onPick }: PlanPickerProps) {
  const all = [...marks, ...(picked ? [picked] : [])];
  const [first] = all;
  if (!first) return null;
  const middle = (min: number, max: number) => (min + max) / 2;
  const lons = all.map(({ lon }) => lon);
  const lats = all.map(({ lat }) => lat);
  const origin = {
    lon: middle(Math.min(...lons), Math.max(...lons)),
    lat: middle(Math.min(...lats), Math.max(...lats)),
  };
  const perLon = METRES_PER_DEGREE * Math.cos((origin.lat * Math.PI) / 180);
  const half = {
    x: ((Math.max(...lons) - Math.min(...lons)) / 2) * perLon + MARGIN_M,
    y: ((Math.max(...lats) - Math.min(...lats)) / 2) * METRES_PER_DEGREE + MARGIN_M,
  };
  const xOf = ({ lon }: LonLat) => half.x + (lon - origin.lon) * perLon;
  const yOf = ({ lat }: LonLat) => half.y - (lat - origin.lat) * METRES_PER_DEGREE;
  const dot = Math.max(half.x, half.y) / 40;
  // A name is left out where it would lie on another: the mark stays, and the list of the site has them all.
  const named = marks.reduce<PlanPickerProps["marks"]>((kept, mark) => {
    const covered = kept.some(
      (one) => Math.abs(xOf(one) - xOf(mark)) < 7 * dot && Math.abs(yOf(one) - yOf(mark)) < 2 * dot,
    );
    return covered ? kept : [...kept, mark];
  }, []);

  return (
    <figure className="grid gap-1">
      <svg
        viewBox={`0 0 ${2 * half.x} ${2 * half.y}`}
        className="max-h-80 w-full cursor-crosshair touch-manipulation border border-line-strong bg-rock"
        role="img"
        aria-label="Plan of the anchors around, north up. Tap to place the anchor, or type its position below."
        onClick={(event) => {
          const box = event.currentTarget.getBoundingClientRect();
          // The drawing keeps its proportions inside the box: undo the scale and the centring.
          const scale = Math.min(box.width / (2 * half.x), box.height / (2 * half.y));
          const x = (event.clientX - box.left - (box.width - 2 * half.x * scale) / 2) / scale;
          const y = (event.clientY - box.top - (box.height - 2 * half.y * scale) / 2) / scale;
          onPick({
            lon: origin.lon + (x - half.x) / perLon,
            lat: origin.lat - (y - half.y) / METRES_PER_DEGREE,
          });
        }}
      >
        {marks.map((mark) => (
          <g key={mark.name} transform={`translate(${xOf(mark)} ${yOf(mark)})`}>
            <circle r={dot * 0.7} className="fill-surface stroke-text" strokeWidth={dot / 5} />
            {named.includes(mark) ? (
              <text x={dot} y={dot * 0.5} fontSize={dot * 1.6} className="fill-text font-label">
                {mark.name}
              </text>
            ) : null}
          </g>
        ))}
        {picked ? (
          <g
            transform={`translate(${xOf(picked)} ${yOf(picked)})`}
            className="stroke-action"
            strokeWidth={dot / 4}
          >
            <circle r={dot} className="fill-calm-ground" />
            <path d={`M${-dot * 2} 0H${dot * 2}M0 ${-dot * 2}V${dot * 2}`} />
          </g>
        ) : null}
      </svg>
      <figcaption className="text-sm text-muted">
        North is up; what you see is {Math.round(2 * half.x)} m wide. A tap is only as good as the plan: say
        below how well you know the place.
      </figcaption>
    </figure>
  );
}
