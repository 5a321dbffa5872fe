import Link from "next/link";
import { ConditionMark } from "@/components/finding/condition-mark";
import { Quantity } from "@/components/ui/quantity";
import { StackCell, StackRow, StackTable } from "@/components/ui/stack-table";
import type { SpanView } from "@/lib/schemas/views/register";

const HEAD = [{ name: "Span" }, { name: "Length", numeric: true }, { name: "From" }, { name: "To" }];

/** Spans, shortest first, with how both ends stand. */
export function SpanList({ spans }: { spans: readonly SpanView[] }) {
  if (spans.length === 0) return <p className="text-muted">No span is registered that you may see.</p>;
  return (
    <StackTable caption="Spans, shortest first" head={HEAD}>
      {spans.map((span) => (
        <StackRow key={span.id}>
          <StackCell head className="max-lg:col-span-1">
            <Link
              href={`/spans/${span.id}`}
              className="inline-block text-lg font-semibold text-link max-lg:py-1"
            >
              {span.name}
            </Link>
            <span className="block text-sm text-muted">{span.a.siteName}</span>
          </StackCell>
          <StackCell numeric className="text-right">
            <Quantity value={span.lengthM} unit="m" digits={1} className="text-2xl" />
          </StackCell>
          {[span.a, span.b].map((end, index) => (
            <StackCell key={end.id} label={index === 0 ? "From" : "To"}>
              <Link href={`/anchors/${end.code}`} className="inline-block text-link max-lg:py-1">
                <span className="type-code">{end.code}</span> {end.label}
              </Link>
              <ConditionMark
                condition={end.condition}
                verdict={end.verdict}
                className="flex whitespace-normal"
              />
            </StackCell>
          ))}
        </StackRow>
      ))}
    </StackTable>
  );
}
