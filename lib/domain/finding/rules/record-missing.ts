import { familyOf } from "@/lib/domain/catalogue/metals";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { metalParts } from "@/lib/domain/finding/parts";
import { isGlued, isSerious } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { areRecorded, list } from "@/lib/domain/finding/words";

/**
 * record.missing: method and date of a bolt in the rock.
 *
 * What another rule asks for is not repeated: the date of plated steel belongs to `metal.plated`, depth,
 * rock and metal to their own rules. The method of a bolt that holds by expansion or thread is plain from
 * its form; only for a glued bolt is it open which glue was used. A date known as "before" counts as a
 * date.
 */
export function recordMissing(e: BoltEvidence): Finding | null {
  if (e.context === "choosing") return null;
  const plated = metalParts(e.bolt).some(({ metal }) => familyOf(metal) === "plated");
  const missing = [
    e.bolt.method === null && isGlued(e.bolt) ? "the glue it was set with" : null,
    e.bolt.installedOn === null && !plated ? "when it was installed" : null,
  ].filter((words) => words !== null);
  if (missing.length === 0) return null;
  return {
    code: "record.missing",
    level: isSerious(e.use) || e.use === "belay" ? "ask" : "note",
    title: "Gaps in the record",
    text: `Not on record: ${list(missing)}.`,
    clearsWhen: `${areRecorded(missing)}; "before a year" counts`,
    numbers: { method: e.bolt.method, installedOn: e.bolt.installedOn },
    assumed: [],
    source: { mark: "common_practice", name: "What is not known is never a pass" },
  };
}
