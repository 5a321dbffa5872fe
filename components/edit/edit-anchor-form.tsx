"use client";

import { useRouter } from "next/navigation";
import type { Kept } from "@/components/edit/edit-types";
import { FactSections } from "@/components/edit/fact-fields";
import { FACT_LABELS } from "@/components/edit/fact-labels";
import { isStale, StaleNotice, versionToSend } from "@/components/edit/stale-notice";
import { ErrorSummary } from "@/components/ui/error-summary";
import { Notice } from "@/components/ui/notice";
import { NumberField } from "@/components/ui/number-field";
import { SubmitButton } from "@/components/ui/submit-button";
import { useDraft } from "@/components/ui/use-draft";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface EditAnchorFormProps {
  action: FormAction<void>;
  anchor: { id: string; code: string; version: number };
  /** The facts as they are stored, by field name. */
  stored: Kept;
  legs: readonly number[];
}

/** Corrects the facts of an anchor. Where it is has a page of its own. */
export function EditAnchorForm(props: EditAnchorFormProps) {
  const draft = useDraft(`edit:${props.anchor.code}`);
  return <Fields key={draft.formKey} {...props} draft={draft} />;
}

function Fields({
  action,
  anchor,
  stored,
  legs,
  draft,
}: EditAnchorFormProps & { draft: ReturnType<typeof useDraft> }) {
  const router = useRouter();
  const kept = draft.restored ? draft.values : stored;
  const form = useForm(action, () => {
    draft.forget();
    router.push(`/anchors/${anchor.code}`);
  });
  const stale = isStale(form.state);
  return (
    <form
      {...form.formProps}
      onInput={(event) => draft.keep(event.currentTarget)}
      onChange={(event) => draft.keep(event.currentTarget)}
      className="grid gap-7"
    >
      {stale ? null : <ErrorSummary problems={form.problems} />}
      <StaleNotice state={form.state} labels={FACT_LABELS} href={`/anchors/${anchor.code}`} />
      {draft.restored && form.state.state === "idle" ? (
        <Notice role="note">What you typed before is still here.</Notice>
      ) : null}
      <input type="hidden" name="id" value={anchor.id} readOnly />
      <input
        type="hidden"
        name="version"
        value={versionToSend(form.state, kept.version ?? String(anchor.version))}
        readOnly
      />
      <FactSections kept={kept} errorOf={form.errorOf} legs={legs} />
      <NumberField
        name="pointErrorM"
        label="Its place is known within"
        unit="m"
        defaultValue={kept.pointErrorM}
        error={form.errorOf("pointErrorM")}
        optional
      />
      <SubmitButton pending={form.pending} width="full" pendingLabel="Saving…">
        {stale ? "Save my version" : "Save"}
      </SubmitButton>
    </form>
  );
}
