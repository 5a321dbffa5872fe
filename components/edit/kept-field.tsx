import type { PartProps } from "@/components/edit/edit-types";
import { NumberField } from "@/components/ui/number-field";
import { SelectField } from "@/components/ui/select-field";
import { TextField } from "@/components/ui/text-field";
import { sentence } from "@/lib/domain/labels";

interface KeptProps extends PartProps {
  name: string;
  label: string;
  hint?: string;
  why?: string;
}

/** A number that may be left out, with what it was before. */
export function KeptNumber({ kept, errorOf, name, unit, ...field }: KeptProps & { unit: string }) {
  return (
    <NumberField
      {...field}
      name={name}
      unit={unit}
      defaultValue={kept[name]}
      error={errorOf(name)}
      optional
    />
  );
}

/** A line of text with what it was before. */
export function KeptText({ kept, errorOf, name, ...field }: KeptProps & { optional?: boolean }) {
  return <TextField {...field} name={name} defaultValue={kept[name]} error={errorOf(name)} />;
}

/** One word of a closed list, or not known. */
export function KeptSelect<T extends string>({
  kept,
  errorOf,
  name,
  words,
  labels,
  emptyLabel,
  fallback = "",
  ...field
}: KeptProps & {
  words: readonly T[];
  labels: Readonly<Record<T, string>>;
  /** Left out: one of the words has to be chosen. */
  emptyLabel?: string;
  fallback?: string;
}) {
  return (
    <SelectField
      {...field}
      name={name}
      emptyLabel={emptyLabel}
      choices={words.map((value) => ({ value, label: sentence(labels[value]) }))}
      defaultValue={kept[name] ?? fallback}
      error={errorOf(name)}
      optional={emptyLabel !== undefined}
    />
  );
}
