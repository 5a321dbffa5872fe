import type { Metadata } from "next";
import { Page } from "@/components/layout/page";
import { SiteList } from "@/components/site/site-list";
import { LinkButton } from "@/components/ui/link-button";
import { EmptyState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { listSites } from "@/lib/queries/list-sites";

export const metadata: Metadata = { title: "Sites" };

export default async function SitesPage() {
  const sites = await listSites(await getActor());
  return (
    <Page
      title="Sites"
      intro="Cliffs, clefts, quarries and stacks with their anchors."
      actions={<LinkButton href="/spans">Spans</LinkButton>}
    >
      {sites.length === 0 ? (
        <EmptyState title="No site is shown to you">
          An area may be kept to its members. Sign in if you are one.
        </EmptyState>
      ) : (
        <SiteList sites={sites} />
      )}
    </Page>
  );
}
