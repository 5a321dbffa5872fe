import type { Metadata } from "next";
import { v7 } from "uuid";
import { openRebolt } from "@/app/(register)/anchors/[code]/rebolt/actions";
import { Page } from "@/components/layout/page";
import { OpenJobForm } from "@/components/queue/open-job-form";
import { Notice } from "@/components/ui/notice";
import { ForbiddenState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { FORM_LABELS, PLACEMENT_KIND_LABELS, sentence } from "@/lib/domain/labels";
import { orNotFound } from "@/lib/http/or-not-found";
import { can } from "@/lib/policy/can";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";

export const metadata: Metadata = { title: "Open a rebolt" };

export default async function OpenReboltPage({ params }: { params: Promise<{ code: string }> }) {
  const actor = await getActor();
  const sheet = await orNotFound(getAnchorSheet(actor, await params));
  if (!can(actor, "job.open", { areaId: sheet.area.id })) {
    return (
      <Page title="Open a rebolt" width="read">
        <ForbiddenState title="Stewards of this area open rebolts">
          Report what you saw at this anchor: a steward reads every report.
        </ForbiddenState>
      </Page>
    );
  }
  return (
    <Page title="Open a rebolt" intro={`${sheet.code} · ${sheet.label}, ${sheet.site.name}`} width="read">
      <div className="grid gap-6">
        <Notice>
          It becomes an entry of the rebolt queue. Its rank is computed like any other&rsquo;s; opening it
          takes nothing out of use.
        </Notice>
        <OpenJobForm
          action={openRebolt}
          newId={v7()}
          anchorId={sheet.id}
          placements={sheet.placements.map(({ id, number, kind, bolt }) => ({
            id,
            label: `${number} · ${bolt ? (bolt.typeName ?? FORM_LABELS[bolt.form]) : sentence(PLACEMENT_KIND_LABELS[kind])}`,
          }))}
        />
      </div>
    </Page>
  );
}
