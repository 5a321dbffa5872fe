import { NumberField } from "@/components/ui/number-field";
import { SelectField } from "@/components/ui/select-field";
import { sentence } from "@/lib/domain/labels";
import type { Measurement } from "@/lib/domain/report/report-measurements";

/** One measurement of a report, in the field that fits it. All of them may be left empty. */
export function MeasurementField({
  measurement,
  defaultValue,
  error,
}: {
  measurement: Measurement;
  defaultValue: string | undefined;
  error: string | undefined;
}) {
  const name = `measured.${measurement.key}`;
  if (measurement.type === "number") {
    const { label, unit, min, max } = measurement;
    return (
      <NumberField
        name={name}
        label={label}
        unit={unit}
        hint={`${min} to ${max}`}
        defaultValue={defaultValue}
        error={error}
        optional
      />
    );
  }
  const choices =
    measurement.type === "yes_no"
      ? [
          { value: "true", label: "Yes" },
          { value: "false", label: "No" },
        ]
      : measurement.options.map((value) => ({ value, label: sentence(value) }));
  return (
    <SelectField
      name={name}
      label={measurement.label}
      emptyLabel="Not looked at"
      choices={choices}
      defaultValue={defaultValue ?? ""}
      error={error}
      optional
    />
  );
}
