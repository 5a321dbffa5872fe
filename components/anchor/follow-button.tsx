"use client";

import { useForm } from "@/components/ui/use-form";
import { SubmitButton } from "@/components/ui/submit-button";
import type { FormAction } from "@/lib/shared/action-state";

interface FollowButtonProps {
  anchorId: string;
  watched: boolean;
  action: FormAction<{ on: boolean }>;
}

/** Mail whenever something changes here. */
export function FollowButton({ anchorId, watched, action }: FollowButtonProps) {
  const form = useForm(action);
  const on = form.state.state === "done" ? form.state.result.on : watched;
  return (
    <form {...form.formProps}>
      <input type="hidden" name="anchorId" value={anchorId} />
      <input type="hidden" name="on" value={on ? "false" : "true"} />
      <SubmitButton tone="secondary" pending={form.pending} pendingLabel="Saving…" aria-pressed={on}>
        {on ? "Following" : "Follow"}
      </SubmitButton>
    </form>
  );
}
