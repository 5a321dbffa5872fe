import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

/** What every field has around it. */
export interface FieldProps {
  /** The form name; also the id unless `id` is given. Error summaries link to it. */
  name: string;
  id?: string;
  label: ReactNode;
  /** Format or example, under the label. */
  hint?: ReactNode;
  /** Why the question is asked. */
  why?: ReactNode;
  error?: string | undefined;
  /** Says "optional" after the label. */
  optional?: boolean;
  className?: string;
}

export interface FieldIds {
  inputId: string;
  describedBy: string | undefined;
  invalid: true | undefined;
}

/** Ids that tie label, hint, reason and error to the input. */
export function fieldIds({ name, id, hint, why, error }: FieldProps): FieldIds {
  const inputId = id ?? name;
  const parts = [hint && `${inputId}-hint`, why && `${inputId}-why`, error && `${inputId}-error`].filter(
    Boolean,
  );
  return {
    inputId,
    describedBy: parts.length > 0 ? parts.join(" ") : undefined,
    invalid: error ? true : undefined,
  };
}

/** Label above, reason beside (below it on a phone), input, error under the input in words. */
export function Field(props: FieldProps & { children: ReactNode }) {
  const { label, hint, why, error, optional, className, children } = props;
  const { inputId } = fieldIds(props);
  return (
    <div className={cx("grid content-start gap-1.5", error && "border-l-4 border-stop-fill pl-3", className)}>
      <label htmlFor={inputId} className="text-base font-semibold">
        {label}
        {optional ? <span className="font-normal text-muted"> (optional)</span> : null}
      </label>
      <FieldNotes inputId={inputId} hint={hint} why={why} />
      {children}
      <FieldError inputId={inputId} error={error} />
    </div>
  );
}

export function FieldNotes({ inputId, hint, why }: { inputId: string; hint?: ReactNode; why?: ReactNode }) {
  return (
    <>
      {hint ? (
        <p id={`${inputId}-hint`} className="text-sm text-muted">
          {hint}
        </p>
      ) : null}
      {why ? (
        <p id={`${inputId}-why`} className="border-l-2 border-line pl-2 text-sm text-muted">
          <span className="mr-1 type-label text-text">Why</span>
          {why}
        </p>
      ) : null}
    </>
  );
}

export function FieldError({ inputId, error }: { inputId: string; error: string | undefined }) {
  if (!error) return null;
  return (
    <p id={`${inputId}-error`} className="text-sm font-semibold text-stop">
      <span className="sr-only">Error: </span>
      {error}
    </p>
  );
}

/** The box itself, shared by every kind of field. */
export const inputLook = cx(
  "touch w-full rounded-md border border-line-strong bg-raised px-3 py-2 text-base text-text",
  "placeholder:text-muted disabled:bg-sunk disabled:text-muted [&[readonly]]:bg-sunk",
  "aria-invalid:border-2 aria-invalid:border-stop-fill",
);
