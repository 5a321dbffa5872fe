"use client";

import { Combobox } from "@base-ui/react/combobox";
import { useState, type ReactNode } from "react";
import { cx } from "@/components/ui/cx";
import { Field, fieldIds, inputLook, type FieldProps } from "@/components/ui/field";

export interface ComboboxChoice {
  value: string;
  label: string;
  /** A second line: what tells this one from its neighbours. */
  detail?: ReactNode;
}

type ComboboxFieldProps = FieldProps & {
  choices: readonly ComboboxChoice[];
  defaultValue?: string | null;
  value?: string | null;
  onValueChange?: (value: string | null) => void;
  placeholder?: string;
  emptyText?: string;
  required?: boolean;
  disabled?: boolean;
};

/** A long list to type into. The form gets the chosen `value` under `name`. */
export function ComboboxField(props: ComboboxFieldProps) {
  const { name, choices, defaultValue, value, onValueChange, placeholder, emptyText, required, disabled } =
    props;
  const { inputId, describedBy, invalid } = fieldIds(props);
  const [inner, setInner] = useState(defaultValue ?? null);
  const chosenValue = value === undefined ? inner : value;
  const chosen = choices.find((choice) => choice.value === chosenValue) ?? null;
  return (
    <Field {...props}>
      {/* Sent by a field of our own: what the list sends is its label when nothing is chosen. */}
      <input type="hidden" name={name} value={chosenValue ?? ""} />
      <Combobox.Root
        items={choices}
        value={chosen}
        isItemEqualToValue={(a, b) => a?.value === b?.value}
        onValueChange={(next: ComboboxChoice | null) => {
          setInner(next?.value ?? null);
          onValueChange?.(next?.value ?? null);
        }}
        disabled={disabled}
      >
        <div className="relative">
          <Combobox.Input
            id={inputId}
            placeholder={placeholder}
            aria-describedby={describedBy}
            aria-invalid={invalid}
            aria-required={required}
            className={cx(inputLook, "pr-24")}
          />
          <div className="absolute inset-y-0 right-0 flex text-muted">
            <Combobox.Clear aria-label="Clear" className="grid touch cursor-pointer place-items-center">
              <Glyph d="m2 2 8 8m-8 0 8-8" />
            </Combobox.Clear>
            <Combobox.Trigger aria-label="Show all" className="grid touch cursor-pointer place-items-center">
              <Glyph d="M1 3.5 6 9l5-5.5" />
            </Combobox.Trigger>
          </div>
        </div>
        <ChoiceList emptyText={emptyText ?? "Nothing of that name."} />
      </Combobox.Root>
    </Field>
  );
}

function ChoiceList({ emptyText }: { emptyText: string }) {
  return (
    <Combobox.Portal>
      <Combobox.Positioner sideOffset={4} className="z-50">
        <Combobox.Popup className="w-(--anchor-width) max-w-(--available-width) border-2 border-frame bg-raised">
          <Combobox.Empty>
            <p className="p-3 text-muted">{emptyText}</p>
          </Combobox.Empty>
          <Combobox.List className="max-h-[min(22rem,var(--available-height))] overflow-y-auto overscroll-contain">
            {(choice: ComboboxChoice) => (
              <Combobox.Item
                key={choice.value}
                value={choice}
                className="flex touch cursor-pointer items-center justify-between gap-2 px-3 py-2 data-highlighted:bg-sunk data-highlighted:text-action"
              >
                <span className="grid min-w-0">
                  <span>{choice.label}</span>
                  {choice.detail ? <span className="text-sm text-muted">{choice.detail}</span> : null}
                </span>
                <Combobox.ItemIndicator className="shrink-0">
                  <Glyph d="m1.5 6.5 3 3 6-7" />
                </Combobox.ItemIndicator>
              </Combobox.Item>
            )}
          </Combobox.List>
        </Combobox.Popup>
      </Combobox.Positioner>
    </Combobox.Portal>
  );
}

function Glyph({ d }: { d: string }) {
  return (
    <svg viewBox="0 0 12 12" aria-hidden="true" className="size-3">
      <path d={d} fill="none" stroke="currentColor" strokeWidth="1.75" />
    </svg>
  );
}
