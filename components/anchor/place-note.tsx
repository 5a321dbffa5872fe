import { PlaceClass } from "@/components/anchor/place-class";
import { Fact, Facts } from "@/components/ui/facts";
import { Quantity } from "@/components/ui/quantity";
import { RIGGING_LABELS, sentence, WASHING_LABELS } from "@/lib/domain/labels";
import type { AnchorSheet } from "@/lib/schemas/views/anchor";
import { formatBearingDeg, formatDistanceM, formatQuantity } from "@/lib/shared/format";

/** What the place does to metal, and how it is meant to be rigged: each number with its source and doubt. */
export function PlaceNote({ sheet }: { sheet: AnchorSheet }) {
  return (
    <div className="grid items-start gap-x-10 gap-y-5 lg:grid-cols-2 print:grid-cols-2 print:gap-x-5">
      <Facts>
        {sheet.exact ? <Whereabouts sheet={sheet} /> : null}
        <Fact name="Washing">
          {sheet.washing ? WASHING_LABELS[sheet.washing] : <span className="text-muted">not known</span>}
        </Fact>
        <Fact name="Rock">
          {sheet.site.rockType ?? <span className="text-muted">not recorded</span>}
          {sheet.site.ucsMpa === null
            ? ""
            : `, ${formatQuantity(sheet.site.ucsMpa, "MPa")} (${sheet.site.ucsBasis ?? "basis not recorded"})`}
        </Fact>
        <Rigging rigging={sheet.rigging} />
        {sheet.rowName ? (
          <Fact name="Row">
            {sheet.rowName}
            {sheet.rowLengthM === null
              ? ""
              : `, ${formatQuantity(sheet.rowLengthM, "m", { digits: 0 })} long`}
          </Fact>
        ) : null}
        {sheet.note ? <Fact name="Note">{sheet.note}</Fact> : null}
      </Facts>
      {sheet.exact ? <PlaceClass placeClass={sheet.placeClass} /> : null}
    </div>
  );
}

/** Everything the place could be found by. */
function Whereabouts({ sheet }: { sheet: AnchorSheet }) {
  const { sea } = sheet;
  return (
    <>
      <Fact name="To the sea">
        {sea ? (
          <>
            <span className="type-figure">
              {formatDistanceM(sea.distanceM)} ± {formatQuantity(sea.errorM, "m", { digits: 0 })}
            </span>
            , {sea.source === "coast" ? "from the area's own coast line" : "measured by hand"}
            {sea.note ? `; ${sea.note}` : ""}
          </>
        ) : (
          <span className="text-muted">not known</span>
        )}
      </Fact>
      <Fact name="Position">
        {sheet.pointErrorM === null
          ? "error not recorded"
          : `within ± ${formatQuantity(sheet.pointErrorM, "m")}`}
        {sheet.elevationM === null
          ? ""
          : `, ${formatQuantity(sheet.elevationM, "m", { digits: 0 })} above the sea`}
      </Fact>
      <Fact name="Design load">
        {sheet.designAzimuthDeg === null ? (
          <span className="text-muted">not recorded</span>
        ) : (
          <span className="type-figure">
            {formatBearingDeg(sheet.designAzimuthDeg)} true
            {sheet.designElevationDeg === null
              ? ""
              : `, ${formatQuantity(sheet.designElevationDeg, "°", { signed: true })} to level`}
          </span>
        )}
      </Fact>
    </>
  );
}

function Rigging({ rigging }: { rigging: AnchorSheet["rigging"] }) {
  if (rigging === null) return null;
  const legs = rigging.legLengthsM.map((length, index) => (
    <span key={index}>
      {index > 0 ? ", " : ""}
      <Quantity value={length} unit="m" />
    </span>
  ));
  return (
    <Fact name="Usual rigging">
      {sentence(RIGGING_LABELS[rigging.kind])}
      {legs.length > 0 ? <>; legs {legs}</> : null}
      {rigging.backupSlackM === null ? null : (
        <>
          ; slack to the backup <Quantity value={rigging.backupSlackM} unit="m" />
        </>
      )}
      {rigging.note ? <span className="block">{rigging.note}</span> : null}
    </Fact>
  );
}
