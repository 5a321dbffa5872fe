"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import type { InstallFormProps } from "@/components/install/install-form";
import { keptRows, SeriesFields } from "@/components/install/series-fields";
import { ErrorSummary } from "@/components/ui/error-summary";
import { Notice } from "@/components/ui/notice";
import { SubmitButton } from "@/components/ui/submit-button";
import { useDraft } from "@/components/ui/use-draft";
import { useForm } from "@/components/ui/use-form";

/** A row: what all bolts share once, then hole and depth of each. All are stored, or none. */
export function SeriesForm(props: InstallFormProps) {
  const draft = useDraft(`series:${props.anchor.code}`);
  return <Fields key={draft.formKey} {...props} draft={draft} />;
}

function Fields({
  save,
  draft,
  newId,
  newPlacementId,
  placementId,
  ...props
}: InstallFormProps & { draft: ReturnType<typeof useDraft> }) {
  const router = useRouter();
  const kept = draft.values;
  const firstRows = [{ id: newId, newPlacementId, placementId }];
  const [count, setCount] = useState(() => keptRows(kept, firstRows).length);
  const form = useForm(save, () => {
    draft.forget();
    router.push(`/anchors/${props.anchor.code}?installed=series`);
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
      <input type="hidden" name="anchorId" value={props.anchor.id} readOnly />
      <SeriesFields {...props} firstRows={firstRows} kept={kept} errorOf={errorOf} onCount={setCount} />
      <SubmitButton pending={form.pending} pendingLabel="Storing…">
        {count === 1 ? "Store 1 bolt" : `Store ${count} bolts`}
      </SubmitButton>
    </form>
  );
}
