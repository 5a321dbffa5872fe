import Link from "next/link";
import { PastDate } from "@/components/ui/date-text";
import { FORM_LABELS, sentence } from "@/lib/domain/labels";
import type { PlacementView } from "@/lib/schemas/views/anchor";

/** What stood in each hole before: the chain of bolts, newest first. */
export function HoleHistory({ placements }: { placements: readonly PlacementView[] }) {
  const withPast = placements.filter((placement) => placement.former.length > 0);
  if (withPast.length === 0)
    return <p className="text-muted">Every bolt is the first in its hole, as far as recorded.</p>;
  return (
    <ol className="grid gap-3">
      {withPast.map(({ id, number, bolt, former }) => (
        <li key={id} className="grid grid-cols-[2.5rem_1fr] gap-2">
          <span className="type-figure text-lg">{number}</span>
          <ol className="border-l-2 border-line-strong">
            {[...(bolt ? [bolt] : []), ...former].map((one) => (
              <li
                key={one.id}
                className="relative py-1 pl-4 before:absolute before:top-3.5 before:-left-[5px] before:size-2 before:rounded-full before:bg-text"
              >
                <Link href={`/bolts/${one.id}`} className="underline underline-offset-2">
                  {one.typeName ?? sentence(FORM_LABELS[one.form])}
                </Link>
                <span className="text-muted">
                  {" "}
                  · set <PastDate on={one.installedOn} precision={one.installedOnPrecision} />
                  {one.removedOn ? (
                    <>
                      , out <PastDate on={one.removedOn} />
                    </>
                  ) : null}
                  {one.removedWhy ? `: ${one.removedWhy}` : ""}
                  {one.struckReason ? ` · struck through: ${one.struckReason}` : ""}
                </span>
              </li>
            ))}
          </ol>
        </li>
      ))}
    </ol>
  );
}
