"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { PhotoPicker } from "@/components/report/photo-picker";
import { usePhotos } from "@/components/report/use-photos";
import { Button } from "@/components/ui/button";
import { ErrorSummary } from "@/components/ui/error-summary";
import { Notice } from "@/components/ui/notice";
import { SelectField } from "@/components/ui/select-field";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import { WhenField } from "@/components/ui/when-field";
import type { FormAction } from "@/lib/shared/action-state";

const DEPTH_CHOICES = [
  { value: "handled", label: "Pulled and turned by hand" },
  { value: "torqued", label: "With a torque wrench" },
  { value: "pulled", label: "With a measured pull" },
] as const;

interface HandCheckFormProps {
  anchorId: string;
  placementId: string;
  placementNumber: number;
  /** Minted by the page: pressed twice, it is one check. */
  newId: string;
  now: string;
  action: FormAction<{ id: string }>;
}

/** One bolt checked by hand and found sound, with the photo that belongs to it. */
export function HandCheckForm({ placementNumber, newId, now, action, ...of }: HandCheckFormProps) {
  const router = useRouter();
  const pictures = usePhotos();
  const [storedId, setStoredId] = useState<string | null>(null);
  const sendPhotos = async (id: string) => {
    if (await pictures.sendAll(`/api/v1/reports/${id}/photos`)) router.refresh();
  };
  const withPhoto: FormAction<{ id: string }> = async (before, sent) => {
    if (pictures.photos.length > 0) return action(before, sent);
    const message = "Add a photo: without one the check does not count for putting it back.";
    const problems = [{ path: "photo", message }];
    return { state: "refused", code: "invalid_input", message, problems, values: null };
  };
  const form = useForm(withPhoto, async ({ id }) => {
    setStoredId(id);
    await sendPhotos(id);
  });
  const prefix = `check-${placementNumber}`;
  const problems = form.problems.map(({ path, message }) => ({ path: path && `${prefix}-${path}`, message }));

  return (
    <form {...form.formProps} className="grid gap-4">
      <ErrorSummary problems={problems} title="Not stored yet" />
      <input type="hidden" name="id" value={newId} readOnly />
      <input type="hidden" name="anchorId" value={of.anchorId} readOnly />
      <input type="hidden" name="placementId" value={of.placementId} readOnly />
      <div className="grid gap-4 sm:grid-cols-2">
        <SelectField
          name="depth"
          id={`${prefix}-depth`}
          label="How it was checked"
          choices={DEPTH_CHOICES}
          error={form.errorOf("depth")}
        />
        <WhenField
          name="observedAt"
          id={`${prefix}-observedAt`}
          label="When"
          defaultValue={now}
          max={now}
          error={form.errorOf("observedAt")}
        />
      </div>
      <TextField
        name="note"
        id={`${prefix}-note`}
        label="What you felt and saw"
        error={form.errorOf("note")}
        maxLength={2000}
        optional
      />
      <PhotoPicker
        id={`${prefix}-photo`}
        needed
        label={`Photo of placement ${placementNumber}`}
        photos={pictures.photos}
        onAdd={pictures.add}
        onRemove={pictures.remove}
        error={form.errorOf("photo")}
      />
      {storedId === null ? (
        <SubmitButton tone="secondary" pending={form.pending} pendingLabel="Storing…">
          Handled, and nothing found against it
        </SubmitButton>
      ) : (
        <Notice tone="warn" role="status" title="The check is stored, its photo is not yet.">
          <Button onClick={() => void sendPhotos(storedId)}>Send the photo again</Button>
        </Notice>
      )}
      <p className="text-sm text-muted">
        Found something? Report it instead: a check by hand is for a bolt that does not move, sounds solid and
        is neither bent nor cracked.
      </p>
    </form>
  );
}
