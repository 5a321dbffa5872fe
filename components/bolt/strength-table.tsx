import { Quantity } from "@/components/ui/quantity";
import { SourceMark, type NumberSource } from "@/components/ui/source-mark";
import { readableText } from "@/lib/shared/readable-text";
import { Table, TableBody, TableHead, Td, Th } from "@/components/ui/table";

interface StrengthTableProps {
  strengths: {
    ratedRadialKn: number | null;
    ratedAxialKn: number | null;
    bendOnsetLowKn: number | null;
    bendOnsetHighKn: number | null;
    bendOnsetAxialKn: number | null;
    bendOnsetBasis: NumberSource;
  };
  /** Where the numbers were read, in words. */
  sourceNote: string;
}

/** Two numbers that are not the same thing: where it keeps a bend, and where it breaks. */
export function StrengthTable({ strengths, sourceNote }: StrengthTableProps) {
  const { bendOnsetLowKn: low, bendOnsetHighKn: high, bendOnsetBasis: basis } = strengths;
  return (
    <div className="grid gap-2">
      <Table caption="Rated strength and bend onset">
        <TableHead>
          <tr>
            <Th>Load</Th>
            <Th className="text-right">Across</Th>
            <Th className="text-right">Along its axis</Th>
            <Th>Source</Th>
          </tr>
        </TableHead>
        <TableBody>
          <tr>
            <Th scope="row">Begins to bend</Th>
            <Td numeric>
              {low !== null && high !== null && high > low ? (
                <>
                  <Quantity value={low} unit="kN" digits={1} />
                  {" to "}
                  <Quantity value={high} unit="kN" digits={1} />
                </>
              ) : (
                <Quantity value={low ?? high} unit="kN" digits={1} />
              )}
            </Td>
            <Td numeric>
              <Quantity value={strengths.bendOnsetAxialKn} unit="kN" digits={1} />
            </Td>
            <Td>
              <SourceMark source={basis} />
            </Td>
          </tr>
          <tr>
            <Th scope="row">Rated to break</Th>
            <Td numeric>
              <Quantity value={strengths.ratedRadialKn} unit="kN" digits={1} />
            </Td>
            <Td numeric>
              <Quantity value={strengths.ratedAxialKn} unit="kN" digits={1} />
            </Td>
            <Td>
              <SourceMark source={strengths.ratedRadialKn === null ? "unknown" : "maker"} />
            </Td>
          </tr>
        </TableBody>
      </Table>
      {basis === "estimate" ? (
        <p className="text-sm text-muted">An estimate is computed from the section; it is never a rating.</p>
      ) : null}
      {sourceNote ? <p className="text-sm text-muted">{readableText(sourceNote)}</p> : null}
    </div>
  );
}
