"use client";

import { useRouter } from "next/navigation";
import type { Kept } from "@/components/edit/edit-types";
import { DirectionFields, NameFields, OtherFields, RiggingFields } from "@/components/edit/fact-fields";
import { EdgePart, PlacementPart, RockBodyPart, Rows, useRows } from "@/components/edit/part-fields";
import { PointFields } from "@/components/place/point-fields";
import { ErrorSummary } from "@/components/ui/error-summary";
import { FormSection } from "@/components/ui/form-section";
import { Notice } from "@/components/ui/notice";
import { SubmitButton } from "@/components/ui/submit-button";
import { useDraft } from "@/components/ui/use-draft";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface NewAnchorFormProps {
  action: FormAction<{ code: string }>;
  siteId: string;
  siteSlug: string;
  /** Minted on opening: sent twice it is one anchor. */
  newId: string;
  marks: readonly { lon: number; lat: number; name: string }[];
}

/** A new anchor: where, what for, how face and load lie, and what the placements are. */
export function NewAnchorForm(props: NewAnchorFormProps) {
  const draft = useDraft(`anchor:${props.siteSlug}`);
  return <Fields key={draft.formKey} {...props} draft={draft} />;
}

function Fields({ action, draft, ...props }: NewAnchorFormProps & { draft: ReturnType<typeof useDraft> }) {
  const router = useRouter();
  const kept: Kept = draft.values;
  const bodies = useRows(kept, "rockBodies");
  const holes = useRows(kept, "placements", 1);
  const edges = useRows(kept, "edges");
  const form = useForm(action, ({ code }) => {
    draft.forget();
    router.push(`/anchors/${code}`);
  });
  const part = { kept, errorOf: form.errorOf };
  const named = bodies.ids.map((id, index) => ({ id, label: `Rock body ${index + 1}` }));
  return (
    <form
      {...form.formProps}
      onInput={(event) => draft.keep(event.currentTarget)}
      onChange={(event) => draft.keep(event.currentTarget)}
      className="grid gap-7"
    >
      <ErrorSummary problems={form.problems} />
      {draft.restored ? <Notice role="note">What you typed before is still here.</Notice> : null}
      <input type="hidden" name="id" value={kept.id ?? props.newId} readOnly />
      <input type="hidden" name="siteId" value={props.siteId} readOnly />
      <FormSection title="Name and use" step="1">
        <NameFields {...part} />
      </FormSection>
      <FormSection title="Where" step="2">
        <PointFields {...part} marks={props.marks} />
      </FormSection>
      <FormSection
        title="Face and direction"
        step="3"
        intro="Leave empty what you do not know: it is asked for later."
      >
        <DirectionFields {...part} />
      </FormSection>
      <FormSection
        title="Rock bodies"
        step="4"
        intro="Only where not everything is in one attached face: a block, a flake, a boulder."
      >
        <Rows rows={bodies} name="Rock body" list="rockBodies">
          {(index) => <RockBodyPart {...part} prefix={`rockBodies.${index}.`} />}
        </Rows>
      </FormSection>
      <FormSection
        title="Placements"
        step="5"
        intro="Holes, and trees, boulders, threads or removable gear. Placement 1 is where everything is measured from. The bolts themselves are logged afterwards."
      >
        <Rows rows={holes} name="Placement" list="placements">
          {(index) => <PlacementPart {...part} prefix={`placements.${index}.`} bodies={named} />}
        </Rows>
      </FormSection>
      <FormSection title="Masterpoint" step="6">
        <RiggingFields {...part} legs={holes.ids.map((_, index) => index + 1)} />
      </FormSection>
      <FormSection title="Edges" step="7" intro="What ropes or slings run over.">
        <Rows rows={edges} name="Edge" list="edges">
          {(index) => <EdgePart {...part} prefix={`edges.${index}.`} />}
        </Rows>
      </FormSection>
      <FormSection title="The rest" step="8">
        <OtherFields {...part} />
      </FormSection>
      <SubmitButton pending={form.pending} width="full" pendingLabel="Storing…">
        Register the anchor
      </SubmitButton>
    </form>
  );
}
