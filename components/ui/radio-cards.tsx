import type { ChangeEventHandler, ReactNode } from "react";
import { FieldError, FieldNotes } from "@/components/ui/field";
import { cx } from "@/components/ui/cx";

export interface RadioCard {
  value: string;
  label: ReactNode;
  /** One line under the label. */
  detail?: ReactNode;
  /** A mark or drawing before the label. */
  figure?: ReactNode;
  disabled?: boolean;
}

interface RadioCardsProps {
  name: string;
  legend: ReactNode;
  cards: readonly RadioCard[];
  hint?: ReactNode;
  why?: ReactNode;
  error?: string;
  optional?: boolean;
  defaultValue?: string | null;
  value?: string | null;
  onChange?: ChangeEventHandler<HTMLInputElement>;
  columns?: 1 | 2 | 3;
  required?: boolean;
  className?: string;
}

const COLUMNS = { 1: "", 2: "sm:grid-cols-2", 3: "sm:grid-cols-2 lg:grid-cols-3" } as const;

/** A choice of a few, each with room to explain itself; big enough for cold hands. */
export function RadioCards(props: RadioCardsProps) {
  const { name, legend, cards, hint, why, error, optional, defaultValue, value, onChange, required } = props;
  const controlled = value !== undefined;
  const notes = [hint && `${name}-hint`, why && `${name}-why`, error && `${name}-error`].filter(Boolean);
  return (
    <fieldset
      id={name}
      tabIndex={-1}
      aria-describedby={notes.length > 0 ? notes.join(" ") : undefined}
      className={cx("grid min-w-0 gap-1.5", error && "border-l-4 border-stop-fill pl-3", props.className)}
    >
      <legend className="mb-1.5 text-base font-semibold">
        {legend}
        {optional ? <span className="font-normal text-muted"> (optional)</span> : null}
      </legend>
      <FieldNotes inputId={name} hint={hint} why={why} />
      <div className={cx("grid gap-2", COLUMNS[props.columns ?? 1])}>
        {cards.map((card) => (
          <label
            key={card.value}
            className={cx(
              "relative flex touch cursor-pointer items-center gap-3 rounded-md border border-line-strong bg-raised px-3 py-2.5",
              "hover:border-text has-checked:border-action has-checked:bg-calm-ground has-checked:inset-ring-1 has-checked:inset-ring-action",
              "has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-focus",
              "has-disabled:cursor-not-allowed has-disabled:opacity-55",
            )}
          >
            <input
              type="radio"
              name={name}
              value={card.value}
              disabled={card.disabled}
              required={required}
              {...(controlled
                ? { checked: value === card.value }
                : { defaultChecked: defaultValue === card.value })}
              onChange={onChange}
              className="size-5 shrink-0 cursor-pointer accent-action outline-none"
            />
            {card.figure}
            <span className="grid min-w-0">
              <span className="leading-snug">{card.label}</span>
              {card.detail ? <span className="text-sm text-muted">{card.detail}</span> : null}
            </span>
          </label>
        ))}
      </div>
      <FieldError inputId={name} error={error} />
    </fieldset>
  );
}
