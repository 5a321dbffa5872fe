import type { ReactNode } from "react";
import { Moment, PastDate } from "@/components/ui/date-text";
import { Fact, Facts } from "@/components/ui/facts";
import { Quantity } from "@/components/ui/quantity";
import { FORM_LABELS, HOLE_CLEANING_LABELS, METHOD_LABELS, metalLabel, sentence } from "@/lib/domain/labels";
import { HOLE_CLEANINGS } from "@/lib/domain/vocabulary";
import type { BoltView } from "@/lib/schemas/views/bolt";
import type { BoltDetail } from "@/lib/schemas/views/bolt-detail";

/** What it is: build, metals, sizes, where the numbers of its type come from. */
export function HardwareFacts({ bolt }: { bolt: BoltView }) {
  return (
    <Facts>
      <Fact name="Build">{sentence(FORM_LABELS[bolt.form])}</Fact>
      <Fact name="Metal of the bolt">
        <Known value={bolt.boltMetal && metalLabel(bolt.boltMetal)} />
        {bolt.boltMetal === null ? <Look bolt={bolt} /> : null}
      </Fact>
      {bolt.hangerMetal ? <Fact name="Metal of the hanger">{metalLabel(bolt.hangerMetal)}</Fact> : null}
      {bolt.linkMetal ? <Fact name="Metal of the link">{metalLabel(bolt.linkMetal)}</Fact> : null}
      {bolt.rodDiameterMm === null ? null : (
        <Fact name="Rod">
          {bolt.rodCount !== null && bolt.rodCount > 1 ? `${bolt.rodCount} × ` : null}
          <Quantity value={bolt.rodDiameterMm} unit="mm" />
        </Fact>
      )}
      {bolt.shankDiameterMm === null || bolt.shankDiameterMm === bolt.rodDiameterMm ? null : (
        <Fact name="Shank">
          <Quantity value={bolt.shankDiameterMm} unit="mm" />
        </Fact>
      )}
      {bolt.leverMm === null ? null : (
        <Fact name="Lever off the rock">
          <Quantity value={bolt.leverMm} unit="mm" />
        </Fact>
      )}
      <Fact name="Standard">
        <Known value={bolt.standard} none="none claimed" />
      </Fact>
      <Fact name="Batch">
        <Known value={bolt.batch} />
      </Fact>
      {bolt.rustGrade === null ? null : <Fact name="Rust">grade {bolt.rustGrade} of 4</Fact>}
      {bolt.witnessMark === null ? null : (
        <Fact name="Witness mark">{bolt.witnessMark ? "drawn across nut and plate" : "none"}</Fact>
      )}
    </Facts>
  );
}

/** How it got into the rock: who, when, how, how deep. */
export function SettingFacts({ bolt, hole, timeZone }: BoltDetailFacts) {
  const glued = bolt.method !== null && bolt.method !== "mechanical";
  return (
    <Facts>
      <Fact name="Set">
        <PastDate on={bolt.installedOn} precision={bolt.installedOnPrecision} />
        {bolt.installedBy ? ` by ${bolt.installedBy}` : ""}
      </Fact>
      <Fact name="Method">
        <Known value={bolt.method && METHOD_LABELS[bolt.method]} />
      </Fact>
      <Fact name="Hole">
        Ø <Quantity value={hole.diameterMm} unit="mm" />, <Quantity value={hole.depthMm} unit="mm" /> deep
        {bolt.holeCleaning ? `, ${cleaningWord(bolt.holeCleaning)}` : ""}
      </Fact>
      <Fact name="In the rock">
        <Quantity value={bolt.embedmentMm} unit="mm" />
      </Fact>
      {bolt.torqueNm === null ? null : (
        <Fact name="Torque">
          <Quantity value={bolt.torqueNm} unit="N m" />
        </Fact>
      )}
      {bolt.recheckDueOn ? (
        <Fact name="Torque to be checked again">
          <PastDate on={bolt.recheckDueOn} />
        </Fact>
      ) : null}
      {glued ? <GlueFacts bolt={bolt} timeZone={timeZone} /> : null}
      {bolt.note ? <Fact name="Note">{bolt.note}</Fact> : null}
    </Facts>
  );
}

interface BoltDetailFacts {
  bolt: BoltView;
  hole: BoltDetail["hole"];
  timeZone: string;
}

function GlueFacts({ bolt, timeZone }: Omit<BoltDetailFacts, "hole">) {
  return (
    <>
      <Fact name="Glue">
        <Known value={bolt.adhesiveName} />
        {bolt.adhesiveBatch ? `, batch ${bolt.adhesiveBatch}` : ""}
        {bolt.adhesiveExpiresOn ? (
          <>
            , good until <PastDate on={bolt.adhesiveExpiresOn} />
          </>
        ) : null}
      </Fact>
      <Fact name="Temperature when set">
        glue <Quantity value={bolt.glueTempC} unit="°C" digits={0} />, rock{" "}
        <Quantity value={bolt.rockTempC} unit="°C" digits={0} />
      </Fact>
      {bolt.usableFrom ? (
        <Fact name="Usable from">
          <Moment at={bolt.usableFrom} timeZone={timeZone} />
        </Fact>
      ) : null}
    </>
  );
}

function Known({ value, none = "not known" }: { value: string | null; none?: string }): ReactNode {
  return value ?? <span className="text-muted">{none}</span>;
}

/** What a magnet and the look of the rust tell when nobody wrote the metal down. */
function Look({ bolt }: { bolt: BoltView }) {
  if (bolt.magnetic === null) return null;
  return bolt.magnetic ? "; a magnet sticks to it" : "; a magnet does not stick to it";
}

function cleaningWord(stored: string): string {
  const known = HOLE_CLEANINGS.find((one) => one === stored);
  return known ? HOLE_CLEANING_LABELS[known] : stored;
}
