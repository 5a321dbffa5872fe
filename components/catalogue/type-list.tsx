import Link from "next/link";
import { StrengthStrip, StripLegend } from "@/components/catalogue/strength-strip";
import { Quantity } from "@/components/ui/quantity";
import { SourceMark } from "@/components/ui/source-mark";
import { StackCell, StackRow, StackTable } from "@/components/ui/stack-table";
import { FORM_LABELS, metalLabel, sentence } from "@/lib/domain/labels";
import { FORMS } from "@/lib/domain/vocabulary";
import type { BoltTypeView } from "@/lib/schemas/views/register";

const HEAD = [
  { name: "Type", className: "w-[26%]" },
  { name: "Metal", className: "w-[13%]" },
  { name: "Bends, breaks", className: "w-[22%]" },
  { name: "Bends from", numeric: true },
  { name: "Rated across", numeric: true, className: "w-[9%]" },
  { name: "Rated along", numeric: true, className: "w-[9%]" },
  { name: "In the rock", numeric: true, className: "w-[6%]" },
];

/** The catalogue by form: what it bends at, and apart from that what it breaks at. */
export function TypeList({ types }: { types: readonly BoltTypeView[] }) {
  return (
    <div className="grid gap-10">
      <StripLegend />
      {FORMS.map((form) => {
        const own = types.filter((type) => type.form === form);
        if (own.length === 0) return null;
        return (
          <section key={form} aria-labelledby={form} className="grid gap-3">
            <h2 id={form}>{sentence(FORM_LABELS[form])}</h2>
            <StackTable caption={`Types: ${FORM_LABELS[form]}`} head={HEAD} className="lg:table-fixed">
              {own.map((type) => (
                <TypeRow key={type.id} type={type} />
              ))}
            </StackTable>
          </section>
        );
      })}
    </div>
  );
}

function TypeRow({ type }: { type: BoltTypeView }) {
  return (
    <StackRow>
      <StackCell head>
        <Link href={`/types/${type.id}`} className="inline-block font-semibold text-link max-lg:py-1">
          {type.name}
        </Link>
        {type.status === "discontinued" ? (
          <span className="block text-sm text-muted">discontinued</span>
        ) : null}
      </StackCell>
      <StackCell label="Metal" className="max-lg:hidden">
        {metalLabel(type.boltMetal)}
      </StackCell>
      <StackCell wide className="lg:align-middle print:align-middle">
        <StrengthStrip type={type} />
      </StackCell>
      <StackCell label="Bends from" numeric>
        <OnsetRange type={type} />
      </StackCell>
      <StackCell label="Rated across" numeric>
        <Quantity value={type.ratedRadialKn} unit="kN" digits={1} />
      </StackCell>
      <StackCell label="Rated along" numeric>
        <Quantity value={type.ratedAxialKn} unit="kN" digits={1} />
      </StackCell>
      <StackCell label="In the rock" numeric className="type-figure">
        {type.inForce}
      </StackCell>
    </StackRow>
  );
}

/** One number or a range, with where it comes from. */
export function OnsetRange({
  type,
}: {
  type: Pick<BoltTypeView, "bendOnsetLowKn" | "bendOnsetHighKn" | "bendOnsetBasis">;
}) {
  const { bendOnsetLowKn: low, bendOnsetHighKn: high, bendOnsetBasis } = type;
  if (low === null && high === null) return <SourceMark source={bendOnsetBasis} />;
  return (
    <>
      <Quantity value={low} unit="kN" digits={1} />
      {high !== null && high !== low ? (
        <>
          {" "}
          to <Quantity value={high} unit="kN" digits={1} />
        </>
      ) : null}{" "}
      <SourceMark source={bendOnsetBasis} />
    </>
  );
}
