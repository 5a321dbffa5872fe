import type { AnchorQuestion } from "@/lib/domain/finding/evidence";
import type { Finding } from "@/lib/domain/finding/types";

/**
 * record.missing for an anchor on which nothing is recorded at all: no bolt, and no tree, boulder or
 * thread.
 */
export function recordEmpty(e: AnchorQuestion): Finding | null {
  const natural = e.group.placements.some((placement) => placement.kind !== "bolt");
  if (e.bolts.length > 0 || natural) return null;
  return {
    code: "record.missing",
    level: "ask",
    title: "Nothing recorded on this anchor",
    text: "No bolt and no natural placement is on record, so nothing could be judged.",
    clearsWhen: "the bolts of the anchor are recorded",
    numbers: { bolts: 0, placements: e.group.placements.length },
    assumed: [],
    source: { mark: "common_practice", name: "What is not known is never a pass" },
  };
}
