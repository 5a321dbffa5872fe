"use client";

import { useRouter } from "next/navigation";
import type { Kept } from "@/components/edit/edit-types";
import { isStale, StaleNotice, versionToSend } from "@/components/edit/stale-notice";
import { PointFields } from "@/components/place/point-fields";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface MoveAnchorFormProps {
  action: FormAction<void>;
  anchor: { id: string; code: string; version: number };
  /** Where it is now, by field name. */
  stored: Kept;
  marks: readonly { lon: number; lat: number; name: string }[];
}

const LABELS = { "point.lat": "Latitude", "point.lon": "Longitude", pointErrorM: "Known within, m" };

/** Moves an anchor on the map, with a reason. */
export function MoveAnchorForm({ action, anchor, stored, marks }: MoveAnchorFormProps) {
  const router = useRouter();
  const form = useForm(action, () => router.push(`/anchors/${anchor.code}`));
  const stale = isStale(form.state);
  return (
    <form {...form.formProps} className="grid gap-7">
      {stale ? null : <ErrorSummary problems={form.problems} />}
      <StaleNotice state={form.state} labels={LABELS} href={`/anchors/${anchor.code}`} />
      <input type="hidden" name="id" value={anchor.id} readOnly />
      <input
        type="hidden"
        name="version"
        value={versionToSend(form.state, String(anchor.version))}
        readOnly
      />
      <PointFields kept={stored} marks={marks} errorOf={form.errorOf} />
      <TextField
        name="reason"
        label="Why it is moved"
        hint="Measured again, was on the wrong side of the gap"
        error={form.errorOf("reason")}
        maxLength={500}
      />
      <SubmitButton pending={form.pending} pendingLabel="Moving…">
        {stale ? "Move it all the same" : "Move it"}
      </SubmitButton>
    </form>
  );
}
