import Link from "next/link";
import { PastDate } from "@/components/ui/date-text";
import { cx } from "@/components/ui/cx";
import { FORM_LABELS, sentence } from "@/lib/domain/labels";
import type { BoltView } from "@/lib/schemas/views/bolt";

/** The bolts of one hole, newest first, as beads on a line: filled is in the rock now, hollow is gone. */
export function BoltChain({ chain, currentId }: { chain: readonly BoltView[]; currentId?: string }) {
  return (
    <ol className="ml-1.5 border-l-2 border-line-strong">
      {chain.map((bolt) => (
        <li
          key={bolt.id}
          className={cx(
            "relative py-1.5 pl-4 before:absolute before:top-[1.05rem] before:-left-[7px] before:size-3 before:rounded-full before:border-2 before:border-text",
            isGone(bolt) ? "before:bg-surface" : "before:bg-text",
          )}
        >
          {bolt.id === currentId ? (
            <span aria-current="true" className="inline-block py-1 font-semibold">
              {nameOf(bolt)}
            </span>
          ) : (
            <Link href={`/bolts/${bolt.id}`} className="inline-block py-1 text-link">
              {nameOf(bolt)}
            </Link>
          )}
          <span className="block text-sm text-muted">
            set <PastDate on={bolt.installedOn} precision={bolt.installedOnPrecision} />
            {bolt.removedOn ? (
              <>
                , out <PastDate on={bolt.removedOn} />
              </>
            ) : null}
            {bolt.removedWhy ? `: ${bolt.removedWhy}` : ""}
            {bolt.struckReason ? ` · struck through: ${bolt.struckReason}` : ""}
          </span>
        </li>
      ))}
    </ol>
  );
}

function isGone(bolt: BoltView): boolean {
  return bolt.removedOn !== null || bolt.struckReason !== null;
}

function nameOf(bolt: BoltView): string {
  return bolt.typeName ?? sentence(FORM_LABELS[bolt.form]);
}
