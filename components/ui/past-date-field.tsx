"use client";

import { useState } from "react";
import { cx } from "@/components/ui/cx";
import { Field, fieldIds, inputLook, type FieldProps } from "@/components/ui/field";
import type { PastDatePrecision } from "@/lib/shared/format";

type PastDateFieldProps = FieldProps & {
  /** Form name of how well the date is known; the date itself goes under `name` as YYYY-MM-DD. */
  precisionName: string;
  defaultOn?: string | null;
  defaultPrecision?: PastDatePrecision;
};

const WAYS: readonly { value: PastDatePrecision; label: string }[] = [
  { value: "day", label: "on the day" },
  { value: "month", label: "in the month" },
  { value: "year", label: "in the year" },
  { value: "before", label: "before the year" },
];

/** A date in the past, given as well as it is known. */
export function PastDateField(props: PastDateFieldProps) {
  const { name, precisionName, defaultOn, defaultPrecision = "day" } = props;
  const { inputId, describedBy, invalid } = fieldIds(props);
  const [precision, setPrecision] = useState(defaultPrecision);
  const [day, setDay] = useState(defaultOn ?? "");
  const yearOnly = precision === "year" || precision === "before";
  const kept = yearOnly ? 1 : precision === "month" ? 2 : 3;
  const parts = day === "" ? [] : day.split("-");
  const shown = parts.slice(0, kept).join("-");
  // Keeps the finer parts, so that changing the precision back loses nothing.
  const keep = (typed: string) => setDay(typed === "" ? "" : [typed, ...parts.slice(kept)].join("-"));
  return (
    <Field {...props}>
      <div className="grid grid-cols-[auto_1fr] gap-2">
        <select
          name={precisionName}
          aria-label="How well the date is known"
          value={precision}
          onChange={(event) => {
            const way = WAYS.find((entry) => entry.value === event.target.value);
            if (way) setPrecision(way.value);
          }}
          className={cx(inputLook, "w-auto cursor-pointer")}
        >
          {WAYS.map((way) => (
            <option key={way.value} value={way.value}>
              {way.label}
            </option>
          ))}
        </select>
        <input type="hidden" name={name} value={sendable(shown)} />
        <input
          key={yearOnly ? "year" : precision}
          id={inputId}
          type={yearOnly ? "text" : precision === "month" ? "month" : "date"}
          inputMode={yearOnly ? "numeric" : undefined}
          placeholder={yearOnly ? "2005" : undefined}
          value={shown}
          onChange={(event) => keep(event.target.value)}
          aria-describedby={describedBy}
          aria-invalid={invalid}
          className={cx(inputLook, "type-figure")}
        />
      </div>
    </Field>
  );
}

/** A year or month becomes its first day; anything else goes as typed, for the server to judge. */
function sendable(day: string): string {
  if (/^\d{4}$/.test(day)) return `${day}-01-01`;
  if (/^\d{4}-\d{2}$/.test(day)) return `${day}-01`;
  return day;
}
