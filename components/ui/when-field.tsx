"use client";

import { useState } from "react";
import { cx } from "@/components/ui/cx";
import { Field, fieldIds, inputLook, type FieldProps } from "@/components/ui/field";

/** A day and time as the clock on the wall shows it; the form gets the UTC instant. */
export function WhenField(props: FieldProps & { defaultValue: string; max?: string; onChange?: () => void }) {
  const { defaultValue, max, ...field } = props;
  const [instant, setInstant] = useState(defaultValue);
  const { inputId, describedBy, invalid } = fieldIds(field);
  return (
    <Field {...field}>
      <input type="hidden" name={field.name} value={instant} />
      <input
        id={inputId}
        type="datetime-local"
        suppressHydrationWarning
        defaultValue={localOf(defaultValue)}
        max={max ? localOf(max) : undefined}
        aria-describedby={describedBy}
        aria-invalid={invalid}
        className={cx(inputLook, "type-figure")}
        onChange={(event) => setInstant(instantOf(event.currentTarget.value))}
      />
    </Field>
  );
}

/** `2026-05-04T10:30:00Z` → `2026-05-04T12:30` where the device stands. */
function localOf(instant: string): string {
  const at = new Date(instant);
  if (Number.isNaN(at.getTime())) return "";
  return new Date(at.getTime() - at.getTimezoneOffset() * 60_000).toISOString().slice(0, 16);
}

function instantOf(local: string): string {
  const at = new Date(local);
  return Number.isNaN(at.getTime()) ? "" : at.toISOString();
}
