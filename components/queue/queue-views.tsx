import Link from "next/link";
import { cx } from "@/components/ui/cx";
import { JOB_STATE_LABELS, sentence } from "@/lib/domain/labels";
import type { QueueShow } from "@/lib/schemas/rebolt";

type Show = QueueShow;
type Sort = "rank" | "waiting" | "due";

const SHOW_LABELS: Readonly<Record<Show, string>> = {
  open: "To do",
  mine: "Given to me",
  done: sentence(JOB_STATE_LABELS.done),
  turned_down: sentence(JOB_STATE_LABELS.turned_down),
};
const SORTS: readonly { sort: Sort; label: string }[] = [
  { sort: "rank", label: "rank" },
  { sort: "waiting", label: "waiting longest" },
  { sort: "due", label: "due first" },
];

/** Which entries, and in which order: plain links, so that a view can be sent to somebody. */
export function QueueViews({ shows, show, sort }: { shows: readonly Show[]; show: Show; sort: Sort }) {
  return (
    <div className="flex flex-wrap items-center justify-between gap-x-8 gap-y-2">
      <nav aria-label="Which entries" className="flex flex-wrap gap-1 border-b-2 border-frame">
        {shows.map((one) => (
          <Step key={one} href={`/queue?show=${one}&sort=${sort}`} current={one === show}>
            {SHOW_LABELS[one]}
          </Step>
        ))}
      </nav>
      <nav aria-label="Order" className="flex flex-wrap items-center gap-1">
        <span className="type-label text-muted">Order by</span>
        {SORTS.map((one) => (
          <Step key={one.sort} href={`/queue?show=${show}&sort=${one.sort}`} current={one.sort === sort}>
            {one.label}
          </Step>
        ))}
      </nav>
    </div>
  );
}

function Step({ href, current, children }: { href: string; current: boolean; children: string }) {
  return (
    <Link
      href={href}
      aria-current={current ? "true" : undefined}
      className={cx(
        "flex touch items-center px-3 font-label font-semibold [font-stretch:82%]",
        current ? "bg-sunk text-text" : "text-muted hover:text-text",
      )}
    >
      {children}
    </Link>
  );
}
