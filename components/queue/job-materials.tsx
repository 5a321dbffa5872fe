import { Fact, Facts } from "@/components/ui/facts";
import { PastDate } from "@/components/ui/date-text";
import { Quantity } from "@/components/ui/quantity";
import { FORM_LABELS, METHOD_LABELS, metalLabel, sentence } from "@/lib/domain/labels";
import type { PlacementView } from "@/lib/schemas/views/anchor";

/** What is in the rock at the placements of a job: what to take out, and which drill and hardware to carry. */
export function JobMaterials({ placements }: { placements: readonly PlacementView[] }) {
  if (placements.length === 0) {
    return <p className="text-muted">The job names no placement: look at the anchor&rsquo;s sheet.</p>;
  }
  return (
    <div className="grid gap-5 md:grid-cols-2">
      {placements.map((placement) => (
        <Material key={placement.id} placement={placement} />
      ))}
    </div>
  );
}

function Material({ placement }: { placement: PlacementView }) {
  const { number, bolt, holeDiameterMm, holeDepthMm } = placement;
  return (
    <section aria-label={`Placement ${number}`}>
      <h3 className="pb-1">
        <span className="type-figure">{number}</span>{" "}
        {bolt ? (bolt.typeName ?? sentence(FORM_LABELS[bolt.form])) : "Empty hole"}
      </h3>
      <Facts>
        {bolt ? (
          <>
            <Fact name="Metal">
              {metalLabel(bolt.boltMetal)}
              {bolt.hangerMetal && bolt.hangerMetal !== bolt.boltMetal
                ? `, hanger ${metalLabel(bolt.hangerMetal)}`
                : ""}
            </Fact>
            <Fact name="Set">
              <PastDate on={bolt.installedOn} precision={bolt.installedOnPrecision} />,{" "}
              {bolt.method ? METHOD_LABELS[bolt.method] : "method not known"}
            </Fact>
            <Fact name="Depth that holds">
              <Quantity value={bolt.embedmentMm} unit="mm" />
            </Fact>
          </>
        ) : null}
        <Fact name="Hole">
          Ø <Quantity value={holeDiameterMm} unit="mm" />, <Quantity value={holeDepthMm} unit="mm" /> deep
        </Fact>
        {placement.note ? <Fact name="Note">{placement.note}</Fact> : null}
      </Facts>
    </section>
  );
}
