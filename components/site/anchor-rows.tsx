import Link from "next/link";
import { ConditionMark } from "@/components/finding/condition-mark";
import { VerdictMark } from "@/components/finding/verdict-mark";
import { PastDate } from "@/components/ui/date-text";
import { Table, TableBody, TableHead, Td, Th } from "@/components/ui/table";
import { sentence, usesLabel } from "@/lib/domain/labels";
import type { AnchorSummary } from "@/lib/schemas/views/anchor";

/** The anchors of a place, one row each. */
export function AnchorRows({ anchors, caption }: { anchors: readonly AnchorSummary[]; caption: string }) {
  if (anchors.length === 0) return <p className="text-muted">No anchor is registered here yet.</p>;
  return (
    <Table caption={caption}>
      <TableHead>
        <tr>
          <Th>Code</Th>
          <Th>Anchor</Th>
          <Th>Condition</Th>
          <Th>Verdict</Th>
          <Th className="text-right">Bolts</Th>
          <Th>Last check</Th>
        </tr>
      </TableHead>
      <TableBody>
        {anchors.map((anchor) => (
          <tr key={anchor.id}>
            <Td className="type-code whitespace-nowrap">{anchor.code}</Td>
            <Th scope="row" className="min-w-44">
              <Link href={`/anchors/${anchor.code}`} className="underline underline-offset-2">
                {anchor.label}
              </Link>
              <span className="block text-sm font-normal text-muted">{sentence(usesLabel(anchor.uses))}</span>
            </Th>
            <Td>
              <ConditionMark condition={anchor.condition} verdict={anchor.verdict} />
            </Td>
            <Td className="min-w-40">
              {anchor.verdict ? (
                <VerdictMark verdict={anchor.verdict} />
              ) : (
                <span className="text-muted">not judged yet</span>
              )}
              {anchor.reasons[0] && anchor.reasons[0].level !== "note" ? (
                <span className="block text-sm text-muted">{anchor.reasons[0].title}</span>
              ) : null}
            </Td>
            <Td numeric>{anchor.boltCount}</Td>
            <Td className="whitespace-nowrap">
              <PastDate on={anchor.lastCheckOn} unknown="never" />
            </Td>
          </tr>
        ))}
      </TableBody>
    </Table>
  );
}
