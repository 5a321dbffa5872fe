import Link from "next/link";
import { ConditionMark } from "@/components/finding/condition-mark";
import { Quantity } from "@/components/ui/quantity";
import type { AnchorSheet } from "@/lib/schemas/views/anchor";

/** The spans that end at an anchor, each with its other end. */
export function SpanLinks({ spans }: { spans: AnchorSheet["spans"] }) {
  return (
    <ul className="divide-y divide-line border-y border-line">
      {spans.map((span) => (
        <li key={span.id} className="grid grid-cols-[1fr_auto] items-baseline gap-x-4 py-2">
          <Link href={`/spans/${span.id}`} className="py-1 font-semibold text-link">
            {span.name}
          </Link>
          <Quantity value={span.lengthM} unit="m" digits={1} className="text-xl" />
          <span className="col-span-2 flex flex-wrap items-center gap-x-3 text-muted">
            <span>
              to{" "}
              <Link href={`/anchors/${span.otherCode}`} className="inline-block py-1 text-link">
                {span.otherCode} {span.otherLabel}
              </Link>
            </span>
            {span.otherCondition ? <ConditionMark condition={span.otherCondition} /> : null}
          </span>
        </li>
      ))}
    </ul>
  );
}
