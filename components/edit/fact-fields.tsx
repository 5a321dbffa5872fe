"use client";

import { useState } from "react";
import type { PartProps } from "@/components/edit/edit-types";
import { KeptNumber, KeptSelect, KeptText } from "@/components/edit/kept-field";
import { Checkbox } from "@/components/ui/checkbox";
import { FieldError } from "@/components/ui/field";
import { FormSection } from "@/components/ui/form-section";
import { SelectField } from "@/components/ui/select-field";
import { TextareaField } from "@/components/ui/textarea-field";
import { RIGGING_LABELS, sentence, USE_LABELS, WASHING_LABELS } from "@/lib/domain/labels";
import { RIGGINGS, USES, WASHINGS } from "@/lib/domain/vocabulary";

/** What it is called and what it is for: the load it is judged by follows from its uses. */
export function NameFields({ kept, errorOf }: PartProps) {
  const part = { kept, errorOf };
  return (
    <>
      <KeptText
        {...part}
        name="label"
        label="Name"
        hint="As people there call it: West end, Belay above the chimney"
      />
      <fieldset id="uses" tabIndex={-1} className="grid sm:grid-cols-2">
        <legend className="font-semibold">Used for</legend>
        {USES.map((use, index) => (
          <Checkbox
            key={use}
            name={`uses.${index}`}
            value={use}
            label={sentence(USE_LABELS[use])}
            defaultChecked={Object.entries(kept).some(([key, one]) => key.startsWith("uses.") && one === use)}
          />
        ))}
        <FieldError inputId="uses" error={errorOf("uses")} />
      </fieldset>
    </>
  );
}

/** How face and load lie: what the shares of the bolts are computed from. */
export function DirectionFields({ kept, errorOf }: PartProps) {
  const part = { kept, errorOf };
  return (
    <div className="grid gap-5 sm:grid-cols-2">
      <KeptNumber
        {...part}
        name="designAzimuthDeg"
        label="Load pulls to"
        unit="°"
        hint="From true north: 90 is east"
        why="A highline pulls along the line, a lower-off straight down."
      />
      <KeptNumber
        {...part}
        name="designElevationDeg"
        label="Load above level"
        unit="°"
        hint="Straight down is −90"
      />
      <KeptNumber {...part} name="faceAzimuthDeg" label="Face looks to" unit="°" hint="From true north" />
      <KeptNumber
        {...part}
        name="faceDipDeg"
        label="Face dips"
        unit="°"
        hint="0 flat ground, 90 a wall, more overhanging"
      />
      <KeptNumber {...part} name="elevationM" label="Height above sea" unit="m" />
      <KeptSelect
        {...part}
        name="washing"
        label="Washed by"
        words={WASHINGS}
        labels={WASHING_LABELS}
        emptyLabel="As the site says"
        why="Salt that is never washed off corrodes fastest."
      />
    </div>
  );
}

/** The point everything is gathered in, and how. */
export function RiggingFields({ kept, errorOf, legs }: PartProps & { legs: readonly number[] }) {
  const part = { kept, errorOf };
  const [kind, setKind] = useState(kept["rigging.kind"] ?? "");
  return (
    <div className="grid gap-5">
      <div className="grid gap-5 sm:grid-cols-3">
        <KeptNumber
          {...part}
          name="masterpointXMm"
          label="Masterpoint right"
          unit="mm"
          hint="Of placement 1"
        />
        <KeptNumber {...part} name="masterpointYMm" label="Masterpoint up" unit="mm" />
        <KeptNumber {...part} name="masterpointZMm" label="Out of the face" unit="mm" />
      </div>
      <input type="hidden" name={kind === "" ? "rigging" : "rigging.kind"} value={kind} readOnly />
      <SelectField
        name="riggingKind"
        id="rigging.kind"
        label="How it is gathered"
        emptyLabel="Not known"
        choices={RIGGINGS.map((value) => ({ value, label: sentence(RIGGING_LABELS[value]) }))}
        value={kind}
        onChange={(event) => setKind(event.currentTarget.value)}
        error={errorOf("rigging.kind")}
        optional
      />
      {kind === "" ? null : (
        <div className="grid gap-5 border-l-4 border-line pl-4 sm:grid-cols-3">
          {legs.map((number, index) => (
            <KeptNumber
              key={number}
              {...part}
              name={`rigging.legLengthsM.${index}`}
              label={`Leg to placement ${number}`}
              unit="m"
            />
          ))}
          <KeptNumber {...part} name="rigging.backupSlackM" label="Slack of the backup" unit="m" />
          <KeptText {...part} name="rigging.note" label="Note" optional />
        </div>
      )}
    </div>
  );
}

/** Row, hand-measured distance to the sea, note. */
export function OtherFields({ kept, errorOf }: PartProps) {
  const part = { kept, errorOf };
  return (
    <>
      <div className="grid gap-5 sm:grid-cols-2">
        <KeptText
          {...part}
          name="rowName"
          label="Row of bolts"
          hint="Name of the way, where these bolts protect one"
          optional
        />
        <KeptNumber {...part} name="rowLengthM" label="Length of the row" unit="m" />
        <KeptNumber
          {...part}
          name="seaDistanceM"
          label="To the sea, measured"
          unit="m"
          hint="Empty: computed from the coast on record"
        />
        <KeptNumber {...part} name="seaDistanceErrorM" label="Measured within" unit="m" />
        <KeptText {...part} name="seaDistanceNote" label="How it was measured" optional />
      </div>
      <TextareaField
        name="note"
        label="Note"
        defaultValue={kept.note}
        error={errorOf("note")}
        maxLength={2000}
        optional
      />
    </>
  );
}

export function FactSections({ kept, errorOf, legs }: PartProps & { legs: readonly number[] }) {
  const part = { kept, errorOf };
  return (
    <>
      <FormSection title="Name and use" step="1">
        <NameFields {...part} />
      </FormSection>
      <FormSection title="Face and direction" step="2">
        <DirectionFields {...part} />
      </FormSection>
      <FormSection title="Masterpoint" step="3">
        <RiggingFields {...part} legs={legs} />
      </FormSection>
      <FormSection title="The rest" step="4">
        <OtherFields {...part} />
      </FormSection>
    </>
  );
}
