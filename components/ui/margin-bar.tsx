import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";
import { SourceMark, type NumberSource } from "@/components/ui/source-mark";
import { formatQuantity } from "@/lib/shared/format";

interface MarginBarProps {
  /** What is compared: "Peak across bolt 3". */
  label: ReactNode;
  value: number | null;
  limit: number | null;
  unit: string;
  digits?: number;
  /** "atMost": passing the limit is bad (a load). "atLeast": falling short of it is (a depth). */
  kind?: "atMost" | "atLeast";
  /** "bends from", "floor", "rated": stands beside the limit. */
  limitLabel?: string;
  source?: NumberSource;
  /** The one sentence that says what it means. */
  children?: ReactNode;
  className?: string;
}

/**
 * Value against limit on one straight scale from zero. The limit is a line across the bar, what lies beyond
 * it is hatched; the words carry the same.
 */
export function MarginBar(props: MarginBarProps) {
  const {
    label,
    value,
    limit,
    unit,
    digits,
    kind = "atMost",
    limitLabel = "limit",
    source,
    children,
  } = props;
  const words = (number: number | null) =>
    number === null ? "not known" : formatQuantity(number, unit, { digits });
  const beyond = value !== null && limit !== null && (kind === "atMost" ? value > limit : value < limit);
  return (
    <figure className={cx("grid gap-1", props.className)}>
      <figcaption className="flex flex-wrap items-baseline justify-between gap-x-4">
        <span className="type-label">{label}</span>
        <span className={cx("type-figure text-lg", beyond && "text-stop")}>{words(value)}</span>
      </figcaption>
      <Bar value={value} limit={limit} fillTo={kind === "atMost" ? limit : null} beyond={beyond} />
      <p className="flex flex-wrap items-baseline justify-between gap-x-4 text-sm text-muted">
        <span>{beyond ? BEYOND[kind] : null}</span>
        <span className="inline-flex items-baseline gap-2">
          <span className="type-figure">
            {limitLabel} {words(limit)}
          </span>
          {source ? <SourceMark source={source} /> : null}
        </span>
      </p>
      {children ? <p className="text-sm">{children}</p> : null}
    </figure>
  );
}

const BEYOND = { atMost: "over the limit", atLeast: "short of the limit" } as const;

interface BarProps {
  value: number | null;
  limit: number | null;
  /** Where the solid part ends at the latest; the rest is hatched. */
  fillTo: number | null;
  beyond: boolean;
}

function Bar({ value, limit, fillTo, beyond }: BarProps) {
  const top = Math.max(value ?? 0, limit ?? 0) * 1.15 || 1;
  const percent = (n: number) => `${((100 * Math.max(0, n)) / top).toFixed(2)}%`;
  const solid = Math.min(value ?? 0, fillTo ?? Infinity);
  return (
    <svg aria-hidden="true" className="block h-5 w-full overflow-visible" focusable="false">
      <rect
        y="5"
        width="100%"
        height="10"
        className="fill-sunk stroke-line-strong"
        strokeDasharray={value === null ? "4 3" : undefined}
      />
      <rect
        y="5"
        width={percent(solid)}
        height="10"
        className={beyond ? "fill-stop-fill" : "fill-calm-fill"}
      />
      {value !== null && value > solid ? <Hatched x={percent(solid)} width={percent(value - solid)} /> : null}
      {limit !== null ? (
        <line
          x1={percent(limit)}
          x2={percent(limit)}
          y1="0"
          y2="20"
          className="stroke-text"
          strokeWidth="2.5"
        />
      ) : null}
    </svg>
  );
}

function Hatched({ x, width }: { x: string; width: string }) {
  return (
    <svg x={x} y="5" width={width} height="10" className="overflow-hidden">
      <rect width="100%" height="10" className="fill-stop-ground" />
      {Array.from({ length: 120 }, (_, index) => (
        <line
          key={index}
          x1={index * 8 - 10}
          y1="10"
          x2={index * 8}
          y2="0"
          className="stroke-stop-fill"
          strokeWidth="2.5"
        />
      ))}
    </svg>
  );
}
