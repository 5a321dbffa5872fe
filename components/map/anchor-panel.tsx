"use client";

import { type ReactNode, useEffect, useRef } from "react";
import { ConditionMark } from "@/components/finding/condition-mark";
import { VerdictMark } from "@/components/finding/verdict-mark";
import { Badge, type Tone } from "@/components/ui/badge";
import { PastDate } from "@/components/ui/date-text";
import { LinkButton } from "@/components/ui/link-button";
import { CAUTION } from "@/lib/domain/finding/engine";
import { LEVEL_LABELS, sentence, usesLabel } from "@/lib/domain/labels";
import type { Level } from "@/lib/domain/vocabulary";
import type { AnchorSummary } from "@/lib/schemas/views/anchor";
import { formatDistanceM } from "@/lib/shared/format";

interface AnchorPanelProps {
  code: string;
  /** Null: there is none, or it is not shown to this reader. */
  anchor: AnchorSummary | null;
  mayInstall: boolean;
  /** True when a hand has just chosen it: the reader is taken here. */
  takeFocus: boolean;
  onClose: () => void;
}

const LEVEL_TONES: Readonly<Record<Level, Tone>> = {
  stop: "stop",
  ask: "info",
  limit: "warn",
  note: "plain",
};

/** The chosen anchor: on a desk the title block in the corner of the map, on a phone a sheet from below. */
export function AnchorPanel({ code, anchor, mayInstall, takeFocus, onClose }: AnchorPanelProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    if (takeFocus) heading.current?.focus({ preventScroll: true });
  }, [code, takeFocus]);
  return (
    <section
      aria-labelledby="chosen-anchor"
      onKeyDown={(event) => {
        if (event.key === "Escape") onClose();
      }}
      className="border-2 border-frame bg-surface"
    >
      <div className="flex items-start gap-2 border-b border-frame p-3 pr-1">
        <div className="min-w-0 flex-1">
          <p className="type-label text-muted">
            Anchor <span className="type-code text-text">{code}</span>
          </p>
          <h2 id="chosen-anchor" ref={heading} tabIndex={-1} className="text-2xl [font-stretch:78%]">
            {anchor?.label ?? "Not shown"}
          </h2>
        </div>
        <button
          type="button"
          onClick={onClose}
          className="grid touch cursor-pointer place-items-center text-muted hover:text-text"
        >
          <span className="sr-only">Close the panel</span>
          <svg viewBox="0 0 24 24" aria-hidden="true" className="size-6" fill="none" stroke="currentColor">
            <path d="M5 5l14 14M19 5 5 19" strokeWidth="2" />
          </svg>
        </button>
      </div>
      {anchor ? (
        <PanelBody anchor={anchor} mayInstall={mayInstall} />
      ) : (
        <p className="p-3 text-muted">There is no anchor with this code, or it is not shown to you.</p>
      )}
    </section>
  );
}

function PanelBody({ anchor, mayInstall }: { anchor: AnchorSummary; mayInstall: boolean }) {
  return (
    <>
      <dl className="-mr-px grid grid-cols-2 overflow-hidden">
        <Cell name="Condition">
          <ConditionMark condition={anchor.condition} verdict={anchor.verdict} />
        </Cell>
        <Cell name="Verdict">
          {anchor.verdict ? <VerdictMark verdict={anchor.verdict} /> : <Unknown>not judged yet</Unknown>}
        </Cell>
      </dl>
      <dl className="-mr-px grid grid-cols-3 overflow-hidden border-b border-frame">
        <Cell name="Use">{sentence(usesLabel(anchor.uses))}</Cell>
        <Cell name="Site">{anchor.siteName}</Cell>
        <Cell name="Last check">
          <PastDate on={anchor.lastCheckOn} />
        </Cell>
        <Cell name="From the sea">
          {anchor.seaDistanceM === null ? (
            <Unknown>{anchor.exact ? "not known" : "not shown"}</Unknown>
          ) : (
            <span className="type-figure">{formatDistanceM(anchor.seaDistanceM)}</span>
          )}
        </Cell>
        <Cell name="Bolts in force">
          <span className="type-figure">{anchor.boltCount}</span>
        </Cell>
        <Cell name="Open reports">
          <span className="type-figure">{anchor.openReports}</span>
        </Cell>
      </dl>
      {anchor.reasons.length > 0 ? (
        <ol aria-label="Worst reasons" className="grid gap-2 border-b border-frame p-3">
          {anchor.reasons.map((reason) => (
            <li key={`${reason.code} ${reason.title}`} className="flex items-baseline gap-2">
              <Badge tone={LEVEL_TONES[reason.level]}>{LEVEL_LABELS[reason.level]}</Badge>
              <span>{reason.title}</span>
            </li>
          ))}
        </ol>
      ) : null}
      <div className="grid gap-2 p-3">
        <div className="flex flex-wrap gap-2">
          <LinkButton tone="primary" href={`/anchors/${anchor.code}`}>
            Open the sheet
          </LinkButton>
          <LinkButton href={`/report?anchor=${anchor.code}`}>Report</LinkButton>
          {mayInstall ? (
            <LinkButton href={`/anchors/${anchor.code}/install`}>Log an install</LinkButton>
          ) : null}
        </div>
        <p className="text-sm text-muted">{CAUTION}</p>
      </div>
    </>
  );
}

function Cell({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="min-w-0 border-r border-b border-line px-3 py-1.5">
      <dt className="type-label text-xs text-muted">{name}</dt>
      <dd className="leading-snug">{children}</dd>
    </div>
  );
}

function Unknown({ children }: { children: ReactNode }) {
  return <span className="text-muted">{children}</span>;
}
