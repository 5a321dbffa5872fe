import { OnsetRange } from "@/components/catalogue/type-list";
import { StrengthStrip, StripLegend } from "@/components/catalogue/strength-strip";
import { Fact, Facts } from "@/components/ui/facts";
import { Quantity } from "@/components/ui/quantity";
import { METHOD_LABELS, metalLabel, sentence } from "@/lib/domain/labels";
import type { BoltTypeView } from "@/lib/schemas/views/register";
import { readableText } from "@/lib/shared/readable-text";

/** Every number the catalogue has of a type. */
export function TypeFacts({ type }: { type: BoltTypeView }) {
  return (
    <div className="grid gap-x-10 gap-y-4 lg:grid-cols-2 print:grid-cols-2">
      <div className="lg:col-span-2 print:col-span-2">
        <StrengthStrip type={type} className="max-w-3xl" />
        <StripLegend />
      </div>
      <Facts>
        <Fact name="Rated across">
          <Quantity value={type.ratedRadialKn} unit="kN" digits={1} />
        </Fact>
        <Fact name="Rated along">
          <Quantity value={type.ratedAxialKn} unit="kN" digits={1} />
        </Fact>
        <Fact name="Bends from">
          <OnsetRange type={type} />
        </Fact>
        <Fact name="Source">
          {type.sourceNote ? readableText(type.sourceNote) : <span className="text-muted">not recorded</span>}
        </Fact>
        <Fact name="Methods">
          {type.allowedMethods.length > 0
            ? sentence(type.allowedMethods.map((method) => METHOD_LABELS[method]).join("; "))
            : "not recorded"}
        </Fact>
      </Facts>
      <Facts>
        <Fact name="Hanger">{type.hangerMetal ? metalLabel(type.hangerMetal) : "none"}</Fact>
        {type.rodDiameterMm === null ? null : (
          <Fact name="Rods">
            {type.rodCount === null ? null : `${type.rodCount} × `}
            <Quantity value={type.rodDiameterMm} unit="mm" />
          </Fact>
        )}
        <Fact name="Rock to load">
          <Quantity value={type.leverMm} unit="mm" />
        </Fact>
        {type.shankDiameterMm === null ? null : (
          <Fact name="Shank">
            <Quantity value={type.shankDiameterMm} unit="mm" />
          </Fact>
        )}
        <Fact name="Length">
          <Quantity value={type.lengthMm} unit="mm" />
        </Fact>
        <Fact name="Hole">
          <Quantity value={type.holeDiameterMm} unit="mm" />
        </Fact>
        {type.coatingThicknessUm === null ? null : (
          <Fact name="Coating">
            <Quantity value={type.coatingThicknessUm} unit="µm" />
          </Fact>
        )}
      </Facts>
    </div>
  );
}
