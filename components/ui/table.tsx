import type { ComponentProps, ReactNode } from "react";
import { cx } from "@/components/ui/cx";

/**
 * A ruled table, as a parts list on a drawing. Scrolls inside itself when it is wider than the screen, and
 * can then be reached and moved with the keyboard.
 */
export function Table({
  caption,
  showCaption,
  children,
  className,
}: {
  /** Says what the table is; read out, and shown when asked for. */
  caption: string;
  showCaption?: boolean;
  children: ReactNode;
  className?: string;
}) {
  return (
    <div
      role="region"
      aria-label={caption}
      tabIndex={0}
      className={cx("relative overflow-x-auto", className)}
    >
      <table className="w-full border-collapse border-y-2 border-frame text-left">
        <caption className={showCaption ? "pb-2 text-left font-semibold" : "sr-only"}>{caption}</caption>
        {children}
      </table>
    </div>
  );
}

export function TableHead({ children }: { children: ReactNode }) {
  return <thead className="border-b border-frame">{children}</thead>;
}

export function TableBody({ children }: { children: ReactNode }) {
  return <tbody className="divide-y divide-line">{children}</tbody>;
}

export function Th({ className, scope = "col", ...rest }: ComponentProps<"th">) {
  return (
    <th
      scope={scope}
      className={cx(
        scope === "col"
          ? "px-2 py-2 align-bottom type-label text-muted"
          : "px-2 py-2.5 text-left align-top font-semibold",
        className,
      )}
      {...rest}
    />
  );
}

/** `numeric` sets figures flush right, one under the other. */
export function Td({ className, numeric, ...rest }: ComponentProps<"td"> & { numeric?: boolean }) {
  return (
    <td
      className={cx(
        "px-2 py-2.5 align-top",
        numeric && "text-right type-figure whitespace-nowrap",
        className,
      )}
      {...rest}
    />
  );
}
