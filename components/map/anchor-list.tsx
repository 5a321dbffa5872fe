"use client";

import Link from "next/link";
import { memo } from "react";
import { MarkShape } from "@/components/finding/condition-mark";
import { cx } from "@/components/ui/cx";
import { EmptyState } from "@/components/ui/state-panel";
import { CONDITION_LABELS, sentence, usesLabel, VERDICT_LABELS } from "@/lib/domain/labels";
import { type MapAnchor, mapMark, type MapSpan, MARK_RANK } from "@/lib/map/map-anchor";
import type { AnchorSummary } from "@/lib/schemas/views/anchor";
import { formatCount, formatDistanceM } from "@/lib/shared/format";

interface AnchorListProps {
  anchors: readonly AnchorSummary[];
  spans: readonly MapSpan[];
  chosen: string | null;
  /** The address that chooses an anchor and leaves the sentence as it is. */
  hrefFor: (code: string) => string;
  onChoose: (code: string) => void;
}

/** Says everything the map shows: the same anchors and spans, by site, the worst of each site first. */
export const AnchorList = memo(function AnchorList(props: AnchorListProps) {
  const { anchors, spans, ...row } = props;
  if (anchors.length === 0) {
    return (
      <EmptyState title="No anchor fits the sentence">
        Change a word of it, or show every anchor. What is not recorded fits no limit.
      </EmptyState>
    );
  }
  return (
    <div className="grid gap-6">
      {bySite(anchors).map(([site, members]) => (
        <section key={site} aria-label={members[0]?.siteName}>
          <h3 className="flex items-baseline justify-between gap-3 border-b border-frame pb-1">
            <span>{members[0]?.siteName}</span>
            <span className="type-label text-muted">{formatCount(members.length, "anchor")}</span>
          </h3>
          {members[0]?.exact === false ? (
            <p className="border-b border-line py-2 text-sm text-muted">
              Its exact place is known to members only; the map shows a point rounded to about 1&#8239;km.
            </p>
          ) : null}
          <ul className="divide-y divide-line">
            {members.map((anchor) => (
              <Row key={anchor.code} anchor={anchor} {...row} />
            ))}
          </ul>
        </section>
      ))}
      {spans.length > 0 ? <SpanList spans={spans} {...row} /> : null}
    </div>
  );
});

type RowProps = Omit<AnchorListProps, "anchors" | "spans">;

function Row({ anchor, chosen, hrefFor, onChoose }: RowProps & { anchor: AnchorSummary }) {
  const isChosen = anchor.code === chosen;
  const [worst] = anchor.reasons;
  return (
    <li data-anchor={anchor.code} className="[contain-intrinsic-size:auto_4.5rem] [content-visibility:auto]">
      <Link
        href={hrefFor(anchor.code)}
        scroll={false}
        prefetch={false}
        aria-current={isChosen ? "true" : undefined}
        onClick={(event) => {
          if (event.metaKey || event.ctrlKey || event.shiftKey) return;
          event.preventDefault();
          onChoose(anchor.code);
        }}
        className={cx(
          "grid touch grid-cols-[auto_1fr_auto] gap-x-3 px-1 py-2 hover:bg-sunk",
          isChosen && "bg-sunk shadow-[inset_4px_0_0_var(--frame)]",
        )}
      >
        <MarkShape mark={mapMark(anchor)} className="mt-0.5" />
        <span className="min-w-0">
          <span className="font-semibold">{anchor.label}</span>{" "}
          <span className="block text-sm text-muted">
            {stateWords(anchor)}. {sentence(usesLabel(anchor.uses))}.{worst ? ` ${worst.title}.` : ""}
          </span>
        </span>
        <span className="grid justify-items-end">
          <span className="type-code text-sm">{anchor.code}</span>
          {anchor.seaDistanceM === null ? null : (
            <span className="type-figure text-sm text-muted">
              {formatDistanceM(anchor.seaDistanceM)}
              <span className="sr-only"> from the sea</span>
            </span>
          )}
        </span>
      </Link>
    </li>
  );
}

/** Condition and verdict are two things; both are said. */
function stateWords({ condition, verdict }: AnchorSummary): string {
  const words = sentence(CONDITION_LABELS[condition]);
  return verdict === null ? words : `${words}; verdict: ${VERDICT_LABELS[verdict].toLowerCase()}`;
}

function SpanList({ spans, hrefFor, onChoose }: RowProps & { spans: readonly MapSpan[] }) {
  const end = (code: string) => (
    <Link
      href={hrefFor(code)}
      scroll={false}
      prefetch={false}
      className="inline-flex touch items-center type-code text-link"
      onClick={(event) => {
        event.preventDefault();
        onChoose(code);
      }}
    >
      {code}
    </Link>
  );
  return (
    <section aria-label="Spans">
      <h3 className="flex items-baseline justify-between gap-3 border-b border-frame pb-1">
        <span>Spans</span>
        <span className="type-label text-muted">{formatCount(spans.length, "span")}</span>
      </h3>
      <ul className="divide-y divide-line">
        {spans.map((span) => (
          <li
            key={`${span.aCode} ${span.bCode} ${span.name}`}
            data-span={span.name}
            className="flex flex-wrap items-center justify-between gap-x-3 px-1"
          >
            <span>
              <span className="font-semibold">{span.name}</span>{" "}
              <span className="type-figure">{formatDistanceM(span.lengthM)}</span>
            </span>
            <span className="flex items-center gap-2">
              {end(span.aCode)} <span className="text-muted">to</span> {end(span.bCode)}
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}

/** Sites by name; inside a site the worst first, then by code. */
function bySite<A extends MapAnchor>(anchors: readonly A[]): [string, A[]][] {
  const sites = new Map<string, A[]>();
  for (const anchor of anchors) {
    const members = sites.get(anchor.siteSlug);
    if (members) members.push(anchor);
    else sites.set(anchor.siteSlug, [anchor]);
  }
  const rank = (anchor: A) => MARK_RANK[mapMark(anchor)];
  for (const members of sites.values()) {
    members.sort((a, b) => rank(b) - rank(a) || a.code.localeCompare(b.code, "en", { numeric: true }));
  }
  return [...sites].sort(([, [a]], [, [b]]) => (a?.siteName ?? "").localeCompare(b?.siteName ?? "", "en"));
}
