import { span } from "@/lib/domain/finding/dates";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import type { Finding } from "@/lib/domain/finding/types";

/**
 * record.glue-expired: the glue was past its date when it was used. The last day itself is in date. An
 * install date of limited precision counts at its latest day, the careful side, and that is said.
 */
export function recordGlueExpired(e: BoltEvidence): Finding | null {
  const { adhesiveExpiresOn, installedOn, installedOnPrecision } = e.bolt;
  if (adhesiveExpiresOn === null || installedOn === null) return null;
  const used = span(installedOn, installedOnPrecision);
  if (used.latest <= adhesiveExpiresOn) return null;
  const certain = used.earliest !== null && used.earliest > adhesiveExpiresOn;
  return {
    code: "record.glue-expired",
    level: "limit",
    title: certain ? "Glue was past its date" : "Glue may have been past its date",
    text: `The glue was good until ${adhesiveExpiresOn}; it was used ${certain ? "on or after" : "as late as"} ${certain ? (used.earliest ?? installedOn) : used.latest}.`,
    clearsWhen: certain
      ? "a bolt set with glue in date is placed"
      : "the day of the install is recorded and lies before that",
    numbers: { adhesiveExpiresOn, installedOn, installedOnPrecision },
    assumed: certain ? [] : ["the latest day the recorded date may stand for"],
    source: { mark: "common_practice", name: "Glue is used within its maker's date" },
  };
}
