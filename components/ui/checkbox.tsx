import type { ComponentProps, ReactNode } from "react";
import { FieldError, fieldIds } from "@/components/ui/field";
import { cx } from "@/components/ui/cx";

type CheckboxProps = Omit<ComponentProps<"input">, "type" | "name" | "id"> & {
  name: string;
  id?: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string;
};

/** One yes-or-nothing. The whole row is the target. */
export function Checkbox({ name, id, label, hint, error, className, ...rest }: CheckboxProps) {
  const { inputId, describedBy, invalid } = fieldIds({ name, id, label, hint, error });
  return (
    <div className={cx("grid gap-1", error && "border-l-4 border-stop-fill pl-3", className)}>
      <label htmlFor={inputId} className="flex touch cursor-pointer items-start gap-3 py-2.5">
        <input
          id={inputId}
          name={name}
          type="checkbox"
          aria-describedby={describedBy}
          aria-invalid={invalid}
          className="mt-0.5 size-5 shrink-0 cursor-pointer accent-action"
          {...rest}
        />
        <span className="grid gap-0.5">
          <span>{label}</span>
          {hint ? (
            <span id={`${inputId}-hint`} className="text-sm text-muted">
              {hint}
            </span>
          ) : null}
        </span>
      </label>
      <FieldError inputId={inputId} error={error} />
    </div>
  );
}
