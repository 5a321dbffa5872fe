import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence, WarningFacts } from "@/lib/domain/finding/evidence";
import { severity } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";

/**
 * record.warning: an open batch warning that matches the bolt. The worst one speaks; the others are
 * counted.
 */
export function recordWarning(e: BoltEvidence): Finding | null {
  const found = (e.care?.warnings ?? [])
    .map((warning) => ({ warning, level: levelOf(warning) }))
    .sort((a, b) => severity(b.level) - severity(a.level));
  const [worst] = found;
  if (worst === undefined) return null;
  const { warning, level } = worst;
  const matches = {
    exact: "It matches this bolt.",
    batch_unknown: "Everything matches but the batch, which is not recorded.",
    related: "This bolt shares batch, metal or surroundings with one that failed.",
  }[warning.match];
  return {
    code: "record.warning",
    level,
    title: warning.match === "exact" ? "Batch warning" : "May be under a batch warning",
    text: `${warning.title}. ${matches}${found.length > 1 ? ` ${found.length - 1} more open.` : ""}`,
    clearsWhen: {
      stop: "the bolt is replaced",
      ask: "the batch is recorded",
      limit: "the bolt is inspected as the warning asks",
      note: null,
    }[level],
    numbers: { warningId: warning.warningId, says: warning.says, match: warning.match, open: found.length },
    assumed: [],
    source: { mark: "published", name: `Batch warning: ${warning.title}` },
  };
}

function levelOf({ match, says }: WarningFacts): Level {
  if (match === "related") return "note";
  if (match === "batch_unknown") return "ask";
  return says === "stop" ? "stop" : "limit";
}
