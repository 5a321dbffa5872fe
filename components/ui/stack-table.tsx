import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

interface StackTableProps {
  /** Says what the table is; read out, not shown. */
  caption: string;
  /** Names of the columns, in order; `numeric` ones are set flush right. */
  head: readonly { name: string; numeric?: boolean; className?: string }[];
  children: ReactNode;
  className?: string;
}

/**
 * A ruled table on a desk and on paper; on a phone each row becomes a block of named values, so that nothing has to be
 * scrolled sideways. The roles keep it a table for those who have it read out.
 */
export function StackTable({ caption, head, children, className }: StackTableProps) {
  return (
    <table
      role="table"
      aria-label={caption}
      className={cx(
        "block w-full border-collapse border-y-2 border-frame text-left lg:table print:table print:text-[8pt]",
        className,
      )}
    >
      <thead
        role="rowgroup"
        className="sr-only border-b border-frame lg:not-sr-only lg:table-header-group print:not-sr-only print:table-header-group"
      >
        <tr role="row">
          {head.map(({ name, numeric, className: own }) => (
            <th
              key={name}
              role="columnheader"
              scope="col"
              className={cx("px-2 py-2 align-bottom type-label text-muted", numeric && "text-right", own)}
            >
              {name}
            </th>
          ))}
        </tr>
      </thead>
      <tbody
        role="rowgroup"
        className="block divide-y divide-line-strong lg:table-row-group lg:divide-line print:table-row-group"
      >
        {children}
      </tbody>
    </table>
  );
}

export function StackRow({
  id,
  className,
  children,
}: {
  id?: string;
  className?: string;
  children: ReactNode;
}) {
  return (
    <tr
      id={id}
      role="row"
      className={cx(
        "grid scroll-mt-4 grid-cols-2 gap-x-4 gap-y-2 py-3 target:bg-calm-ground lg:table-row print:table-row",
        className,
      )}
    >
      {children}
    </tr>
  );
}

interface StackCellProps {
  /** The column's name, shown beside the value on a phone; left out where the value speaks for itself. */
  label?: string;
  /** Names the row. */
  head?: boolean;
  numeric?: boolean;
  /** Takes the whole width of a phone. */
  wide?: boolean;
  colSpan?: number;
  className?: string;
  children: ReactNode;
}

export function StackCell({ label, head, numeric, wide, colSpan, className, children }: StackCellProps) {
  const Cell = head ? "th" : "td";
  return (
    <Cell
      role={head ? "rowheader" : "cell"}
      scope={head ? "row" : undefined}
      colSpan={colSpan}
      className={cx(
        "block min-w-0 align-top font-normal lg:table-cell lg:px-2 lg:py-2.5 print:table-cell print:px-1.5 print:py-1",
        (wide || head) && "col-span-2",
        numeric && "lg:text-right print:text-right",
        className,
      )}
    >
      {label ? (
        <span aria-hidden="true" className="block type-label text-xs text-muted lg:hidden print:hidden">
          {label}
        </span>
      ) : null}
      {children}
    </Cell>
  );
}
