"use client";

import { Tabs as Base } from "@base-ui/react/tabs";
import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

export interface Tab {
  value: string;
  label: ReactNode;
  panel: ReactNode;
}

/** Index tabs along the top edge of a sheet. */
export function Tabs({
  tabs,
  label,
  defaultValue,
  className,
}: {
  tabs: readonly Tab[];
  /** Names the row of tabs for those who cannot see it. */
  label: string;
  defaultValue?: string;
  className?: string;
}) {
  return (
    <Base.Root defaultValue={defaultValue ?? tabs[0]?.value} className={className}>
      <Base.List aria-label={label} className="flex gap-1 overflow-x-auto border-b-2 border-frame">
        {tabs.map((tab) => (
          <Base.Tab
            key={tab.value}
            value={tab.value}
            className={cx(
              "touch shrink-0 cursor-pointer border border-b-0 border-transparent px-3 py-2 font-label font-semibold text-muted",
              "[font-stretch:80%] hover:text-text focus-visible:-outline-offset-3",
              "data-active:border-frame data-active:bg-surface data-active:text-text",
            )}
          >
            {tab.label}
          </Base.Tab>
        ))}
      </Base.List>
      {tabs.map((tab) => (
        <Base.Panel key={tab.value} value={tab.value} className="pt-4">
          {tab.panel}
        </Base.Panel>
      ))}
    </Base.Root>
  );
}
