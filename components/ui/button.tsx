import { cva, type VariantProps } from "class-variance-authority";
import type { ComponentProps } from "react";
import { cx } from "@/components/ui/cx";

export const buttonLook = cva(
  [
    "touch inline-flex cursor-pointer items-center justify-center gap-2 rounded-md border px-4 py-2",
    "font-label text-base leading-tight font-semibold [font-stretch:84%] transition-colors",
    "disabled:cursor-not-allowed disabled:opacity-55 aria-disabled:cursor-not-allowed aria-disabled:opacity-55",
  ],
  {
    variants: {
      tone: {
        primary: "border-action bg-action text-on-action hover:border-action-strong hover:bg-action-strong",
        secondary: "border-line-strong bg-surface text-text hover:border-text hover:bg-sunk",
        quiet: "border-transparent bg-transparent text-action hover:bg-sunk hover:text-action-strong",
        danger: "border-stop-fill bg-surface text-stop hover:bg-stop-ground",
      },
      width: { auto: "", full: "w-full" },
    },
    defaultVariants: { tone: "secondary", width: "auto" },
  },
);

type ButtonProps = ComponentProps<"button"> & VariantProps<typeof buttonLook>;

/** A button that does something here. For going elsewhere use LinkButton, for sending a form SubmitButton. */
export function Button({ tone, width, className, type = "button", ...rest }: ButtonProps) {
  return <button type={type} className={cx(buttonLook({ tone, width }), className)} {...rest} />;
}
