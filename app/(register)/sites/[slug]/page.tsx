import type { Metadata } from "next";
import Link from "next/link";
import { ClosureList } from "@/components/anchor/closure-list";
import { Page } from "@/components/layout/page";
import { SheetSection } from "@/components/layout/sheet-section";
import { AnchorRows } from "@/components/site/anchor-rows";
import { EmergencyBlock } from "@/components/site/emergency-block";
import { SiteFacts } from "@/components/site/site-facts";
import { ConditionCounts } from "@/components/site/site-list";
import { LinkButton } from "@/components/ui/link-button";
import { Notice } from "@/components/ui/notice";
import { getActor } from "@/lib/auth/get-actor";
import { orNotFound } from "@/lib/http/or-not-found";
import { can } from "@/lib/policy/can";
import { getSite } from "@/lib/queries/get-site";
import { readableText } from "@/lib/shared/readable-text";

interface SitePageProps {
  params: Promise<{ slug: string }>;
}

export async function generateMetadata({ params }: SitePageProps): Promise<Metadata> {
  return { title: (await orNotFound(getSite(await getActor(), await params))).name };
}

export default async function SitePage({ params }: SitePageProps) {
  const actor = await getActor();
  const site = await orNotFound(getSite(actor, await params));
  return (
    <Page
      title={site.name}
      intro={readableText(site.summary)}
      actions={
        <>
          <LinkButton href={`/?site=${site.slug}`}>On the map</LinkButton>
          {can(actor, "anchor.create", { areaId: site.areaId }) ? (
            <LinkButton tone="primary" href={`/sites/${site.slug}/anchors/new`}>
              Register an anchor
            </LinkButton>
          ) : null}
        </>
      }
    >
      <div className="grid gap-8">
        {site.exact ? null : (
          <Notice tone="info" title="Members see the place">
            The group keeps this site to itself. You see its name, its hardware and a point rounded to about 1
            km; what it could be found by is left out.
          </Notice>
        )}
        {site.closures.length > 0 ? (
          <Notice tone="warn" title="Closures">
            <ClosureList closures={site.closures} />
          </Notice>
        ) : null}
        <SheetSection
          title="Anchors"
          note={`${site.anchorCount}`}
          actions={<ConditionCounts conditions={site.conditions} />}
        >
          <AnchorRows anchors={site.anchors} caption={`Anchors of ${site.name}`} />
        </SheetSection>
        <div className="grid gap-x-10 gap-y-8 lg:grid-cols-2">
          <SheetSection title="The place">
            <SiteFacts site={site} />
          </SheetSection>
          {site.exact ? (
            <SheetSection title="If somebody is hurt">
              <EmergencyBlock emergency={site.emergency} />
            </SheetSection>
          ) : null}
        </div>
        <p>
          <Link href={`/areas/${site.areaSlug}`} className="inline-block py-2 text-link">
            {site.areaName}: who looks after it, and the loads it counts with
          </Link>
        </p>
      </div>
    </Page>
  );
}
