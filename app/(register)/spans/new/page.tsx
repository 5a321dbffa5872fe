import type { Metadata } from "next";
import { v7 } from "uuid";
import { registerSpan } from "@/app/(register)/spans/new/actions";
import { NewSpanForm } from "@/components/edit/new-span-form";
import { Page } from "@/components/layout/page";
import { ForbiddenState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { USE_LABELS } from "@/lib/domain/labels";
import { can } from "@/lib/policy/can";
import { listAnchors } from "@/lib/queries/list-anchors";
import { listAreas } from "@/lib/queries/list-areas";

export const metadata: Metadata = { title: "Register a span" };

/** More anchors than a list to choose from can carry; the rest is found by typing a code on the map. */
const MOST_ANCHORS = 1000;

export default async function NewSpanPage({ searchParams }: { searchParams: Promise<{ from?: string }> }) {
  const actor = await getActor();
  const { from } = await searchParams;
  const areas = (await listAreas(actor)).filter(({ id }) => can(actor, "span.create", { areaId: id }));
  if (areas.length === 0) {
    return (
      <Page title="Register a span" width="read">
        <ForbiddenState title="Bolters of an area register spans" />
      </Page>
    );
  }
  const pages = await Promise.all(
    areas.map(({ slug }) =>
      listAnchors(actor, { areaSlug: slug }, { limit: MOST_ANCHORS, cursor: undefined }),
    ),
  );
  const anchors = pages.flatMap(({ items }) => items);
  return (
    <Page title="Register a span" intro="A line between two anchors of one area." width="read">
      <NewSpanForm
        action={registerSpan}
        newId={v7()}
        firstId={anchors.find(({ code }) => code === from)?.id ?? null}
        anchors={anchors.map(({ id, code, label, siteName, uses }) => ({
          value: id,
          label: `${code} ${label}`,
          detail: `${siteName} · ${uses.map((use) => USE_LABELS[use]).join(", ")}`,
        }))}
      />
    </Page>
  );
}
