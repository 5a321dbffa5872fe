import { cx } from "@/components/ui/cx";

/** How far a number can be trusted, from a test down to nothing. */
export type NumberSource = "tested" | "maker" | "estimate" | "unknown";

const SOURCES: Record<NumberSource, { word: string; meaning: string }> = {
  tested: { word: "tested", meaning: "measured in a test of this type" },
  maker: { word: "maker", meaning: "stated by the maker" },
  estimate: { word: "estimate", meaning: "computed, never a rating" },
  unknown: { word: "not known", meaning: "nobody has given a number" },
};

/** Says in shape and word where a number comes from: solid, framed, dashed, empty. */
export function SourceMark({ source, className }: { source: NumberSource; className?: string }) {
  const { word, meaning } = SOURCES[source];
  return (
    <span
      title={meaning}
      className={cx("inline-flex items-center gap-1 type-label whitespace-nowrap text-muted", className)}
    >
      <svg viewBox="0 0 12 12" aria-hidden="true" className="size-3 shrink-0">
        {source === "tested" ? <rect x="1" y="1" width="10" height="10" fill="currentColor" /> : null}
        {source === "maker" ? (
          <>
            <rect
              x="1.75"
              y="1.75"
              width="8.5"
              height="8.5"
              fill="none"
              stroke="currentColor"
              strokeWidth="1.5"
            />
            <rect x="4.25" y="4.25" width="3.5" height="3.5" fill="currentColor" />
          </>
        ) : null}
        {source === "estimate" ? (
          <path
            d="M1 4.5c1.7-2 3.3-2 5 0s3.3 2 5 0M1 8.5c1.7-2 3.3-2 5 0s3.3 2 5 0"
            fill="none"
            stroke="currentColor"
            strokeWidth="1.5"
          />
        ) : null}
        {source === "unknown" ? (
          <rect
            x="1.75"
            y="1.75"
            width="8.5"
            height="8.5"
            fill="none"
            stroke="currentColor"
            strokeWidth="1.5"
            strokeDasharray="2 1.6"
          />
        ) : null}
      </svg>
      {word}
    </span>
  );
}
