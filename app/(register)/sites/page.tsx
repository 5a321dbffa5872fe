import type { Metadata } from "next";
import { Page } from "@/components/layout/page";
import { SiteList } from "@/components/site/site-list";
import { getActor } from "@/lib/auth/get-actor";
import { listSites } from "@/lib/queries/list-sites";

export const metadata: Metadata = { title: "Sites" };

export default async function SitesPage() {
  const sites = await listSites(await getActor());
  return (
    <Page title="Sites" intro="Cliffs, clefts, quarries and stacks with their anchors.">
      <SiteList sites={sites} />
    </Page>
  );
}
