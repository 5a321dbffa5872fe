import type { ComponentProps } from "react";
import { cx } from "@/components/ui/cx";
import { Field, fieldIds, inputLook, type FieldProps } from "@/components/ui/field";

type TextareaFieldProps = FieldProps & Omit<ComponentProps<"textarea">, keyof FieldProps>;

/** Several lines of text; grows with what is typed where the browser can. */
export function TextareaField({
  name,
  id,
  label,
  hint,
  why,
  error,
  optional,
  className,
  rows = 3,
  ...rest
}: TextareaFieldProps) {
  const field = { name, id, label, hint, why, error, optional, className };
  const { inputId, describedBy, invalid } = fieldIds(field);
  return (
    <Field {...field}>
      <textarea
        id={inputId}
        name={name}
        rows={rows}
        aria-describedby={describedBy}
        aria-invalid={invalid}
        className={cx(inputLook, "field-sizing-content min-h-24")}
        {...rest}
      />
    </Field>
  );
}
