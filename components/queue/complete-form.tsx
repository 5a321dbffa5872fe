"use client";

import { useState } from "react";
import { type FirstRow, SeriesFields, type SeriesFieldsProps } from "@/components/install/series-fields";
import type { JobRef } from "@/components/queue/job-form";
import { OUTCOME_DETAILS } from "@/components/queue/job-words";
import { PhotoPicker } from "@/components/report/photo-picker";
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
import { HOLE_FATE_LABELS, JOB_OUTCOME_LABELS, sentence } from "@/lib/domain/labels";
import { HOLE_FATES, type JobOutcome, JOB_OUTCOMES } from "@/lib/domain/vocabulary";
import type { FormAction } from "@/lib/shared/action-state";

interface CompleteFormProps {
  job: JobRef;
  complete: FormAction<void>;
  /** Everything the new bolt is chosen and described with. */
  install: Pick<SeriesFieldsProps, "anchor" | "types" | "glues" | "judge" | "today" | "now" | "installer"> & {
    firstRows: readonly FirstRow[];
  };
}

/** What was done, what became of the hole, and a photo of it. */
export function CompleteForm(props: CompleteFormProps) {
  const draft = useDraft(`job:${props.job.id}`);
  return <Fields key={draft.formKey} {...props} draft={draft} />;
}

function Fields({
  job,
  complete,
  install,
  draft,
}: CompleteFormProps & { draft: ReturnType<typeof useDraft> }) {
  const kept = draft.values;
  const [outcome, setOutcome] = useState<JobOutcome | null>(
    JOB_OUTCOMES.find((one) => one === kept.outcome) ?? null,
  );
  const pictures = usePhotos();
  const withPhoto: FormAction<void> = async (before, sent) => {
    // The photo first: the work is closed with it, and a refused one must not leave the job half done.
    const taken = await pictures.sendAll(`/api/v1/rebolt-jobs/${job.id}/photos`);
    if (pictures.photos.length > 0 && taken) return complete(before, sent);
    const message =
      pictures.photos.length === 0
        ? "Add a photo of the finished work."
        : "A photo was not taken: try it again or leave it out.";
    return {
      state: "refused",
      code: "invalid_input",
      message,
      problems: [{ path: "photoId", message }],
      values: null,
    };
  };
  const form = useForm(withPhoto, draft.forget);
  const problems = form.problems.map(({ path, message }) => ({
    path: path.replace(/^install\./, "bolts."),
    message,
  }));
  const found = (path: string) => problems.find((problem) => problem.path === path)?.message;
  // A problem of a shared value arrives once for every bolt: it is shown where the value was typed.
  const errorOf = (path: string) => found(path.replace(/^common\./, "bolts.0.")) ?? found(path);

  return (
    <form
      {...form.formProps}
      onInput={(event) => draft.keep(event.currentTarget)}
      onChange={(event) => draft.keep(event.currentTarget)}
      className="grid gap-7"
    >
      <ErrorSummary problems={problems} title="Not closed yet" />
      {draft.restored ? <Notice role="note">What you typed before is still here.</Notice> : null}
      <input type="hidden" name="id" value={job.id} readOnly />
      <input type="hidden" name="version" value={job.version} readOnly />
      <input type="hidden" name="photoId" value={pictures.photos[0]?.id ?? ""} readOnly />
      <RadioCards
        name="outcome"
        legend="What was done"
        columns={2}
        cards={JOB_OUTCOMES.map((value) => ({
          value,
          label: sentence(JOB_OUTCOME_LABELS[value]),
          detail: OUTCOME_DETAILS[value],
        }))}
        value={outcome}
        onChange={(event) =>
          setOutcome(JOB_OUTCOMES.find((one) => one === event.currentTarget.value) ?? null)
        }
        error={errorOf("outcome")}
      />
      {outcome === "new_bolt" ? (
        <SeriesFields {...install} kept={kept} errorOf={errorOf} firstStep={1} />
      ) : null}
      <FormSection title="The end of it">
        {outcome === "new_bolt" || outcome === "removed" ? (
          <SelectField
            name="holeFate"
            label="What became of the old hole"
            emptyLabel="Choose"
            choices={HOLE_FATES.map((value) => ({ value, label: sentence(HOLE_FATE_LABELS[value]) }))}
            defaultValue={kept.holeFate ?? ""}
            error={errorOf("holeFate")}
          />
        ) : null}
        <TextareaField
          name="note"
          label="Note"
          optional
          defaultValue={kept.note}
          error={errorOf("note")}
          maxLength={2000}
        />
        <PhotoPicker
          id="photoId"
          needed
          label="Photo of the finished work"
          photos={pictures.photos}
          onAdd={pictures.add}
          onRemove={pictures.remove}
          error={errorOf("photoId")}
        />
      </FormSection>
      <SubmitButton pending={form.pending} width="full" pendingLabel="Closing the job…">
        Close the job
      </SubmitButton>
    </form>
  );
}
