import { formatNumber } from "@/lib/shared/format";

interface Part {
  key: string;
  label: string;
  points: number;
  max: number;
  why: string;
}

/** The named parts of a priority: what each gives of how much, as a bar and in words. */
export function PriorityBars({ parts }: { parts: readonly Part[] }) {
  return (
    <dl className="grid gap-2.5">
      {parts.map((part) => (
        <div key={part.key} className="grid grid-cols-[6rem_1fr_5rem] items-center gap-x-3">
          <dt className="type-label">{part.label}</dt>
          <dd aria-hidden="true">
            <PartBar part={part} />
          </dd>
          <dd className="text-right type-figure text-sm">
            {formatNumber(part.points, { digits: 1 })} of {part.max}
          </dd>
          <dd className="col-span-3 text-sm text-muted">{part.why}</dd>
        </div>
      ))}
    </dl>
  );
}

/** Length of the whole is what the part may give at most, so that the bars can be compared with each other. */
function PartBar({ part }: { part: Part }) {
  const full = (100 * part.max) / LARGEST;
  const filled = (100 * Math.min(part.points, part.max)) / LARGEST;
  return (
    <svg className="block h-2.5 w-full" focusable="false">
      <rect width={`${full}%`} height="100%" className="fill-sunk stroke-line-strong" />
      <rect width={`${filled}%`} height="100%" className="fill-action" />
    </svg>
  );
}

/** The most one part gives. */
const LARGEST = 40;

/** All parts in one strip, for a row of the list. The words stand beside it. */
export function PriorityStrip({ parts }: { parts: readonly Part[] }) {
  const starts = parts.map((_, index) => parts.slice(0, index).reduce((sum, part) => sum + part.points, 0));
  return (
    <svg aria-hidden="true" className="block h-3 w-full max-w-56" focusable="false">
      <rect width="100%" height="100%" className="fill-sunk stroke-line-strong" />
      {parts.map((part, index) => (
        <rect
          key={part.key}
          x={`${starts[index] ?? 0}%`}
          width={`${part.points}%`}
          height="100%"
          className="fill-action stroke-surface"
        />
      ))}
    </svg>
  );
}
