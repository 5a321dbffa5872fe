"use client";

import { useState } from "react";
import { GlueTime } from "@/components/install/glue-time";
import { type ErrorOf, type GlueChoice, isGlued, type Kept } from "@/components/install/install-types";
import { Checkbox } from "@/components/ui/checkbox";
import { NumberField } from "@/components/ui/number-field";
import { PastDateField } from "@/components/ui/past-date-field";
import { SelectField } from "@/components/ui/select-field";
import { TextField } from "@/components/ui/text-field";
import { HOLE_CLEANING_LABELS, METHOD_LABELS, sentence } from "@/lib/domain/labels";
import { DATE_PRECISIONS, HOLE_CLEANINGS, type Method, METHODS } from "@/lib/domain/vocabulary";

interface SettingFieldsProps {
  /** Put before every name: "" or "common.". */
  prefix: string;
  /** Methods the chosen type allows; all when it is not known. */
  methods: readonly Method[];
  method: Method | null;
  onMethod: (method: Method | null) => void;
  glues: readonly GlueChoice[];
  today: string;
  now: string;
  installer: string;
  kept: Kept;
  errorOf: ErrorOf;
}

/** How it was set: date, method, and then glue or torque. */
export function SettingFields(props: SettingFieldsProps) {
  const { prefix, methods, method, onMethod, today, installer, kept, errorOf } = props;
  const p = (name: string) => prefix + name;
  const offered = methods.length > 0 ? methods : METHODS;
  const precision = DATE_PRECISIONS.find((one) => one === kept[p("installedOnPrecision")]) ?? "day";
  return (
    <div className="grid gap-5">
      <div className="grid gap-5 sm:grid-cols-2">
        <PastDateField
          name={p("installedOn")}
          precisionName={p("installedOnPrecision")}
          label="Set"
          hint="Empty when nobody knows"
          defaultOn={kept[p("installedOn")] ?? today}
          defaultPrecision={precision}
          error={errorOf(p("installedOn"))}
        />
        <TextField
          name={p("installedBy")}
          label="By"
          defaultValue={kept[p("installedBy")] ?? installer}
          error={errorOf(p("installedBy"))}
          optional
        />
      </div>
      <SelectField
        name={p("method")}
        label="Method"
        emptyLabel="Not known"
        choices={offered.map((value) => ({ value, label: sentence(METHOD_LABELS[value]) }))}
        value={method ?? ""}
        onChange={(event) => onMethod(METHODS.find((one) => one === event.currentTarget.value) ?? null)}
        error={errorOf(p("method"))}
      />
      {isGlued(method) ? <GlueFields {...props} /> : null}
      {method === "mechanical" || method === "mechanical_and_glue" ? <TorqueFields {...props} /> : null}
    </div>
  );
}

function GlueFields({ prefix, glues, now, kept, errorOf }: SettingFieldsProps) {
  const p = (name: string) => prefix + name;
  const [glueId, setGlueId] = useState(kept[p("adhesiveId")] ?? "");
  const [glueTempC, setGlueTempC] = useState(kept[p("glueTempC")] ?? "");
  const [rockTempC, setRockTempC] = useState(kept[p("rockTempC")] ?? "");
  return (
    <div className="grid gap-5 border-l-4 border-line pl-4">
      <div className="grid gap-5 sm:grid-cols-2">
        <SelectField
          name={p("adhesiveId")}
          label="Adhesive"
          emptyLabel="Not known"
          choices={glues.map(({ id, name }) => ({ value: id, label: name }))}
          value={glueId}
          onChange={(event) => setGlueId(event.currentTarget.value)}
          error={errorOf(p("adhesiveId"))}
        />
        <TextField
          name={p("adhesiveBatch")}
          label="Its batch"
          code
          defaultValue={kept[p("adhesiveBatch")]}
          error={errorOf(p("adhesiveBatch"))}
          optional
        />
        <TextField
          name={p("adhesiveExpiresOn")}
          type="date"
          label="Usable until"
          hint="Printed on the cartridge"
          defaultValue={kept[p("adhesiveExpiresOn")]}
          error={errorOf(p("adhesiveExpiresOn"))}
          optional
        />
        <SelectField
          name={p("holeCleaning")}
          label="Hole cleaned"
          emptyLabel="Not known"
          choices={HOLE_CLEANINGS.map((value) => ({ value, label: sentence(HOLE_CLEANING_LABELS[value]) }))}
          defaultValue={kept[p("holeCleaning")] ?? ""}
          error={errorOf(p("holeCleaning"))}
          why="Dust in the hole takes nearly all of the bond."
        />
        <NumberField
          name={p("glueTempC")}
          label="Glue"
          unit="°C"
          value={glueTempC}
          onChange={(event) => setGlueTempC(event.currentTarget.value)}
          error={errorOf(p("glueTempC"))}
        />
        <NumberField
          name={p("rockTempC")}
          label="Rock"
          unit="°C"
          hint="In the hole, not in the sun"
          value={rockTempC}
          onChange={(event) => setRockTempC(event.currentTarget.value)}
          error={errorOf(p("rockTempC"))}
        />
      </div>
      <GlueTime
        glue={glues.find((one) => one.id === glueId) ?? null}
        glueTempC={glueTempC}
        rockTempC={rockTempC}
        setAt={now}
      />
    </div>
  );
}

function TorqueFields({ prefix, kept, errorOf }: SettingFieldsProps) {
  const p = (name: string) => prefix + name;
  return (
    <div className="grid gap-5 border-l-4 border-line pl-4 sm:grid-cols-2">
      <NumberField
        name={p("torqueNm")}
        label="Torque"
        unit="N m"
        hint="As the maker says for this rock"
        defaultValue={kept[p("torqueNm")]}
        error={errorOf(p("torqueNm"))}
        optional
      />
      <TextField
        name={p("recheckDueOn")}
        type="date"
        label="Torque again on"
        why="A fresh expansion bolt settles; the nut is checked once more."
        defaultValue={kept[p("recheckDueOn")]}
        error={errorOf(p("recheckDueOn"))}
        optional
      />
      <Checkbox
        name={p("witnessMark")}
        label="Witness mark painted over nut and hanger"
        hint="Shows later whether it has turned"
        defaultChecked={kept[p("witnessMark")] === "on"}
      />
    </div>
  );
}
