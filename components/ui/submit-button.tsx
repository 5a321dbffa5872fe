"use client";

import type { VariantProps } from "class-variance-authority";
import type { ComponentProps } from "react";
import { useFormStatus } from "react-dom";
import { buttonLook } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";
import { Spinner } from "@/components/ui/spinner";

type SubmitButtonProps = Omit<ComponentProps<"button">, "type"> &
  VariantProps<typeof buttonLook> & {
    /** What it says while the answer is on its way: "Saving…". */
    pendingLabel?: string;
    /** For forms that are not sent through `action`. */
    pending?: boolean;
  };

/** Sends its form; answers the press at once and cannot be pressed twice meanwhile. */
export function SubmitButton({
  tone = "primary",
  width,
  className,
  children,
  pendingLabel = "Sending…",
  pending,
  onClick,
  ...rest
}: SubmitButtonProps) {
  const status = useFormStatus();
  const busy = pending ?? status.pending;
  return (
    <button
      type="submit"
      aria-disabled={busy || undefined}
      className={cx(buttonLook({ tone, width }), "sm:justify-self-start", className)}
      onClick={(event) => {
        if (busy) event.preventDefault();
        else onClick?.(event);
      }}
      {...rest}
    >
      {busy ? <Spinner /> : null}
      <span aria-live="polite">{busy ? pendingLabel : children}</span>
    </button>
  );
}
