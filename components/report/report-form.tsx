"use client";

import { useRouter } from "next/navigation";
import { type FormEvent, useState } from "react";
import { MeasurementField } from "@/components/report/measurement-field";
import { PhotoPicker } from "@/components/report/photo-picker";
import { PlaceFields } from "@/components/report/place-fields";
import {
  DEPTH_DETAILS,
  GRADE_CHOICES,
  KIND_DETAILS,
  wouldTakeOutOfUse,
} from "@/components/report/report-words";
import { usePhotos } from "@/components/report/use-photos";
import { ErrorSummary } from "@/components/ui/error-summary";
import { FormSection } from "@/components/ui/form-section";
import { Notice } from "@/components/ui/notice";
import { RadioCards } from "@/components/ui/radio-cards";
import { SelectField } from "@/components/ui/select-field";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextareaField } from "@/components/ui/textarea-field";
import { useDraft } from "@/components/ui/use-draft";
import { useForm } from "@/components/ui/use-form";
import { WhenField } from "@/components/ui/when-field";
import { DEPTH_LABELS, REPORT_KIND_LABELS, sentence } from "@/lib/domain/labels";
import { REPORT_MEASUREMENTS } from "@/lib/domain/report/report-measurements";
import { DEPTHS, REPORT_KINDS, type ReportKind } from "@/lib/domain/vocabulary";
import type { FormAction } from "@/lib/shared/action-state";

export interface ReportTargetChoice {
  anchorId: string;
  anchorCode: string;
  anchorLabel: string;
  placements: readonly { id: string; number: number; label: string }[];
  placementId: string | null;
}

interface ReportFormProps {
  action: FormAction<{ id: string }>;
  /** Minted before the form is filled in: sending twice is one report. */
  newId: string;
  now: string;
  /** Null: about a spot where nothing is registered. */
  target: ReportTargetChoice | null;
  point: { lon: number; lat: number } | null;
}

const ASKED: readonly ReportKind[] = REPORT_KINDS.filter((kind) => kind !== "not_in_register");

/** What did you see, the measurements that belong to it, a note, photos. */
export function ReportForm({ action, newId, now, target, point }: ReportFormProps) {
  const router = useRouter();
  const draft = useDraft(`report:${target?.anchorCode ?? "new-place"}`);
  const pictures = usePhotos();
  const [filedId, setFiledId] = useState<string | null>(null);
  const form = useForm(action, async ({ id }) => {
    draft.forget();
    setFiledId(id);
    if (await pictures.sendAll(`/api/v1/reports/${id}/photos`)) router.push(`/reports/${id}?sent=1`);
  });
  const { values } = draft;

  return (
    <form
      key={draft.formKey}
      {...form.formProps}
      onInput={(event: FormEvent<HTMLFormElement>) => draft.keep(event.currentTarget)}
      onChange={(event: FormEvent<HTMLFormElement>) => draft.keep(event.currentTarget)}
      className="grid gap-7"
    >
      <ErrorSummary problems={form.problems} title="Not sent yet" />
      {draft.restored && filedId === null ? (
        <Notice role="note">
          What you typed before is still here; it is kept on this device until it is sent.
        </Notice>
      ) : null}
      <input type="hidden" name="id" value={values.id ?? newId} readOnly />
      {target ? <input type="hidden" name="anchorId" value={target.anchorId} readOnly /> : null}
      <WhatWasSeen target={target} values={values} errorOf={form.errorOf} />
      {target ? null : <PlaceFields values={values} point={point} errorOf={form.errorOf} />}
      <FormSection title="When, and anything else" step="4">
        <WhenField
          name="observedAt"
          label="When you saw it"
          defaultValue={values.observedAt ?? now}
          max={now}
          error={form.errorOf("observedAt")}
        />
        <TextareaField
          name="note"
          label="Note"
          optional
          hint="What the next person should know."
          defaultValue={values.note}
          error={form.errorOf("note")}
          maxLength={4000}
        />
        <PhotoPicker
          photos={pictures.photos}
          onAdd={pictures.add}
          onRemove={pictures.remove}
          onRetry={(id) => {
            const photo = pictures.photos.find((one) => one.id === id);
            if (photo && filedId) void pictures.send(photo, `/api/v1/reports/${filedId}/photos`);
          }}
        />
      </FormSection>
      {filedId ? (
        <Notice tone="warn" role="status" title="The report is stored.">
          Some photos are still on their way or were not taken.{" "}
          <a className="underline" href={`/reports/${filedId}?sent=1`}>
            Go to the report
          </a>
        </Notice>
      ) : (
        <SubmitButton pending={form.pending} width="full" pendingLabel="Sending…">
          Send the report
        </SubmitButton>
      )}
    </form>
  );
}

interface SeenProps {
  target: ReportTargetChoice | null;
  values: Readonly<Record<string, string>>;
  errorOf: (path: string) => string | undefined;
}

function WhatWasSeen({ target, values, errorOf }: SeenProps) {
  const first = target ? (values.kind ?? null) : "not_in_register";
  const [kind, setKind] = useState<ReportKind | null>(REPORT_KINDS.find((one) => one === first) ?? null);
  const [typed, setTyped] = useState<Readonly<Record<string, string>>>(values);
  const outOfUse = target !== null && wouldTakeOutOfUse(kind, typed);
  return (
    <div
      className="grid gap-7"
      onChange={(event) => {
        const field = event.target;
        if (field instanceof HTMLInputElement || field instanceof HTMLSelectElement) {
          setTyped((before) => ({ ...before, [field.name]: field.value }));
        }
      }}
    >
      {target ? (
        <FormSection title="What did you see?" step="1">
          {target.placements.length > 0 ? (
            <SelectField
              name="placementId"
              label="On which part"
              emptyLabel="The anchor as a whole"
              choices={target.placements.map(({ id, label }) => ({ value: id, label }))}
              defaultValue={values.placementId ?? target.placementId ?? ""}
              error={errorOf("placementId")}
            />
          ) : null}
          <RadioCards
            name="kind"
            legend="Kind"
            columns={2}
            cards={ASKED.map((value) => ({
              value,
              label: sentence(REPORT_KIND_LABELS[value]),
              detail: KIND_DETAILS[value],
            }))}
            defaultValue={kind}
            onChange={(event) =>
              setKind(REPORT_KINDS.find((one) => one === event.currentTarget.value) ?? null)
            }
            error={errorOf("kind")}
            required
          />
        </FormSection>
      ) : (
        <input type="hidden" name="kind" value="not_in_register" />
      )}
      <FormSection title="How close did you look?" step="2">
        <RadioCards
          name="depth"
          legend="You"
          columns={2}
          cards={DEPTHS.map((value) => ({
            value,
            label: sentence(DEPTH_LABELS[value]),
            detail: DEPTH_DETAILS[value],
          }))}
          defaultValue={values.depth ?? "seen"}
          error={errorOf("depth")}
        />
        <SelectField
          name="grade"
          label="How bad is the worst part?"
          emptyLabel="I cannot say"
          choices={GRADE_CHOICES}
          defaultValue={values.grade ?? ""}
          error={errorOf("grade")}
          optional
        />
      </FormSection>
      {kind && REPORT_MEASUREMENTS[kind].length > 0 ? (
        <FormSection title="What you measured" step="3" intro="Leave empty what you did not measure.">
          <div className="grid gap-5 sm:grid-cols-2">
            {REPORT_MEASUREMENTS[kind].map((measurement) => (
              <MeasurementField
                key={`${kind}.${measurement.key}`}
                measurement={measurement}
                defaultValue={values[`measured.${measurement.key}`]}
                error={errorOf(`measured.${measurement.key}`)}
              />
            ))}
          </div>
        </FormSection>
      ) : null}
      {outOfUse ? (
        <Notice
          tone="stop"
          role="status"
          title="Sending this takes the bolt and the whole anchor out of use at once."
        >
          Its neighbours carried the same event. Stewards and everybody who follows the anchor get a mail; it
          comes back only after a hand check on site.
        </Notice>
      ) : null}
    </div>
  );
}
