import type { Metadata } from "next";
import { v7 } from "uuid";
import { addNatural, changeAnchor } from "@/app/(register)/anchors/[code]/edit/actions";
import { AddPlacementForm } from "@/components/edit/add-placement-form";
import { EditAnchorForm } from "@/components/edit/edit-anchor-form";
import { Page } from "@/components/layout/page";
import { SheetSection } from "@/components/layout/sheet-section";
import { LinkButton } from "@/components/ui/link-button";
import { ForbiddenState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { orNotFound } from "@/lib/http/or-not-found";
import { can } from "@/lib/policy/can";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";
import { anchorFactsOf } from "@/lib/schemas/anchor-facts";
import { flatValues } from "@/lib/shared/flat-values";

export const metadata: Metadata = { title: "Correct an anchor" };

export default async function EditAnchorPage({ params }: { params: Promise<{ code: string }> }) {
  const actor = await getActor();
  const sheet = await orNotFound(getAnchorSheet(actor, await params));
  if (!can(actor, "anchor.edit", { areaId: sheet.area.id })) {
    return (
      <Page title="Correct an anchor" width="read">
        <ForbiddenState title="Bolters of this area correct records">
          Something is wrong here? Report it: a steward reads every report.
        </ForbiddenState>
      </Page>
    );
  }
  const { id, code, version } = sheet;
  return (
    <Page
      title="Correct an anchor"
      intro={`${code} · ${sheet.label}, ${sheet.site.name}. What you change stands in the revision table.`}
      width="read"
      actions={<LinkButton href={`/anchors/${code}/move`}>Move it</LinkButton>}
    >
      <div className="grid gap-12">
        <EditAnchorForm
          action={changeAnchor}
          anchor={{ id, code, version }}
          stored={flatValues(anchorFactsOf(sheet))}
          legs={sheet.placements.map(({ number }) => number)}
        />
        <SheetSection id="placement" title="Add a tree, boulder, thread or removable piece">
          <AddPlacementForm
            action={addNatural}
            anchorId={id}
            newId={v7()}
            bodies={sheet.rockBodies.map((body) => ({ id: body.id, label: body.label }))}
          />
        </SheetSection>
      </div>
    </Page>
  );
}
