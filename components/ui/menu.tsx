"use client";

import { Menu as Base } from "@base-ui/react/menu";
import Link from "next/link";
import type { ReactElement, ReactNode } from "react";

export interface MenuEntry {
  label: ReactNode;
  href: string;
  /** A second, quieter line. */
  detail?: ReactNode;
}

const ITEM =
  "touch flex cursor-pointer flex-col justify-center px-4 py-2 no-underline outline-none data-highlighted:bg-sunk data-highlighted:text-action";

/** A button that opens a short list of places to go. */
export function Menu({
  trigger,
  entries,
  footer,
}: {
  trigger: ReactElement;
  entries: readonly MenuEntry[];
  /** Stands under the list: a form with a button, a note. */
  footer?: ReactNode;
}) {
  return (
    <Base.Root modal={false}>
      <Base.Trigger render={trigger} />
      <Base.Portal>
        <Base.Positioner sideOffset={6} align="end" className="z-40">
          <Base.Popup className="min-w-52 border-2 border-frame bg-surface py-1 text-text">
            {entries.map((entry) => (
              <Base.Item key={entry.href} render={<Link href={entry.href} />} className={ITEM}>
                <span>{entry.label}</span>
                {entry.detail ? <span className="text-sm text-muted">{entry.detail}</span> : null}
              </Base.Item>
            ))}
            {footer}
          </Base.Popup>
        </Base.Positioner>
      </Base.Portal>
    </Base.Root>
  );
}
