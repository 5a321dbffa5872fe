import type { Metadata } from "next";
import { v7 } from "uuid";
import { registerAnchor } from "@/app/(register)/sites/[slug]/anchors/new/actions";
import { NewAnchorForm } from "@/components/edit/new-anchor-form";
import { Page } from "@/components/layout/page";
import { marksOf } from "@/components/place/marks-of";
import { ForbiddenState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { orNotFound } from "@/lib/http/or-not-found";
import { can } from "@/lib/policy/can";
import { getSite } from "@/lib/queries/get-site";

export const metadata: Metadata = { title: "Register an anchor" };

export default async function NewAnchorPage({ params }: { params: Promise<{ slug: string }> }) {
  const actor = await getActor();
  const site = await orNotFound(getSite(actor, await params));
  if (!can(actor, "anchor.create", { areaId: site.areaId })) {
    return (
      <Page title="Register an anchor" width="read">
        <ForbiddenState title="Bolters of this area register anchors">
          You may report one that is not in the register, from the map.
        </ForbiddenState>
      </Page>
    );
  }
  return (
    <Page title="Register an anchor" intro={site.name} width="read">
      <NewAnchorForm
        action={registerAnchor}
        siteId={site.id}
        siteSlug={site.slug}
        newId={v7()}
        marks={marksOf(site)}
      />
    </Page>
  );
}
