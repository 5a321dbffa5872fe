"use client";

import { useState } from "react";
import { v7 } from "uuid";
import { Checkbox } from "@/components/ui/checkbox";
import { ComboboxField } from "@/components/ui/combobox-field";
import { ErrorSummary } from "@/components/ui/error-summary";
import { Notice } from "@/components/ui/notice";
import { SelectField } from "@/components/ui/select-field";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { TextareaField } from "@/components/ui/textarea-field";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface ClosureFormProps {
  action: FormAction<{ id: string }>;
  newId: string;
  today: string;
  areas: readonly { id: string; name: string; sites: readonly { value: string; label: string }[] }[];
  anchors: readonly { value: string; label: string; detail: string; areaId: string; siteId: string }[];
}

/** Closes an area, a site or one anchor for a time. */
export function ClosureForm({ action, newId, today, areas, anchors }: ClosureFormProps) {
  const [id, setId] = useState(newId);
  const [areaId, setAreaId] = useState(areas[0]?.id ?? "");
  const [siteId, setSiteId] = useState("");
  const form = useForm(action, () => setId(v7()));
  const { errorOf } = form;
  const fits = anchors.filter(
    (anchor) => anchor.areaId === areaId && (siteId === "" || anchor.siteId === siteId),
  );
  return (
    <form {...form.formProps} className="grid gap-5">
      <ErrorSummary problems={form.problems} />
      {form.state.state === "done" ? (
        <Notice tone="warn" role="status" title="Written.">
          From its first day on it is a reason against every anchor it covers.
        </Notice>
      ) : null}
      <input type="hidden" name="id" value={id} readOnly />
      <div className="grid gap-5 sm:grid-cols-2">
        <SelectField
          name="areaId"
          label="Area"
          choices={areas.map((area) => ({ value: area.id, label: area.name }))}
          value={areaId}
          onChange={(event) => {
            setAreaId(event.currentTarget.value);
            setSiteId("");
          }}
          error={errorOf("areaId")}
        />
        <SelectField
          name="siteId"
          label="Site"
          emptyLabel="The whole area"
          choices={areas.find((area) => area.id === areaId)?.sites ?? []}
          value={siteId}
          onChange={(event) => setSiteId(event.currentTarget.value)}
          error={errorOf("siteId")}
          optional
        />
      </div>
      <ComboboxField
        key={`${areaId}.${siteId}.${id}`}
        name="anchorId"
        label="One anchor only"
        choices={fits}
        error={errorOf("anchorId")}
        optional
      />
      <div key={id} className="grid gap-5">
        <TextareaField
          name="reason"
          label="Why it is closed"
          hint="Birds breeding, land owner’s wish, loose rock"
          error={errorOf("reason")}
          maxLength={500}
        />
        <div className="grid gap-5 sm:grid-cols-2">
          <TextField
            name="startsOn"
            type="date"
            label="First day"
            defaultValue={today}
            error={errorOf("startsOn")}
          />
          <TextField
            name="endsOn"
            type="date"
            label="Last day"
            hint="Empty: until it is lifted"
            error={errorOf("endsOn")}
            optional
          />
        </div>
        <Checkbox name="yearly" label="The same season every year" error={errorOf("yearly")} />
        <TextField name="source" label="Who asks for it" error={errorOf("source")} optional />
      </div>
      <SubmitButton pending={form.pending}>Write the closure</SubmitButton>
    </form>
  );
}
