"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { DetailFields } from "@/components/install/detail-fields";
import type { GlueChoice, InstallAnchor, TypeChoice } from "@/components/install/install-types";
import { PlacementFields } from "@/components/install/placement-fields";
import { SettingFields } from "@/components/install/setting-fields";
import { type Judged, TypeField } from "@/components/install/type-field";
import { PhotoPicker } from "@/components/report/photo-picker";
import { usePhotos } from "@/components/report/use-photos";
import { ErrorSummary } from "@/components/ui/error-summary";
import { FormSection } from "@/components/ui/form-section";
import { Notice } from "@/components/ui/notice";
import { NumberField } from "@/components/ui/number-field";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextareaField } from "@/components/ui/textarea-field";
import { useDraft } from "@/components/ui/use-draft";
import { useForm } from "@/components/ui/use-form";
import { type Method, METHODS } from "@/lib/domain/vocabulary";
import type { FormAction } from "@/lib/shared/action-state";

export interface InstallFormProps {
  anchor: InstallAnchor;
  types: readonly TypeChoice[];
  glues: readonly GlueChoice[];
  judge: FormAction<Judged>;
  save: FormAction<{ id: string }>;
  /** Minted on opening: sending twice is one bolt. */
  newId: string;
  newPlacementId: string;
  placementId: string | null;
  today: string;
  now: string;
  installer: string;
}

/** One bolt into one hole: type and verdict, hole, setting, the rest. */
export function InstallForm(props: InstallFormProps) {
  const draft = useDraft(`install:${props.anchor.code}`);
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
  const [typeId, setTypeId] = useState<string | null>(kept.boltTypeId || null);
  const type = types.find((one) => one.id === typeId) ?? null;
  const [method, setMethod] = useState<Method | null>(METHODS.find((one) => one === kept.method) ?? null);
  const [embedmentMm, setEmbedment] = useState(kept.embedmentMm ?? "");
  const [leverMm, setLever] = useState(kept.leverMm ?? "");
  const pictures = usePhotos();
  const [savedId, setSavedId] = useState<string | null>(null);
  const form = useForm(save, async ({ id }) => {
    draft.forget();
    setSavedId(id);
    if (await pictures.sendAll(`/api/v1/bolts/${id}/photos`))
      router.push(`/anchors/${anchor.code}?installed=${id}`);
  });
  const choose = (id: string | null) => {
    setTypeId(id);
    const methods = types.find((one) => one.id === id)?.methods ?? [];
    if (method === null || !methods.includes(method)) setMethod(methods[0] ?? null);
  };

  return (
    <form
      {...form.formProps}
      onInput={(event) => draft.keep(event.currentTarget)}
      onChange={(event) => draft.keep(event.currentTarget)}
      className="grid gap-7"
    >
      <ErrorSummary problems={form.problems} />
      {draft.restored && savedId === null ? (
        <Notice role="note">
          What you typed before is still here; it is kept on this device until it is stored.
        </Notice>
      ) : null}
      <input type="hidden" name="id" value={kept.id ?? props.newId} readOnly />
      <input type="hidden" name="anchorId" value={anchor.id} readOnly />
      <FormSection
        title="Type"
        step="1"
        intro="Choose it before you drill: the verdict for this anchor stands below it."
      >
        <TypeField
          name="boltTypeId"
          anchorId={anchor.id}
          types={types}
          judge={judge}
          value={typeId}
          onChange={choose}
          typed={{ method: method ?? "", embedmentMm, leverMm }}
          error={form.errorOf("boltTypeId")}
        />
        <DetailFields prefix="" untyped={type === null} kept={kept} errorOf={form.errorOf} />
      </FormSection>
      <FormSection title="Hole" step="2">
        <PlacementFields
          anchor={anchor}
          prefix=""
          newPlacementId={props.newPlacementId}
          kept={kept}
          errorOf={form.errorOf}
          initialPlacementId={props.placementId}
        />
        <div className="grid gap-5 sm:grid-cols-2">
          <NumberField
            name="embedmentMm"
            label="Depth that holds"
            unit="mm"
            hint="h_ef of a stud, engaged thread of a screw, straight rod of a glued bolt"
            value={embedmentMm}
            onChange={(event) => setEmbedment(event.currentTarget.value)}
            error={form.errorOf("embedmentMm")}
          />
          <NumberField
            name="leverMm"
            label="Rock to load"
            unit="mm"
            hint="Only where it is not as the type says"
            why="Twice the arm halves the load at which it bends."
            value={leverMm}
            onChange={(event) => setLever(event.currentTarget.value)}
            error={form.errorOf("leverMm")}
            optional
          />
        </div>
      </FormSection>
      <FormSection title="How it was set" step="3">
        <SettingFields
          prefix=""
          methods={type?.methods ?? []}
          method={method}
          onMethod={setMethod}
          glues={glues}
          today={props.today}
          now={props.now}
          installer={props.installer}
          kept={kept}
          errorOf={form.errorOf}
        />
      </FormSection>
      <FormSection title="Note and photos" step="4">
        <TextareaField
          name="note"
          label="Note"
          optional
          defaultValue={kept.note}
          error={form.errorOf("note")}
          maxLength={2000}
        />
        <PhotoPicker
          photos={pictures.photos}
          onAdd={pictures.add}
          onRemove={pictures.remove}
          onRetry={(id) => {
            const photo = pictures.photos.find((one) => one.id === id);
            if (photo && savedId) void pictures.send(photo, `/api/v1/bolts/${savedId}/photos`);
          }}
        />
      </FormSection>
      {savedId ? (
        <Notice tone="warn" role="status" title="The install is stored.">
          Some photos are still on their way or were not taken.{" "}
          <a className="underline" href={`/anchors/${anchor.code}?installed=${savedId}`}>
            Go to the sheet
          </a>
        </Notice>
      ) : (
        <SubmitButton pending={form.pending} width="full" pendingLabel="Storing…">
          Store the install
        </SubmitButton>
      )}
    </form>
  );
}
