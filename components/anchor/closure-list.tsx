import { formatPastDate } from "@/lib/shared/format";
import type { ClosureView } from "@/lib/schemas/views/anchor";

/** Access stops that touch this place. */
export function ClosureList({ closures }: { closures: readonly ClosureView[] }) {
  return (
    <ul className="divide-y divide-line border-y border-line">
      {closures.map((closure) => (
        <li key={closure.id} className="py-2">
          <span className="font-semibold">{closure.reason}</span>
          <span className="block text-muted">
            {closure.scopeName}: {periodOf(closure)}
            {closure.source ? ` · ${closure.source}` : ""}
          </span>
        </li>
      ))}
    </ul>
  );
}

/** "1 March to 15 August, every year"; "from 4 May 2026 until lifted". */
export function periodOf({ startsOn, endsOn, yearly }: ClosureView): string {
  if (yearly && endsOn) return `${dayOfYear(startsOn)} to ${dayOfYear(endsOn)}, every year`;
  return endsOn
    ? `${formatPastDate(startsOn)} to ${formatPastDate(endsOn)}`
    : `from ${formatPastDate(startsOn)} until lifted`;
}

function dayOfYear(on: string): string {
  return formatPastDate(on).replace(/ \d{4}$/, "");
}
