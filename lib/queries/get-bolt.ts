import "server-only";
import { getDb } from "@/db/client";
import { anchorIdOfBolt } from "@/db/repositories/anchor-read";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";
import type { BoltDetail } from "@/lib/schemas/views/bolt-detail";
import type { Actor } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

/** One bolt with its chain and its reasons, as the anchor's sheet shows them. @throws AppError `not_found`. */
export async function getBolt(actor: Actor, id: string): Promise<BoltDetail> {
  const anchorId = await anchorIdOfBolt(getDb(), id);
  if (anchorId === null) throw absent();
  const sheet = await getAnchorSheet(actor, { id: anchorId });
  for (const placement of sheet.placements) {
    const chain = [...(placement.bolt ? [placement.bolt] : []), ...placement.former];
    const bolt = chain.find((one) => one.id === id);
    if (bolt) {
      return {
        bolt,
        anchor: {
          id: sheet.id,
          code: sheet.code,
          label: sheet.label,
          siteName: sheet.site.name,
          siteSlug: sheet.site.slug,
          timeZone: sheet.area.timeZone,
          uses: sheet.uses,
        },
        placementNumber: placement.number,
        hole: { diameterMm: placement.holeDiameterMm, depthMm: placement.holeDepthMm },
        chain,
        findings: sheet.findings.filter((finding) => finding.boltId === id),
        reports: sheet.reports.filter((report) => report.placementNumber === placement.number),
        caution: sheet.caution,
      };
    }
  }
  throw absent();
}

function absent(): AppError {
  return new AppError("not_found", "There is no such bolt, or it is not shown to you.");
}
