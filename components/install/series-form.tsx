"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { v7 } from "uuid";
import { DetailFields } from "@/components/install/detail-fields";
import type { InstallFormProps } from "@/components/install/install-form";
import { PlacementFields } from "@/components/install/placement-fields";
import { SettingFields } from "@/components/install/setting-fields";
import { TypeField } from "@/components/install/type-field";
import { Button } from "@/components/ui/button";
import { ErrorSummary } from "@/components/ui/error-summary";
import { FormSection } from "@/components/ui/form-section";
import { Notice } from "@/components/ui/notice";
import { NumberField } from "@/components/ui/number-field";
import { SubmitButton } from "@/components/ui/submit-button";
import { useDraft } from "@/components/ui/use-draft";
import { useForm } from "@/components/ui/use-form";
import { type Method, METHODS } from "@/lib/domain/vocabulary";

/** A row: what all bolts share once, then hole and depth of each. All are stored, or none. */
export function SeriesForm(props: InstallFormProps) {
  const draft = useDraft(`series:${props.anchor.code}`);
  return <Fields key={draft.formKey} {...props} draft={draft} />;
}

function Fields({
  anchor,
  types,
  glues,
  judge,
  save,
  draft,
  ...props
}: InstallFormProps & { draft: ReturnType<typeof useDraft> }) {
  const router = useRouter();
  const kept = draft.values;
  const [typeId, setTypeId] = useState<string | null>(kept["common.boltTypeId"] || null);
  const type = types.find((one) => one.id === typeId) ?? null;
  const [method, setMethod] = useState<Method | null>(
    METHODS.find((one) => one === kept["common.method"]) ?? null,
  );
  const [rows, setRows] = useState(() => rowsOf(kept, props.newId, props.newPlacementId));
  const form = useForm(save, () => {
    draft.forget();
    router.push(`/anchors/${anchor.code}?installed=series`);
  });
  // A problem of a shared value arrives once for every bolt: it is shown where the value was typed.
  const errorOf = (path: string) => form.errorOf(path.replace(/^common\./, "bolts.0.")) ?? form.errorOf(path);

  return (
    <form
      {...form.formProps}
      onInput={(event) => draft.keep(event.currentTarget)}
      onChange={(event) => draft.keep(event.currentTarget)}
      className="grid gap-7"
    >
      <ErrorSummary problems={form.problems} />
      {draft.restored ? <Notice role="note">What you typed before is still here.</Notice> : null}
      <input type="hidden" name="anchorId" value={anchor.id} readOnly />
      <FormSection title="All of them" step="1" intro="Type, glue and temperature once.">
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
      </FormSection>
      {rows.map(({ key, placementId }, index) => (
        <FormSection key={key} title={`Bolt ${index + 1}`} step={String(index + 2)}>
          <input type="hidden" name={`bolts.${index}.id`} value={key} readOnly />
          <PlacementFields
            anchor={anchor}
            prefix={`bolts.${index}.`}
            newPlacementId={placementId}
            kept={kept}
            errorOf={errorOf}
            initialPlacementId={null}
          />
          <NumberField
            name={`bolts.${index}.embedmentMm`}
            label="Depth that holds"
            unit="mm"
            defaultValue={kept[`bolts.${index}.embedmentMm`]}
            error={errorOf(`bolts.${index}.embedmentMm`)}
          />
          {rows.length > 1 && index === rows.length - 1 ? (
            <Button tone="quiet" onClick={() => setRows((all) => all.slice(0, -1))}>
              Leave out bolt {index + 1}
            </Button>
          ) : null}
        </FormSection>
      ))}
      <div className="flex flex-wrap gap-3">
        <Button onClick={() => setRows((all) => [...all, { key: v7(), placementId: v7() }])}>
          Add the next bolt
        </Button>
        <SubmitButton pending={form.pending} pendingLabel="Storing…">
          {rows.length === 1 ? "Store 1 bolt" : `Store ${rows.length} bolts`}
        </SubmitButton>
      </div>
    </form>
  );
}

/** The rows a draft held, with the ids they had: sent again they are the same bolts. */
function rowsOf(kept: Readonly<Record<string, string>>, firstId: string, firstPlacementId: string) {
  const rows: { key: string; placementId: string }[] = [];
  for (let index = 0; kept[`bolts.${index}.id`]; index += 1) {
    rows.push({
      key: kept[`bolts.${index}.id`] ?? v7(),
      placementId: kept[`bolts.${index}.newPlacement.id`] ?? v7(),
    });
  }
  return rows.length > 0 ? rows : [{ key: firstId, placementId: firstPlacementId }];
}
