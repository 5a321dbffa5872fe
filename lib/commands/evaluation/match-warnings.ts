import "server-only";
import type { EvidenceRows } from "@/db/repositories/evidence";
import { span } from "@/lib/domain/finding/dates";
import type { WarningFacts } from "@/lib/domain/finding/evidence";

type WarningRow = EvidenceRows["warnings"][number];

/** What a warning may be matched against. */
export interface BoltOfWarning {
  areaId: string;
  boltTypeId: string | null;
  adhesiveId: string | null;
  metals: readonly string[];
  batch: string | null;
  adhesiveBatch: string | null;
  installedOn: string | null;
  installedOnPrecision: "day" | "month" | "year" | "before";
}

/**
 * The open warnings that concern a bolt. Where everything matches but the batch is not recorded, that is said.
 * A date not known does not clear a bolt of a warning that names a period.
 */
export function matchWarnings(bolt: BoltOfWarning, warnings: readonly WarningRow[]): WarningFacts[] {
  return warnings.flatMap((warning) => {
    const match = matchOf(bolt, warning);
    return match === null ? [] : [{ warningId: warning.id, title: warning.title, says: warning.says, match }];
  });
}

function matchOf(bolt: BoltOfWarning, warning: WarningRow): WarningFacts["match"] | null {
  const concerns =
    (warning.areaId === null || warning.areaId === bolt.areaId) &&
    (warning.boltTypeId === null || warning.boltTypeId === bolt.boltTypeId) &&
    (warning.adhesiveId === null || warning.adhesiveId === bolt.adhesiveId) &&
    (warning.metal === null || bolt.metals.includes(warning.metal)) &&
    withinPeriod(bolt, warning);
  if (!concerns) return null;
  if (warning.batchPattern === null) return "exact";
  const batch = warning.adhesiveId === null ? bolt.batch : bolt.adhesiveBatch;
  if (batch === null) return "batch_unknown";
  return fits(batch, warning.batchPattern) ? "exact" : null;
}

function withinPeriod(bolt: BoltOfWarning, { installedFrom, installedTo }: WarningRow): boolean {
  if (bolt.installedOn === null) return true;
  const { earliest, latest } = span(bolt.installedOn, bolt.installedOnPrecision);
  if (installedFrom !== null && latest < installedFrom) return false;
  return installedTo === null || earliest === null || earliest <= installedTo;
}

/** `*` stands for anything; upper and lower case are the same; spaces around do not count. */
function fits(batch: string, pattern: string): boolean {
  const parts = pattern.trim().toLowerCase().split("*");
  const escaped = parts.map((part) => part.replace(/[.+?^${}()|[\]\\]/g, "\\$&"));
  return new RegExp(`^${escaped.join(".*")}$`).test(batch.trim().toLowerCase());
}
