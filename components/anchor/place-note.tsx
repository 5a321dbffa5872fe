import { Fact, Facts } from "@/components/ui/facts";
import { Quantity } from "@/components/ui/quantity";
import { WASHING_LABELS } from "@/lib/domain/labels";
import type { AnchorSheet } from "@/lib/schemas/views/anchor";
import { formatBearingDeg, formatDistanceM, formatQuantity, MINUS } from "@/lib/shared/format";

/** Where it is and what the place does to metal: each number with its source and doubt. */
export function PlaceNote({ sheet }: { sheet: AnchorSheet }) {
  const [lon, lat] = sheet.point.coordinates;
  if (!sheet.exact) {
    return (
      <p className="max-w-prose border-l-4 border-info-fill bg-info-ground px-4 py-3">
        The group keeps this place to its members. You see the name and a point rounded to about 1 km;
        distances, bearings and pictures are left out.
      </p>
    );
  }
  const { sea, placeClass } = sheet;
  return (
    <Facts>
      <Fact name="Point">
        <span className="type-code">
          {lat.toFixed(5)}, {lon.toFixed(5)}
        </span>
        {sheet.pointErrorM === null ? "" : ` ± ${formatQuantity(sheet.pointErrorM, "m")}`}
        {sheet.elevationM === null
          ? ""
          : `, ${formatQuantity(sheet.elevationM, "m", { digits: 0 })} above the sea`}
      </Fact>
      <Fact name="Design pull">
        {sheet.designAzimuthDeg === null ? (
          <span className="text-muted">not recorded</span>
        ) : (
          <>
            {formatBearingDeg(sheet.designAzimuthDeg)}
            {sheet.designElevationDeg === null
              ? ""
              : `, ${formatQuantity(sheet.designElevationDeg, "°", { signed: true })} to level`}
          </>
        )}
      </Fact>
      <Fact name="To the sea">
        {sea ? (
          <>
            {formatDistanceM(sea.distanceM)} ± <Quantity value={sea.errorM} unit="m" digits={0} />,{" "}
            {sea.source === "coast" ? "from the area's own coast line" : "measured by hand"}
            {sea.note ? `; ${sea.note}` : ""}
          </>
        ) : (
          <span className="text-muted">not known</span>
        )}
      </Fact>
      <Fact name="Washing">
        {sheet.washing ? WASHING_LABELS[sheet.washing] : <span className="text-muted">not known</span>}
      </Fact>
      <Fact name="Place class">
        {placeClass ? (
          <>
            CRF {signed(placeClass.f1)} {signed(placeClass.f2)} {signed(placeClass.f3)} ={" "}
            {signed(placeClass.crf)}, so stainless steel of class <strong>{placeClass.crc}</strong> or better
            (EN 1993-1-4, Annex A)
          </>
        ) : (
          <span className="text-muted">not known while the distance to the sea is not</span>
        )}
      </Fact>
      <Fact name="Rock">
        {sheet.site.rockType ?? <span className="text-muted">not recorded</span>}
        {sheet.site.ucsMpa === null
          ? ""
          : `, ${formatQuantity(sheet.site.ucsMpa, "MPa")} (${sheet.site.ucsBasis ?? "basis not recorded"})`}
      </Fact>
      {sheet.rigging?.note ? <Fact name="Rigging">{sheet.rigging.note}</Fact> : null}
    </Facts>
  );
}

function signed(value: number): string {
  return value < 0 ? `${MINUS}${Math.abs(value)}` : `+${value}`;
}
