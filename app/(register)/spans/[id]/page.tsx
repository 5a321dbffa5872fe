import type { Metadata } from "next";
import { cache } from "react";
import { PrintButton } from "@/components/anchor/print-button";
import { SpanSheet } from "@/components/span/span-sheet";
import { getActor } from "@/lib/auth/get-actor";
import { idOrNotFound, orNotFound } from "@/lib/http/or-not-found";
import { getArea } from "@/lib/queries/list-areas";
import { getSpan } from "@/lib/queries/spans";

interface SpanPageProps {
  params: Promise<{ id: string }>;
}

const readSpan = cache(async (id: string) => orNotFound(getSpan(await getActor(), idOrNotFound(id))));

export async function generateMetadata({ params }: SpanPageProps): Promise<Metadata> {
  return { title: (await readSpan((await params).id)).name };
}

export default async function SpanPage({ params }: SpanPageProps) {
  const span = await readSpan((await params).id);
  const area = await orNotFound(getArea(await getActor(), span.areaSlug));
  return <SpanSheet span={span} area={area} actions={<PrintButton />} />;
}
