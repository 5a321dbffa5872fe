import Link from "next/link";
import { Quantity } from "@/components/ui/quantity";
import { SourceMark } from "@/components/ui/source-mark";
import { Table, TableBody, TableHead, Td, Th } from "@/components/ui/table";
import { FORM_LABELS, metalLabel, sentence } from "@/lib/domain/labels";
import { FORMS } from "@/lib/domain/vocabulary";
import type { BoltTypeView } from "@/lib/schemas/views/register";

/** The catalogue by form: what it breaks at, and apart from that what it bends at. */
export function TypeList({ types }: { types: readonly BoltTypeView[] }) {
  return (
    <div className="grid gap-8">
      {FORMS.map((form) => {
        const own = types.filter((type) => type.form === form);
        if (own.length === 0) return null;
        return (
          <section key={form} className="grid gap-2">
            <h2>{sentence(FORM_LABELS[form])}</h2>
            <Table caption={`Types: ${FORM_LABELS[form]}`}>
              <TableHead>
                <tr>
                  <Th>Type</Th>
                  <Th>Metal</Th>
                  <Th className="text-right">Rated across</Th>
                  <Th className="text-right">Rated along</Th>
                  <Th className="text-right">Bends from</Th>
                  <Th className="text-right">In the rock</Th>
                </tr>
              </TableHead>
              <TableBody>
                {own.map((type) => (
                  <tr key={type.id}>
                    <Th scope="row" className="min-w-52">
                      <Link href={`/types/${type.id}`} className="underline underline-offset-2">
                        {type.name}
                      </Link>
                      {type.status === "discontinued" ? (
                        <span className="block text-sm font-normal text-muted">discontinued</span>
                      ) : null}
                    </Th>
                    <Td>{metalLabel(type.boltMetal)}</Td>
                    <Td numeric>
                      <Quantity value={type.ratedRadialKn} unit="kN" />
                    </Td>
                    <Td numeric>
                      <Quantity value={type.ratedAxialKn} unit="kN" />
                    </Td>
                    <Td numeric>
                      <OnsetRange type={type} />
                    </Td>
                    <Td numeric>{type.inForce}</Td>
                  </tr>
                ))}
              </TableBody>
            </Table>
          </section>
        );
      })}
    </div>
  );
}

/** One number or a range, with where it comes from. */
export function OnsetRange({ type }: { type: BoltTypeView }) {
  const { bendOnsetLowKn: low, bendOnsetHighKn: high, bendOnsetBasis } = type;
  return (
    <>
      <Quantity value={low} unit="kN" />
      {high !== null && high !== low ? (
        <>
          {" "}
          to <Quantity value={high} unit="kN" />
        </>
      ) : null}
      <span className="block">
        <SourceMark source={bendOnsetBasis} />
      </span>
    </>
  );
}
