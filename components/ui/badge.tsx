import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

export type Tone = "plain" | "calm" | "warn" | "stop" | "info";

const TONES: Record<Tone, string> = {
  plain: "border-line-strong text-text",
  calm: "border-calm-fill bg-calm-ground text-calm",
  warn: "border-warn-fill bg-warn-ground text-warn",
  stop: "border-stop-fill bg-stop-ground text-stop",
  info: "border-info-fill bg-info-ground text-info",
};

/** A word or two in a box. The tone only underlines what the words say. */
export function Badge({
  tone = "plain",
  children,
  className,
}: {
  tone?: Tone;
  children: ReactNode;
  className?: string;
}) {
  return (
    <span
      className={cx(
        "inline-flex items-center gap-1.5 rounded-sm border px-1.5 py-0.5 align-middle type-label",
        TONES[tone],
        className,
      )}
    >
      {children}
    </span>
  );
}
