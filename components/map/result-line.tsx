import { MarkShape } from "@/components/finding/condition-mark";
import { countMarks, type MapAnchor, MAP_MARK_WORDS, MARKS_BY_RANK } from "@/lib/map/map-anchor";
import { formatCount } from "@/lib/shared/format";

/** How many the sentence leaves, and in what state they are. */
export function ResultLine({
  anchors,
  total,
  spanCount,
}: {
  anchors: readonly MapAnchor[];
  total: number;
  spanCount: number;
}) {
  const counts = countMarks(anchors);
  return (
    <div className="border-y-2 border-frame py-2">
      <p role="status" className="font-label text-lg font-semibold [font-stretch:82%]">
        {anchors.length === total
          ? formatCount(total, "anchor")
          : `${anchors.length} of ${formatCount(total, "anchor")}`}
        , {formatCount(spanCount, "span")}
      </p>
      <ul aria-label="By condition" className="flex flex-wrap gap-x-4 gap-y-1">
        {MARKS_BY_RANK.filter((mark) => counts[mark] > 0).map((mark) => (
          <li key={mark} className="flex items-center gap-1.5">
            <MarkShape mark={mark} className="size-4" />
            <span>
              <span className="type-figure">{counts[mark]}</span> {MAP_MARK_WORDS[mark]}
            </span>
          </li>
        ))}
      </ul>
    </div>
  );
}
