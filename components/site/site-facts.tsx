import { Fact, Facts } from "@/components/ui/facts";
import { SO2_LABELS, WASHING_LABELS } from "@/lib/domain/labels";
import type { SiteView } from "@/lib/schemas/views/register";
import { formatDistanceM, formatQuantity } from "@/lib/shared/format";

/** Rock, weather on the metal, and the words people need to get there. */
export function SiteFacts({ site }: { site: SiteView }) {
  const unknown = <span className="text-muted">not recorded</span>;
  return (
    <Facts>
      <Fact name="Rock">
        {site.rockType ?? unknown}
        {site.ucsMpa === null
          ? ""
          : `, ${formatQuantity(site.ucsMpa, "MPa")} (${site.ucsBasis ?? "basis not recorded"})`}
      </Fact>
      <Fact name="Washing">{site.washing ? WASHING_LABELS[site.washing] : unknown}</Fact>
      <Fact name="Sulphur dioxide">{site.so2 ? SO2_LABELS[site.so2] : "not recorded; taken as low"}</Fact>
      {site.saltedRoadDistanceM === null ? null : (
        <Fact name="Salted road">{formatDistanceM(site.saltedRoadDistanceM)} away</Fact>
      )}
      <Fact name="Approach">{site.approach ?? unknown}</Fact>
      <Fact name="Land permission">{site.landPermission ?? unknown}</Fact>
      <Fact name="No bolts">{site.noBoltZones ?? "no zone recorded"}</Fact>
    </Facts>
  );
}
