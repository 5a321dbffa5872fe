"use client";

import { v7 } from "uuid";
import { useState } from "react";
import { PlacementPart } from "@/components/edit/part-fields";
import { ErrorSummary } from "@/components/ui/error-summary";
import { Notice } from "@/components/ui/notice";
import { SubmitButton } from "@/components/ui/submit-button";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface AddPlacementFormProps {
  action: FormAction<{ number: number }>;
  anchorId: string;
  newId: string;
  bodies: readonly { id: string; label: string }[];
}

/** What is no bolt: a tree, boulder, thread or removable piece. New holes come with their install. */
export function AddPlacementForm({ action, anchorId, newId, bodies }: AddPlacementFormProps) {
  const [id, setId] = useState(newId);
  const form = useForm(action, () => setId(v7()));
  return (
    <form {...form.formProps} className="grid gap-5">
      <ErrorSummary problems={form.problems} />
      {form.state.state === "done" ? (
        <Notice tone="calm" role="status">
          Stored as placement {form.state.result.number}.
        </Notice>
      ) : null}
      <input type="hidden" name="id" value={id} readOnly />
      <input type="hidden" name="anchorId" value={anchorId} readOnly />
      <PlacementPart
        key={id}
        prefix=""
        kinds={["tree", "boulder", "thread", "removable"]}
        bodies={bodies}
        kept={NONE}
        errorOf={form.errorOf}
      />
      <SubmitButton tone="secondary" pending={form.pending}>
        Add the placement
      </SubmitButton>
    </form>
  );
}

const NONE = {};
