import type { ReactNode } from "react";
import { TitleBlock, type TitleBlockProps } from "@/components/layout/title-block";
import { cx } from "@/components/ui/cx";

interface SheetFrameProps {
  title: TitleBlockProps;
  /** Buttons above the frame; not printed. */
  actions?: ReactNode;
  children: ReactNode;
}

/**
 * A page about one thing, drawn as a sheet: thin outer line, frame, zone marks along the edges, title block.
 * The title block comes first, on paper too: it answers first, and a sheet may run over several pages.
 */
export function SheetFrame({ title, actions, children }: SheetFrameProps) {
  return (
    <article className="mx-auto max-w-[96rem] px-1 pt-2 sm:px-6 sm:pt-6 print:max-w-none print:p-0">
      {actions ? (
        <div className="no-print mb-3 flex flex-wrap justify-end gap-2 px-1.5 sm:px-0">{actions}</div>
      ) : null}
      <div className="grid grid-cols-1 border border-line-strong bg-surface md:grid-cols-[1.25rem_1fr_1.25rem] print:grid-cols-1">
        <Zones names={COLUMNS} className="md:col-start-2" />
        <Zones names={ROWS} vertical className="md:col-start-1 md:row-start-2" />
        <div className="mx-1 flex min-w-0 flex-col border-2 border-frame md:col-start-2 md:row-start-2 md:mx-0 print:mx-0">
          <div className="border-b-2 border-frame">
            <TitleBlock {...title} />
          </div>
          <div className="px-2.5 py-3 sm:p-6 print:p-3">{children}</div>
        </div>
        <Zones names={ROWS} vertical className="md:col-start-3 md:row-start-2" />
        <Zones names={COLUMNS} className="md:col-start-2 md:row-start-3" />
      </div>
    </article>
  );
}

const COLUMNS = ["1", "2", "3", "4", "5", "6", "7", "8"];
const ROWS = ["A", "B", "C", "D", "E", "F"];

/** The grid references in the margin, as on every technical drawing (ISO 5457). */
function Zones({
  names,
  vertical,
  className,
}: {
  names: readonly string[];
  vertical?: boolean;
  className?: string;
}) {
  return (
    <div
      aria-hidden="true"
      className={cx(
        "type-label text-[0.625rem] text-muted select-none print:hidden",
        vertical
          ? "hidden grid-flow-row auto-rows-fr divide-y md:grid"
          : "grid h-4 auto-cols-fr grid-flow-col divide-x md:h-5",
        "divide-line-strong",
        className,
      )}
    >
      {names.map((name, index) => (
        <span key={name} className={cx("grid place-items-center", !vertical && index > 3 && "max-sm:hidden")}>
          {name}
        </span>
      ))}
    </div>
  );
}
