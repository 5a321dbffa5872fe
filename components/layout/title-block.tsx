import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

export interface TitleBlockProps {
  name: ReactNode;
  /** What kind of sheet: "Anchor sheet", "Bolt type". */
  kind: ReactNode;
  /** Short code on the tag. */
  code?: ReactNode;
  condition?: ReactNode;
  /** Further cells, in order: site, use, last check… */
  cells: readonly { name: string; value: ReactNode }[];
  /** A, B, C…: goes on with every recorded change. Left out where changes are not told on the sheet. */
  revision?: string;
  /** "1/1". */
  sheet?: string;
}

/** Name, state and origin in ruled cells; the fields follow the spirit of ISO 7200. */
export function TitleBlock(props: TitleBlockProps) {
  const { name, kind, code, condition, cells, revision, sheet = "1/1" } = props;
  return (
    <div className="grid lg:grid-cols-[minmax(18rem,1.2fr)_2fr]">
      <div className="grid content-center gap-1 border-b border-frame p-3 sm:px-6 lg:border-r lg:border-b-0 print:px-3">
        <p className="flex flex-wrap gap-x-3 type-label text-muted">
          <span>{kind}</span>
          {code ? <span className="type-code text-text">{code}</span> : null}
        </p>
        <h1 className="text-3xl [font-stretch:78%]">{name}</h1>
        {condition ? <div className="pt-0.5">{condition}</div> : null}
      </div>
      <dl className="-mr-px -mb-px grid grid-cols-2 overflow-hidden sm:grid-cols-3 print:grid-cols-3">
        {cells.map((cell) => (
          <Cell key={cell.name} name={cell.name}>
            {cell.value}
          </Cell>
        ))}
        {revision === undefined ? null : (
          <Cell name="Revision">
            <span className="type-figure text-lg leading-none">{revision}</span>
          </Cell>
        )}
        <Cell name="Sheet">
          <span className="type-figure">{sheet}</span>
        </Cell>
      </dl>
    </div>
  );
}

function Cell({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className={cx("min-w-0 border-r border-b border-line-strong px-3 py-2")}>
      <dt className="type-label text-xs text-muted">{name}</dt>
      <dd className="leading-snug break-words">{children}</dd>
    </div>
  );
}
