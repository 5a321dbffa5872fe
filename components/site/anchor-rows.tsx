import Link from "next/link";
import { ConditionMark } from "@/components/finding/condition-mark";
import { VerdictMark } from "@/components/finding/verdict-mark";
import { PastDate } from "@/components/ui/date-text";
import { StackCell, StackRow, StackTable } from "@/components/ui/stack-table";
import { sentence, usesLabel } from "@/lib/domain/labels";
import type { AnchorSummary } from "@/lib/schemas/views/anchor";

const HEAD = [
  { name: "Anchor" },
  { name: "Condition" },
  { name: "Verdict" },
  { name: "Bolts", numeric: true },
  { name: "Open reports", numeric: true },
  { name: "Last check" },
];

/** The anchors of a place, one row each. */
export function AnchorRows({ anchors, caption }: { anchors: readonly AnchorSummary[]; caption: string }) {
  if (anchors.length === 0) return <p className="text-muted">No anchor is registered here yet.</p>;
  return (
    <StackTable caption={caption} head={HEAD}>
      {anchors.map((anchor) => (
        <AnchorRow key={anchor.id} anchor={anchor} />
      ))}
    </StackTable>
  );
}

function AnchorRow({ anchor }: { anchor: AnchorSummary }) {
  const worst = anchor.reasons.find(({ level }) => level !== "note");
  return (
    <StackRow>
      <StackCell head>
        <Link
          href={`/anchors/${anchor.code}`}
          className="group grid touch grid-cols-[4.5rem_1fr] items-baseline gap-x-2"
        >
          <span className="type-code">{anchor.code}</span>
          <span>
            <span className="font-semibold text-link group-hover:text-action-strong">{anchor.label}</span>
            <span className="block text-sm text-muted">{sentence(usesLabel(anchor.uses))}</span>
          </span>
        </Link>
      </StackCell>
      <StackCell label="Condition">
        <ConditionMark condition={anchor.condition} className="whitespace-normal" />
      </StackCell>
      <StackCell label="Verdict">
        {anchor.verdict ? (
          <VerdictMark verdict={anchor.verdict} />
        ) : (
          <span className="text-muted">not judged yet</span>
        )}
        {worst ? <span className="block text-sm text-muted">{worst.title}</span> : null}
      </StackCell>
      <StackCell label="Bolts" numeric className="type-figure">
        {anchor.boltCount}
      </StackCell>
      <StackCell label="Open reports" numeric className="type-figure max-lg:hidden">
        {anchor.openReports === 0 ? <span className="text-muted">–</span> : anchor.openReports}
      </StackCell>
      <StackCell label="Last check">
        <PastDate on={anchor.lastCheckOn} unknown="never" />
      </StackCell>
    </StackRow>
  );
}
