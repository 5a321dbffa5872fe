"use client";

import { useState } from "react";
import { v7 } from "uuid";
import { ComboboxField } from "@/components/ui/combobox-field";
import { ErrorSummary } from "@/components/ui/error-summary";
import { FormSection } from "@/components/ui/form-section";
import { Notice } from "@/components/ui/notice";
import { RadioCards } from "@/components/ui/radio-cards";
import { type Choice, SelectField } from "@/components/ui/select-field";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { TextareaField } from "@/components/ui/textarea-field";
import { type Draft, useDraft } from "@/components/ui/use-draft";
import { type Form, useForm } from "@/components/ui/use-form";
import { METAL_CHOICES } from "@/lib/domain/labels";
import type { FormAction } from "@/lib/shared/action-state";
import { formatCount } from "@/lib/shared/format";

interface WarningFormProps {
  action: FormAction<{ anchorsHit: number }>;
  newId: string;
  /** Where it may hold; an empty value is everywhere. */
  areas: readonly Choice[];
  types: readonly Choice[];
  adhesives: readonly Choice[];
}

/** Publishes a warning: from then on it is a reason against every bolt it matches. */
export function WarningForm(props: WarningFormProps) {
  const draft = useDraft("batch-warning");
  return <Fields key={draft.formKey} {...props} draft={draft} />;
}

function Fields({ action, newId, draft, ...choices }: WarningFormProps & { draft: Draft }) {
  const [id, setId] = useState(draft.values.id ?? newId);
  const form = useForm(action, () => {
    draft.forget();
    setId(v7());
  });
  const kept = form.state.state === "done" ? NONE : draft.values;
  return (
    <form
      key={id}
      {...form.formProps}
      onInput={(event) => draft.keep(event.currentTarget)}
      onChange={(event) => draft.keep(event.currentTarget)}
      className="grid gap-7"
    >
      <ErrorSummary problems={form.problems} title="Not published" />
      {form.state.state === "done" ? (
        <Notice tone="warn" role="status" title="Published.">
          It is found against bolts of {formatCount(form.state.result.anchorsHit, "anchor")}. Their stewards
          and followers get a mail.
        </Notice>
      ) : null}
      <input type="hidden" name="id" value={id} readOnly />
      <SayFields form={form} kept={kept} areas={choices.areas} />
      <AboutFields form={form} kept={kept} {...choices} />
      <SubmitButton pending={form.pending} pendingLabel="Publishing…">
        Publish the warning
      </SubmitButton>
    </form>
  );
}

const NONE: Draft["values"] = {};

interface PartProps {
  form: Form<unknown>;
  kept: Draft["values"];
}

function SayFields({ form: { errorOf }, kept, areas }: PartProps & { areas: readonly Choice[] }) {
  return (
    <FormSection title="What it says">
      <TextField
        name="title"
        label="Title"
        defaultValue={kept.title}
        error={errorOf("title")}
        maxLength={160}
      />
      <TextareaField
        name="body"
        label="What is wrong and what to do"
        defaultValue={kept.body}
        error={errorOf("body")}
        maxLength={4000}
      />
      <RadioCards
        name="says"
        legend="What it does to a bolt"
        columns={2}
        cards={[
          { value: "stop", label: "Do not use", detail: "A reason of level stop" },
          { value: "inspect", label: "Inspect first", detail: "A question that has to be answered" },
        ]}
        defaultValue={kept.says ?? null}
        error={errorOf("says")}
      />
      <SelectField
        name="areaId"
        label="Holds in"
        choices={areas}
        defaultValue={kept.areaId}
        error={errorOf("areaId")}
      />
      <TextField
        name="source"
        label="Who says so"
        hint="Maker’s notice, laboratory, own test: with its date"
        defaultValue={kept.source}
        error={errorOf("source")}
        optional
      />
    </FormSection>
  );
}

function AboutFields({
  form: { errorOf },
  kept,
  types,
  adhesives,
}: PartProps & { types: readonly Choice[]; adhesives: readonly Choice[] }) {
  return (
    <FormSection
      title="What it is about"
      intro="At least one of the first four. All that is filled in has to fit."
    >
      <ComboboxField
        name="boltTypeId"
        label="Type"
        choices={types}
        defaultValue={kept.boltTypeId || null}
        error={errorOf("boltTypeId")}
        optional
      />
      <div className="grid gap-5 sm:grid-cols-2">
        <SelectField
          name="adhesiveId"
          label="Adhesive"
          emptyLabel="Any"
          choices={adhesives}
          defaultValue={kept.adhesiveId ?? ""}
          error={errorOf("adhesiveId")}
          optional
        />
        <SelectField
          name="metal"
          label="Metal"
          emptyLabel="Any"
          choices={METAL_CHOICES}
          defaultValue={kept.metal ?? ""}
          error={errorOf("metal")}
          optional
        />
        <TextField
          name="batchPattern"
          label="Batch"
          hint="A * stands for anything: 0419*"
          code
          defaultValue={kept.batchPattern}
          error={errorOf("batchPattern")}
          optional
        />
        <span className="max-sm:hidden" />
        <TextField
          name="installedFrom"
          type="date"
          label="Set from"
          defaultValue={kept.installedFrom}
          error={errorOf("installedFrom")}
          optional
        />
        <TextField
          name="installedTo"
          type="date"
          label="Set until"
          defaultValue={kept.installedTo}
          error={errorOf("installedTo")}
          optional
        />
      </div>
    </FormSection>
  );
}
