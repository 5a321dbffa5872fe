import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { BoltSheet } from "@/components/bolt/bolt-sheet";
import { PrintButton } from "@/components/anchor/print-button";
import { LinkButton } from "@/components/ui/link-button";
import { getActor } from "@/lib/auth/get-actor";
import { orNotFound } from "@/lib/http/or-not-found";
import { getBolt } from "@/lib/queries/get-bolt";
import { idParam } from "@/lib/schemas/query";

interface BoltPageProps {
  params: Promise<{ id: string }>;
}

export async function generateMetadata(props: BoltPageProps): Promise<Metadata> {
  const { anchor, placementNumber } = await read(props);
  return { title: `${anchor.code}, bolt ${placementNumber}` };
}

export default async function BoltPage(props: BoltPageProps) {
  const detail = await read(props);
  const { anchor, placementNumber } = detail;
  return (
    <BoltSheet
      detail={detail}
      actions={
        <>
          <PrintButton />
          <LinkButton href={`/anchors/${anchor.code}`}>Anchor sheet</LinkButton>
          <LinkButton tone="primary" href={`/report?anchor=${anchor.code}&placement=${placementNumber}`}>
            Report what you saw
          </LinkButton>
        </>
      }
    />
  );
}

async function read({ params }: BoltPageProps) {
  const parsed = idParam.safeParse(await params);
  if (!parsed.success) notFound();
  return orNotFound(getBolt(await getActor(), parsed.data.id));
}
