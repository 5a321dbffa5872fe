"use client";

import Link from "next/link";
import { type ReactNode, useId } from "react";
import { type Choice, filterInWords, isFiltered, type MapChoices, type MapFilter } from "@/lib/map/filter";
import { formatCount } from "@/lib/shared/format";

interface FilterSentenceProps {
  filter: MapFilter;
  choices: MapChoices;
  onChange: (change: Partial<MapFilter>) => void;
}

/** What is shown, as a sentence whose words can be changed. Without a script it is an ordinary form. */
export function FilterSentence({ filter, choices, onChange }: FilterSentenceProps) {
  const blank = <K extends keyof MapChoices>(key: K, label: string, any: string) => (
    <Blank
      name={key}
      label={label}
      any={any}
      value={filter[key]}
      choices={choices[key]}
      onChange={(value) => onChange({ [key]: value })}
    />
  );
  const siteName = choices.site.find((site) => site.value === filter.site)?.label ?? filter.site;
  return (
    <details className="group lg:details-content:[content-visibility:visible]">
      <summary className="flex touch cursor-pointer list-none items-center justify-between gap-3 py-2 lg:hidden [&::-webkit-details-marker]:hidden">
        <span>
          Shown: <span className="font-semibold">{filterInWords(filter, siteName)}</span>
        </span>
        <span className="text-link group-open:hidden">Change</span>
        <span className="hidden text-link group-open:inline">Fold</span>
      </summary>
      <form action="/" method="get" aria-label="What is shown" onSubmit={(event) => event.preventDefault()}>
        <p className="text-[1.0625rem] leading-[2.75rem]">
          Anchors that are {blank("state", "Condition", "in any condition")}, with bolts{" "}
          {blank("fixing", "Fixing", "fixed in any way")} of {blank("metal", "Metal", "any metal")}, for{" "}
          {blank("use", "Use", "any use")},{" "}
          {blank("sea", "Distance from the sea", "at any distance from the sea")}, in{" "}
          {blank("site", "Site", "every site")}, named{" "}
          <input
            name="q"
            type="search"
            aria-label="Words in code, name or site"
            placeholder="anything"
            value={filter.q}
            maxLength={100}
            onChange={(event) => onChange({ q: event.target.value })}
            className={`${blankLook} w-32 placeholder:text-action`}
          />
          .
        </p>
        <div className="flex flex-wrap gap-x-4">
          <noscript>
            <button type="submit" className="touch px-3 text-link">
              Show these
            </button>
          </noscript>
          {isFiltered(filter) ? (
            <Link
              href="/"
              className="inline-flex touch items-center text-link"
              onClick={(event) => {
                event.preventDefault();
                onChange({ state: null, fixing: null, metal: null, use: null, sea: null, site: null, q: "" });
              }}
            >
              Show every anchor
            </Link>
          ) : null}
        </div>
      </form>
    </details>
  );
}

const blankLook =
  "h-9 max-w-full rounded-none border-0 border-b-2 border-dotted border-action bg-transparent px-0.5 align-baseline " +
  "font-semibold text-action hover:bg-sunk hover:text-action-strong";

/** A gap in the sentence, filled from the platform's own picker. */
function Blank<T extends string>({
  name,
  label,
  any,
  value,
  choices,
  onChange,
}: {
  name: string;
  label: string;
  any: ReactNode;
  value: T | null;
  choices: readonly Choice<T>[];
  onChange: (value: T | null) => void;
}) {
  const id = useId();
  return (
    <select
      id={id}
      name={name}
      aria-label={label}
      value={value ?? ""}
      onChange={(event) =>
        onChange(choices.find((choice) => choice.value === event.target.value)?.value ?? null)
      }
      className={`${blankLook} [field-sizing:content] cursor-pointer appearance-none`}
    >
      <option value="">{any}</option>
      {choices.map((choice) => (
        <option key={choice.value} value={choice.value}>
          {choice.label}
          {choice.value === value ? "" : ` (${formatCount(choice.count, "anchor")})`}
        </option>
      ))}
    </select>
  );
}
