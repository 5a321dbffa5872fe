import { cx } from "@/components/ui/cx";
import { formatQuantity } from "@/lib/shared/format";

/** A number with its unit, never broken apart; "not known" when there is none. */
export function Quantity({
  value,
  unit,
  digits,
  signed,
  className,
}: {
  value: number | null;
  unit: string;
  /** Digits after the point; left out: as many as the value needs, at most two. */
  digits?: number;
  /** Writes + as well as −. */
  signed?: boolean;
  className?: string;
}) {
  if (value === null) return <span className={cx("text-muted", className)}>not known</span>;
  return (
    <span className={cx("type-figure whitespace-nowrap", className)}>
      {formatQuantity(value, unit, { digits, signed })}
    </span>
  );
}
