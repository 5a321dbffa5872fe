import type { ComponentProps } from "react";
import { cx } from "@/components/ui/cx";
import { Field, fieldIds, inputLook, type FieldProps } from "@/components/ui/field";

type NumberFieldProps = FieldProps &
  Omit<ComponentProps<"input">, keyof FieldProps | "type"> & {
    /** Stands inside the field, read out with the label: "mm", "kN", "°C". */
    unit?: string;
  };

/**
 * A number with its unit inside the field. A text input with a number keypad, not `type=number`: nothing is
 * changed by a scrolling thumb, and "12,5" reaches the server as it was typed.
 */
export function NumberField({
  name,
  id,
  label,
  hint,
  why,
  error,
  optional,
  className,
  unit,
  ...rest
}: NumberFieldProps) {
  const named = unit ? (
    <>
      {label}
      <span className="sr-only"> in {unit}</span>
    </>
  ) : (
    label
  );
  const field = { name, id, label: named, hint, why, error, optional, className };
  const { inputId, describedBy, invalid } = fieldIds(field);
  return (
    <Field {...field}>
      <div className="relative">
        <input
          id={inputId}
          name={name}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          aria-describedby={describedBy}
          aria-invalid={invalid}
          className={cx(inputLook, "type-figure text-lg", unit && "pr-14")}
          {...rest}
        />
        {unit ? (
          <span
            aria-hidden="true"
            className="pointer-events-none absolute inset-y-0 right-3 flex items-center type-figure text-muted"
          >
            {unit}
          </span>
        ) : null}
      </div>
    </Field>
  );
}
