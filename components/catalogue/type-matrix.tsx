import { ReasonItem, ReasonList } from "@/components/finding/reason-item";
import { VerdictMark } from "@/components/finding/verdict-mark";
import { Disclosure } from "@/components/ui/disclosure";
import { MarkShape } from "@/components/finding/condition-mark";
import { Table, TableBody, TableHead, Td, Th } from "@/components/ui/table";
import { sentence, USE_LABELS, VERDICT_LABELS } from "@/lib/domain/labels";
import { USES, type Use } from "@/lib/domain/vocabulary";
import { VERDICT_MARKS } from "@/lib/map/marks";
import type { TypeMatrix as Matrix } from "@/lib/schemas/views/register";

type Cell = Matrix["cells"][number];

/** Each use against each kind of place; below it the reasons, use by use. */
export function TypeMatrix({ matrix, name }: { matrix: Matrix; name: string }) {
  return (
    <div className="grid gap-6">
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
              <Th scope="row" className="min-w-36">
                {place.label}
              </Th>
              {USES.map((use) => {
                const cell = matrix.cells.find((one) => one.use === use && one.place === place.key);
                return (
                  <Td key={use}>
                    {cell ? (
                      <a
                        href={`#${anchorOf(cell)}`}
                        className="flex touch min-w-24 items-center gap-1.5 text-sm leading-tight hover:underline"
                      >
                        <MarkShape mark={VERDICT_MARKS[cell.verdict]} />
                        {VERDICT_LABELS[cell.verdict]}
                      </a>
                    ) : null}
                  </Td>
                );
              })}
            </tr>
          ))}
        </TableBody>
      </Table>
      <p className="max-w-prose text-sm text-muted">
        Assumed: {matrix.assumed.join(", ")}. Rules {matrix.engine}, {matrix.onDate}. {matrix.caution}
      </p>
      <div className="grid gap-4">
        {USES.map((use) => (
          <UseReasons key={use} use={use} matrix={matrix} />
        ))}
      </div>
    </div>
  );
}

function UseReasons({ use, matrix }: { use: Use; matrix: Matrix }) {
  return (
    <section className="grid">
      <h3 className="py-1">{sentence(USE_LABELS[use])}</h3>
      {matrix.places.map((place) => {
        const cell = matrix.cells.find((one) => one.use === use && one.place === place.key);
        if (!cell) return null;
        return (
          <div key={place.key} id={anchorOf(cell)} className="scroll-mt-4 target:bg-calm-ground">
            {cell.findings.length === 0 ? (
              <p className="flex flex-wrap items-center gap-x-3 border-y border-line py-2">
                <span className="font-semibold">{place.label}</span> <VerdictMark verdict={cell.verdict} />
              </p>
            ) : (
              <Disclosure
                summary={
                  <span className="flex flex-wrap items-center gap-x-3">
                    {place.label} <VerdictMark verdict={cell.verdict} />
                    <span className="type-label font-normal text-muted">
                      {cell.findings.length} {cell.findings.length === 1 ? "reason" : "reasons"}
                    </span>
                  </span>
                }
              >
                <ReasonList label={`Reasons: ${USE_LABELS[use]}, ${place.label}`}>
                  {cell.findings.map((reason, index) => (
                    <ReasonItem
                      key={`${reason.code}-${reason.title}`}
                      number={index + 1}
                      reason={reason}
                      idPrefix={anchorOf(cell)}
                    />
                  ))}
                </ReasonList>
              </Disclosure>
            )}
          </div>
        );
      })}
    </section>
  );
}

function anchorOf(cell: Pick<Cell, "use" | "place">): string {
  return `${cell.use}-${cell.place}`;
}
