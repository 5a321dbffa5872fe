import type { Metadata } from "next";
import { v7 } from "uuid";
import { addClosure, liftClosure } from "@/app/(steward)/closures/actions";
import { Page } from "@/components/layout/page";
import { ClosureForm } from "@/components/steward/closure-form";
import { ClosureTable } from "@/components/steward/closure-table";
import { Disclosure } from "@/components/ui/disclosure";
import { EmptyState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { now } from "@/lib/config/clock";
import { can } from "@/lib/policy/can";
import { listAnchors } from "@/lib/queries/list-anchors";
import { listAreas } from "@/lib/queries/list-areas";
import { listSites } from "@/lib/queries/list-sites";
import { listClosures } from "@/lib/queries/notices";
import type { Actor } from "@/lib/shared/actor";

export const metadata: Metadata = { title: "Closures" };

export default async function ClosuresPage() {
  const actor = await getActor();
  const today = now().toISOString().slice(0, 10);
  const closures = await listClosures(actor, true);
  return (
    <Page title="Closures" intro="Where access is stopped, for how long and on whose wish." width="read">
      <div className="grid gap-8">
        {closures.length === 0 ? (
          <EmptyState title="Nothing is closed" />
        ) : (
          <ClosureTable
            lift={liftClosure}
            today={today}
            closures={closures.map((closure) => ({
              ...closure,
              mayLift: can(actor, "closure.write", { areaId: closure.areaId }),
            }))}
          />
        )}
        <Writing actor={actor} today={today} />
      </div>
    </Page>
  );
}

/** More anchors than an area has that is looked after by hand. */
const MOST_ANCHORS = 1000;

async function Writing({ actor, today }: { actor: Actor; today: string }) {
  const areas = (await listAreas(actor)).filter(({ id }) => can(actor, "closure.write", { areaId: id }));
  if (areas.length === 0) return null;
  const parts = await Promise.all(
    areas.map(async ({ id, name, slug }) => {
      const [sites, anchors] = await Promise.all([
        listSites(actor, slug),
        listAnchors(actor, { areaSlug: slug }, { limit: MOST_ANCHORS, cursor: undefined }),
      ]);
      return {
        area: { id, name, sites: sites.map((site) => ({ value: site.id, label: site.name })) },
        anchors: anchors.items.map((anchor) => ({
          value: anchor.id,
          label: `${anchor.code} ${anchor.label}`,
          detail: anchor.siteName,
          areaId: id,
          siteId: sites.find(({ slug: siteSlug }) => siteSlug === anchor.siteSlug)?.id ?? "",
        })),
      };
    }),
  );
  return (
    <Disclosure summary="Write a closure">
      <ClosureForm
        action={addClosure}
        newId={v7()}
        today={today}
        areas={parts.map(({ area }) => area)}
        anchors={parts.flatMap(({ anchors }) => anchors)}
      />
    </Disclosure>
  );
}
