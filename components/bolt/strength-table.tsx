import { Quantity } from "@/components/ui/quantity";
import { SourceMark, type NumberSource } from "@/components/ui/source-mark";
import { readableText } from "@/lib/shared/readable-text";
import { StackCell, StackRow, StackTable } from "@/components/ui/stack-table";

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

const HEAD = [
  { name: "Load" },
  { name: "Across", numeric: true },
  { name: "Along its axis", numeric: true },
  { name: "Source" },
];

/** Two numbers that are not the same thing: where it keeps a bend, and where it breaks. */
export function StrengthTable({ strengths, sourceNote }: StrengthTableProps) {
  const { bendOnsetLowKn: low, bendOnsetHighKn: high, bendOnsetBasis: basis } = strengths;
  return (
    <div className="grid gap-2">
      <StackTable caption="Rated strength and bend onset" head={HEAD}>
        <StackRow>
          <StackCell head className="font-semibold">
            Begins to bend
          </StackCell>
          <StackCell label="Across" numeric>
            {low !== null && high !== null && high > low ? (
              <>
                <Quantity value={low} unit="kN" digits={1} />
                {" to "}
                <Quantity value={high} unit="kN" digits={1} />
              </>
            ) : (
              <Quantity value={low ?? high} unit="kN" digits={1} />
            )}
          </StackCell>
          <StackCell label="Along its axis" numeric>
            <Quantity value={strengths.bendOnsetAxialKn} unit="kN" digits={1} />
          </StackCell>
          <StackCell wide>
            <SourceMark source={basis} />
          </StackCell>
        </StackRow>
        <StackRow>
          <StackCell head className="font-semibold">
            Rated to break
          </StackCell>
          <StackCell label="Across" numeric>
            <Quantity value={strengths.ratedRadialKn} unit="kN" digits={1} />
          </StackCell>
          <StackCell label="Along its axis" numeric>
            <Quantity value={strengths.ratedAxialKn} unit="kN" digits={1} />
          </StackCell>
          <StackCell wide>
            <SourceMark source={strengths.ratedRadialKn === null ? "unknown" : "maker"} />
          </StackCell>
        </StackRow>
      </StackTable>
      {basis === "estimate" ? (
        <p className="text-sm text-muted">An estimate is computed from the section; it is never a rating.</p>
      ) : null}
      {sourceNote ? <p className="text-sm text-muted">{readableText(sourceNote)}</p> : null}
    </div>
  );
}
