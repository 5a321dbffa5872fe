import { ReasonItem, ReasonList } from "@/components/finding/reason-item";
import { VerdictMark } from "@/components/finding/verdict-mark";
import { Disclosure } from "@/components/ui/disclosure";
import { MarkShape } from "@/components/finding/condition-mark";
import { Table, TableBody, TableHead, Td, Th } from "@/components/ui/table";
import { sentence, USE_LABELS, VERDICT_LABELS } from "@/lib/domain/labels";
import { USES, type Use } from "@/lib/domain/vocabulary";
import { VERDICT_MARKS } from "@/lib/map/marks";
import type { TypeMatrix as Matrix } from "@/lib/schemas/views/register";
import { readableText } from "@/lib/shared/readable-text";

type Cell = Matrix["cells"][number];

/** Each use against each kind of place; below it the reasons, use by use. A phone shows the latter only. */
export function TypeMatrix({ matrix, name }: { matrix: Matrix; name: string }) {
  return (
    <div className="grid gap-6">
      <p className="max-w-prose text-sm text-muted">
        Assumed: {readableText(matrix.assumed.join("; "))}. Judged by rules {matrix.engine} for{" "}
        {readableText(matrix.onDate)}.
      </p>
      <div className="max-lg:hidden print:block">
        <MatrixTable matrix={matrix} name={name} />
      </div>
      <p className="max-w-prose border-l-4 border-warn-fill bg-warn-ground px-4 py-3">{matrix.caution}</p>
      <div className="grid items-start gap-x-10 gap-y-8 lg:grid-cols-2">
        {USES.map((use) => (
          <UseReasons key={use} use={use} matrix={matrix} />
        ))}
      </div>
    </div>
  );
}

function MatrixTable({ matrix, name }: { matrix: Matrix; name: string }) {
  return (
    <Table caption={`Verdict on ${name} by use and place`}>
      <TableHead>
        <tr>
          <Th>Place</Th>
          {USES.map((use) => (
            <Th key={use}>{sentence(USE_LABELS[use])}</Th>
          ))}
        </tr>
      </TableHead>
      <TableBody>
        {matrix.places.map((place) => (
          <tr key={place.key}>
            <Th scope="row" className="min-w-36 align-middle print:px-1">
              {place.label}
            </Th>
            {USES.map((use) => {
              const cell = cellOf(matrix, use, place.key);
              return (
                <Td key={use} className="px-0 py-0 align-middle">
                  {cell ? <MatrixLink cell={cell} /> : null}
                </Td>
              );
            })}
          </tr>
        ))}
      </TableBody>
    </Table>
  );
}

function MatrixLink({ cell }: { cell: Cell }) {
  return (
    <a
      href={`#${anchorOf(cell)}`}
      className="flex min-h-14 items-center gap-2 border-l border-line px-2 py-1 text-sm leading-tight hover:bg-sunk hover:underline print:px-1"
    >
      <MarkShape mark={VERDICT_MARKS[cell.verdict]} />
      {VERDICT_LABELS[cell.verdict]}
    </a>
  );
}

function cellOf(matrix: Matrix, use: Use, place: string): Cell | undefined {
  return matrix.cells.find((one) => one.use === use && one.place === place);
}

/** One use: its kinds of place, each with its verdict and, when asked for, the reasons. */
function UseReasons({ use, matrix }: { use: Use; matrix: Matrix }) {
  return (
    <section>
      <h3 className="border-b border-frame pb-1">{sentence(USE_LABELS[use])}</h3>
      {matrix.places.map((place) => {
        const cell = cellOf(matrix, use, place.key);
        return cell ? <PlaceReasons key={place.key} cell={cell} label={place.label} /> : null;
      })}
    </section>
  );
}

function PlaceReasons({ cell, label }: { cell: Cell; label: string }) {
  const line = (
    <span className="flex grow flex-wrap items-center justify-between gap-x-3">
      <span>{label}</span>
      <VerdictMark verdict={cell.verdict} />
    </span>
  );
  const id = anchorOf(cell);
  if (cell.findings.length === 0) {
    return (
      <p id={id} className="flex touch items-center border-b border-line py-2 pl-5 target:bg-calm-ground">
        {line}
      </p>
    );
  }
  return (
    <Disclosure summary={line} className="border-t-0">
      {/* The target of the table's links lies inside, so that following one opens it. */}
      <div id={id} className="scroll-mt-16 target:bg-calm-ground">
        <ReasonList label={`Reasons: ${USE_LABELS[cell.use]}, ${label}`}>
          {cell.findings.map((reason, index) => (
            <ReasonItem
              key={`${reason.code}-${reason.title}`}
              number={index + 1}
              reason={reason}
              idPrefix={id}
            />
          ))}
        </ReasonList>
      </div>
    </Disclosure>
  );
}

function anchorOf(cell: Pick<Cell, "use" | "place">): string {
  return `${cell.use}-${cell.place}`;
}
