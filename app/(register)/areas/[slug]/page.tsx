import type { Metadata } from "next";
import Link from "next/link";
import { Page } from "@/components/layout/page";
import { SheetSection } from "@/components/layout/sheet-section";
import { DemandTable } from "@/components/site/demand-table";
import { EmergencyBlock } from "@/components/site/emergency-block";
import { getActor } from "@/lib/auth/get-actor";
import { orNotFound } from "@/lib/http/or-not-found";
import { getArea } from "@/lib/queries/list-areas";

interface AreaPageProps {
  params: Promise<{ slug: string }>;
}

export async function generateMetadata({ params }: AreaPageProps): Promise<Metadata> {
  return { title: (await orNotFound(getArea(await getActor(), (await params).slug))).name };
}

export default async function AreaPage({ params }: AreaPageProps) {
  const area = await orNotFound(getArea(await getActor(), (await params).slug));
  return (
    <Page title={area.name} intro={area.summary}>
      <div className="grid gap-8">
        <SheetSection title="Loads the group counts with" note={`policy version ${area.policyVersion}`}>
          <DemandTable demand={area.demand} />
        </SheetSection>
        <div className="grid gap-x-10 gap-y-8 lg:grid-cols-2">
          <SheetSection title="If somebody is hurt">
            <EmergencyBlock emergency={area.emergency} />
          </SheetSection>
          <SheetSection title="Sites">
            <ul className="divide-y divide-line border-y border-line">
              {area.sites.map((site) => (
                <li key={site.id} className="flex justify-between gap-4 py-2">
                  <Link href={`/sites/${site.slug}`} className="underline underline-offset-2">
                    {site.name}
                  </Link>
                  <span className="type-figure text-muted">{site.anchorCount}</span>
                </li>
              ))}
            </ul>
            {area.contactEmail ? (
              <p className="pt-3">
                Write to the group:{" "}
                <a className="underline underline-offset-2" href={`mailto:${area.contactEmail}`}>
                  {area.contactEmail}
                </a>
              </p>
            ) : null}
          </SheetSection>
        </div>
      </div>
    </Page>
  );
}
