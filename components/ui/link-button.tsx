import type { VariantProps } from "class-variance-authority";
import Link from "next/link";
import type { ComponentProps } from "react";
import { buttonLook } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";

type LinkButtonProps = ComponentProps<typeof Link> & VariantProps<typeof buttonLook>;

/** A link that weighs as much as a button. */
export function LinkButton({ tone, width, className, ...rest }: LinkButtonProps) {
  return <Link className={cx(buttonLook({ tone, width }), className)} {...rest} />;
}
