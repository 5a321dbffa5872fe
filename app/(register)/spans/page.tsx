import type { Metadata } from "next";
import { Page } from "@/components/layout/page";
import { SpanList } from "@/components/span/span-list";
import { LinkButton } from "@/components/ui/link-button";
import { getActor } from "@/lib/auth/get-actor";
import { listSpans } from "@/lib/queries/spans";

export const metadata: Metadata = { title: "Spans" };

export default async function SpansPage() {
  const actor = await getActor();
  const spans = await listSpans(actor);
  return (
    <Page
      title="Spans"
      intro="Ways of a line between two anchors. Lengths are geodesic, on the WGS84 ellipsoid."
      actions={actor.kind === "person" ? <LinkButton href="/spans/new">Register a span</LinkButton> : null}
    >
      <SpanList spans={spans} />
    </Page>
  );
}
