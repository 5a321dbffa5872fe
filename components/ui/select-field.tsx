import type { ComponentProps } from "react";
import { cx } from "@/components/ui/cx";
import { Field, fieldIds, inputLook, type FieldProps } from "@/components/ui/field";

export interface Choice {
  value: string;
  label: string;
  disabled?: boolean;
}

type SelectFieldProps = FieldProps &
  Omit<ComponentProps<"select">, keyof FieldProps | "children" | "multiple"> & {
    choices: readonly Choice[];
    /** First entry with an empty value, for "not chosen" or "not known". */
    emptyLabel?: string;
  };

/** The platform's own picker: the quickest one on a phone. */
export function SelectField({
  name,
  id,
  label,
  hint,
  why,
  error,
  optional,
  className,
  choices,
  emptyLabel,
  ...rest
}: SelectFieldProps) {
  const field = { name, id, label, hint, why, error, optional, className };
  const { inputId, describedBy, invalid } = fieldIds(field);
  return (
    <Field {...field}>
      <div className="relative">
        <select
          id={inputId}
          name={name}
          aria-describedby={describedBy}
          aria-invalid={invalid}
          className={cx(inputLook, "cursor-pointer appearance-none pr-10")}
          {...rest}
        >
          {emptyLabel !== undefined ? <option value="">{emptyLabel}</option> : null}
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value} disabled={choice.disabled}>
              {choice.label}
            </option>
          ))}
        </select>
        <svg
          viewBox="0 0 12 12"
          aria-hidden="true"
          className="pointer-events-none absolute top-1/2 right-3 size-3 -translate-y-1/2 text-muted"
        >
          <path d="M1 3.5 6 9l5-5.5" fill="none" stroke="currentColor" strokeWidth="1.75" />
        </svg>
      </div>
    </Field>
  );
}
