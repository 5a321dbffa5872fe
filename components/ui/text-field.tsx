import type { ComponentProps } from "react";
import { cx } from "@/components/ui/cx";
import { Field, fieldIds, inputLook, type FieldProps } from "@/components/ui/field";

type TextFieldProps = FieldProps &
  Omit<ComponentProps<"input">, keyof FieldProps> & {
    /** Codes and coordinates are set in the code face. */
    code?: boolean;
  };

/** One line of text. */
export function TextField({
  name,
  id,
  label,
  hint,
  why,
  error,
  optional,
  className,
  code,
  ...rest
}: TextFieldProps) {
  const field = { name, id, label, hint, why, error, optional, className };
  const { inputId, describedBy, invalid } = fieldIds(field);
  return (
    <Field {...field}>
      <input
        id={inputId}
        name={name}
        aria-describedby={describedBy}
        aria-invalid={invalid}
        className={cx(inputLook, code && "type-code")}
        {...rest}
      />
    </Field>
  );
}
