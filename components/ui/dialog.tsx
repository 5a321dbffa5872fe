"use client";

import { Dialog as Base } from "@base-ui/react/dialog";
import type { ReactElement, ReactNode } from "react";
import { buttonLook } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";

interface DialogProps {
  title: ReactNode;
  description?: ReactNode;
  /** The button that opens it; left out when `open` is controlled. */
  trigger?: ReactElement;
  open?: boolean;
  onOpenChange?: (open: boolean) => void;
  children?: ReactNode;
  /** Buttons at the foot. A button that closes stands first unless `closeLabel` is null. */
  actions?: ReactNode;
  closeLabel?: string | null;
}

/** A question over the page. On a phone it rises from the bottom edge, under the thumb. */
export function Dialog(props: DialogProps) {
  const { title, description, trigger, open, onOpenChange, children, actions, closeLabel = "Close" } = props;
  return (
    <Base.Root open={open} onOpenChange={onOpenChange}>
      {trigger ? <Base.Trigger render={trigger} /> : null}
      <Base.Portal>
        <Base.Backdrop className="fixed inset-0 z-40 bg-text/40" />
        <Base.Popup
          className={cx(
            "fixed inset-x-0 bottom-0 z-50 grid max-h-[92dvh] gap-4 overflow-y-auto border-2 border-frame bg-surface p-5",
            "pb-[max(1.25rem,env(safe-area-inset-bottom))]",
            "sm:inset-x-auto sm:top-1/2 sm:bottom-auto sm:left-1/2 sm:w-full sm:max-w-lg sm:-translate-x-1/2 sm:-translate-y-1/2",
          )}
        >
          <div className="grid gap-1">
            <Base.Title className="text-xl">{title}</Base.Title>
            {description ? <Base.Description className="text-muted">{description}</Base.Description> : null}
          </div>
          {children}
          <div className="flex flex-wrap justify-end gap-2">
            {closeLabel !== null ? (
              <Base.Close className={buttonLook({ tone: "secondary" })}>{closeLabel}</Base.Close>
            ) : null}
            {actions}
          </div>
        </Base.Popup>
      </Base.Portal>
    </Base.Root>
  );
}
