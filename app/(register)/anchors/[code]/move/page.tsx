import type { Metadata } from "next";
import { relocateAnchor } from "@/app/(register)/anchors/[code]/edit/actions";
import { MoveAnchorForm } from "@/components/edit/move-anchor-form";
import { Page } from "@/components/layout/page";
import { marksOf } from "@/components/place/marks-of";
import { Notice } from "@/components/ui/notice";
import { ForbiddenState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { orNotFound } from "@/lib/http/or-not-found";
import { can } from "@/lib/policy/can";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";
import { getSite } from "@/lib/queries/get-site";

export const metadata: Metadata = { title: "Move an anchor" };

export default async function MoveAnchorPage({ params }: { params: Promise<{ code: string }> }) {
  const actor = await getActor();
  const sheet = await orNotFound(getAnchorSheet(actor, await params));
  if (!can(actor, "anchor.move", { areaId: sheet.area.id })) {
    return (
      <Page title="Move an anchor" width="read">
        <ForbiddenState title="Bolters of this area move anchors">
          It is somewhere else? Report it: a steward reads every report.
        </ForbiddenState>
      </Page>
    );
  }
  const { id, code, version, point, pointErrorM } = sheet;
  const [lon, lat] = point.coordinates;
  const site = await orNotFound(getSite(actor, { slug: sheet.site.slug }));
  return (
    <Page title="Move an anchor" intro={`${code} · ${sheet.label}, ${sheet.site.name}`} width="read">
      <div className="grid gap-6">
        <Notice>
          Its distance to the sea, unless measured by hand, and the lengths of its spans are computed again,
          and every verdict with them.
        </Notice>
        <MoveAnchorForm
          action={relocateAnchor}
          anchor={{ id, code, version }}
          stored={{
            "point.lon": lon.toFixed(6),
            "point.lat": lat.toFixed(6),
            pointErrorM: pointErrorM === null ? "" : String(pointErrorM),
          }}
          marks={marksOf(site)}
        />
      </div>
    </Page>
  );
}
