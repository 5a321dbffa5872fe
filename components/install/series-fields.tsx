"use client";

import { useState } from "react";
import { v7 } from "uuid";
import { DetailFields } from "@/components/install/detail-fields";
import type {
  ErrorOf,
  GlueChoice,
  InstallAnchor,
  Kept,
  TypeChoice,
} from "@/components/install/install-types";
import { PlacementFields } from "@/components/install/placement-fields";
import { SettingFields } from "@/components/install/setting-fields";
import { type Judged, TypeField } from "@/components/install/type-field";
import { Button } from "@/components/ui/button";
import { FormSection } from "@/components/ui/form-section";
import { NumberField } from "@/components/ui/number-field";
import { type Method, METHODS } from "@/lib/domain/vocabulary";
import type { FormAction } from "@/lib/shared/action-state";

/** One bolt of the form before anything is typed. */
export interface FirstRow {
  /** Id of the bolt, and of the hole if it makes a new one. */
  id: string;
  newPlacementId: string;
  /** The hole it goes into; null: not chosen yet. */
  placementId: string | null;
}

export interface SeriesFieldsProps {
  anchor: InstallAnchor;
  types: readonly TypeChoice[];
  glues: readonly GlueChoice[];
  judge: FormAction<Judged>;
  firstRows: readonly FirstRow[];
  today: string;
  now: string;
  installer: string;
  kept: Kept;
  errorOf: ErrorOf;
  /** Number of the first section. */
  firstStep?: number;
  /** How many bolts there are now. */
  onCount?: (count: number) => void;
}

/** Type, glue and temperature once; then hole and depth of each bolt. */
export function SeriesFields(props: SeriesFieldsProps) {
  const { anchor, types, kept, errorOf, firstStep = 1 } = props;
  const [rows, setRows] = useState(() => keptRows(kept, props.firstRows));
  const change = (next: readonly FirstRow[]) => {
    setRows(next);
    props.onCount?.(next.length);
  };
  return (
    <>
      <FormSection
        title={rows.length === 1 ? "Type and setting" : "All of them"}
        step={String(firstStep)}
        intro="Type, glue and temperature once."
      >
        <CommonFields {...props} types={types} />
      </FormSection>
      {rows.map((row, index) => (
        <FormSection key={row.id} title={`Bolt ${index + 1}`} step={String(firstStep + index + 1)}>
          <input type="hidden" name={`bolts.${index}.id`} value={row.id} readOnly />
          <PlacementFields
            anchor={anchor}
            prefix={`bolts.${index}.`}
            newPlacementId={row.newPlacementId}
            kept={kept}
            errorOf={errorOf}
            initialPlacementId={row.placementId}
          />
          <NumberField
            name={`bolts.${index}.embedmentMm`}
            label="Depth that holds"
            unit="mm"
            hint="h_ef of a stud, engaged thread of a screw, straight rod of a glued bolt"
            defaultValue={kept[`bolts.${index}.embedmentMm`]}
            error={errorOf(`bolts.${index}.embedmentMm`)}
          />
          {rows.length > 1 && index === rows.length - 1 ? (
            <Button tone="quiet" onClick={() => change(rows.slice(0, -1))}>
              Leave out bolt {index + 1}
            </Button>
          ) : null}
        </FormSection>
      ))}
      <Button
        onClick={() => change([...rows, { id: v7(), newPlacementId: v7(), placementId: null }])}
        className="justify-self-start"
      >
        Add the next bolt
      </Button>
    </>
  );
}

function CommonFields({ anchor, types, glues, judge, kept, errorOf, ...props }: SeriesFieldsProps) {
  const [typeId, setTypeId] = useState<string | null>(kept["common.boltTypeId"] || null);
  const type = types.find((one) => one.id === typeId) ?? null;
  const [method, setMethod] = useState<Method | null>(
    METHODS.find((one) => one === kept["common.method"]) ?? null,
  );
  return (
    <>
      <TypeField
        name="common.boltTypeId"
        anchorId={anchor.id}
        types={types}
        judge={judge}
        value={typeId}
        onChange={(id) => {
          setTypeId(id);
          setMethod(types.find((one) => one.id === id)?.methods[0] ?? null);
        }}
        typed={{ method: method ?? "", embedmentMm: "", leverMm: "" }}
        error={errorOf("common.boltTypeId")}
      />
      <DetailFields prefix="common." untyped={type === null} kept={kept} errorOf={errorOf} />
      <SettingFields
        prefix="common."
        methods={type?.methods ?? []}
        method={method}
        onMethod={setMethod}
        glues={glues}
        today={props.today}
        now={props.now}
        installer={props.installer}
        kept={kept}
        errorOf={errorOf}
      />
    </>
  );
}

/** The rows a draft held, with the ids they had: sent again they are the same bolts. */
export function keptRows(kept: Kept, firstRows: readonly FirstRow[]): readonly FirstRow[] {
  const rows: FirstRow[] = [];
  for (let index = 0; kept[`bolts.${index}.id`]; index += 1) {
    const first = firstRows[index];
    rows.push({
      id: kept[`bolts.${index}.id`] ?? v7(),
      newPlacementId: kept[`bolts.${index}.newPlacement.id`] ?? v7(),
      placementId: first?.placementId ?? null,
    });
  }
  return rows.length > 0 ? rows : firstRows;
}
