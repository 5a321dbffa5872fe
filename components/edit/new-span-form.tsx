"use client";

import { useRouter } from "next/navigation";
import { ComboboxField } from "@/components/ui/combobox-field";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { TextareaField } from "@/components/ui/textarea-field";
import { useDraft } from "@/components/ui/use-draft";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface NewSpanFormProps {
  action: FormAction<{ id: string }>;
  newId: string;
  anchors: readonly { value: string; label: string; detail: string }[];
  /** One end, when the form was opened from its sheet. */
  firstId: string | null;
}

/** A line between two anchors of one area. */
export function NewSpanForm(props: NewSpanFormProps) {
  const draft = useDraft("span");
  return <Fields key={draft.formKey} {...props} draft={draft} />;
}

function Fields({
  action,
  newId,
  anchors,
  firstId,
  draft,
}: NewSpanFormProps & { draft: ReturnType<typeof useDraft> }) {
  const router = useRouter();
  const kept = draft.values;
  const form = useForm(action, ({ id }) => {
    draft.forget();
    router.push(`/spans/${id}`);
  });
  return (
    <form
      {...form.formProps}
      onInput={(event) => draft.keep(event.currentTarget)}
      onChange={(event) => draft.keep(event.currentTarget)}
      className="grid gap-6"
    >
      <ErrorSummary problems={form.problems} />
      <input type="hidden" name="id" value={kept.id ?? newId} readOnly />
      <TextField
        name="name"
        label="Name"
        defaultValue={kept.name}
        error={form.errorOf("name")}
        maxLength={120}
      />
      <ComboboxField
        name="anchorAId"
        label="From"
        choices={anchors}
        defaultValue={kept.anchorAId || firstId}
        error={form.errorOf("anchorAId")}
      />
      <ComboboxField
        name="anchorBId"
        label="To"
        hint="Length and bearing follow from the two places."
        choices={anchors}
        defaultValue={kept.anchorBId || null}
        error={form.errorOf("anchorBId")}
      />
      <TextareaField
        name="note"
        label="Note"
        defaultValue={kept.note}
        error={form.errorOf("note")}
        maxLength={2000}
        optional
      />
      <SubmitButton pending={form.pending} pendingLabel="Storing…">
        Register the span
      </SubmitButton>
    </form>
  );
}
