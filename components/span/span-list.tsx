import Link from "next/link";
import { ConditionMark } from "@/components/finding/condition-mark";
import { Quantity } from "@/components/ui/quantity";
import { Table, TableBody, TableHead, Td, Th } from "@/components/ui/table";
import type { SpanView } from "@/lib/schemas/views/register";

/** Spans, shortest first, with how both ends stand. */
export function SpanList({ spans }: { spans: readonly SpanView[] }) {
  if (spans.length === 0) return <p className="text-muted">No span is registered that you may see.</p>;
  return (
    <Table caption="Spans, shortest first">
      <TableHead>
        <tr>
          <Th>Span</Th>
          <Th className="text-right">Length</Th>
          <Th>From</Th>
          <Th>To</Th>
        </tr>
      </TableHead>
      <TableBody>
        {spans.map((span) => (
          <tr key={span.id}>
            <Th scope="row" className="min-w-32">
              <Link href={`/spans/${span.id}`} className="underline underline-offset-2">
                {span.name}
              </Link>
              <span className="block text-sm font-normal text-muted">{span.a.siteName}</span>
            </Th>
            <Td numeric>
              <Quantity value={span.lengthM} unit="m" digits={1} />
            </Td>
            {[span.a, span.b].map((end) => (
              <Td key={end.id} className="min-w-44">
                <Link href={`/anchors/${end.code}`} className="type-code underline underline-offset-2">
                  {end.code}
                </Link>
                <span className="block">
                  <ConditionMark condition={end.condition} verdict={end.verdict} />
                </span>
              </Td>
            ))}
          </tr>
        ))}
      </TableBody>
    </Table>
  );
}
