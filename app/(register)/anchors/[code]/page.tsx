import type { Metadata } from "next";
import { cache } from "react";
import { followAnchor } from "@/app/(register)/anchors/[code]/actions";
import { AnchorSheet } from "@/components/anchor/anchor-sheet";
import { seldomActions } from "@/components/anchor/seldom-actions";
import { SheetActions } from "@/components/anchor/sheet-actions";
import { Notice } from "@/components/ui/notice";
import { getActor } from "@/lib/auth/get-actor";
import { now } from "@/lib/config/clock";
import { orNotFound } from "@/lib/http/or-not-found";
import { can } from "@/lib/policy/can";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";

interface AnchorPageProps {
  params: Promise<{ code: string }>;
  searchParams: Promise<{ installed?: string }>;
}

const readSheet = cache(async (code: string) => orNotFound(getAnchorSheet(await getActor(), { code })));

export async function generateMetadata({ params }: AnchorPageProps): Promise<Metadata> {
  const sheet = await readSheet((await params).code);
  return { title: `${sheet.code} ${sheet.label}` };
}

export default async function AnchorPage({ params, searchParams }: AnchorPageProps) {
  const actor = await getActor();
  const sheet = await readSheet((await params).code);
  const { installed } = await searchParams;
  const subject = { areaId: sheet.area.id };
  return (
    <AnchorSheet
      sheet={sheet}
      today={now().toISOString().slice(0, 10)}
      message={
        installed ? (
          <Notice tone="calm" role="status" title="Stored.">
            The install is on record and everything that depends on it was judged again.
          </Notice>
        ) : null
      }
      actions={
        <SheetActions
          code={sheet.code}
          anchorId={sheet.id}
          watched={actor.kind === "person" ? sheet.watched : null}
          follow={followAnchor}
          mayInstall={can(actor, "bolt.install", subject)}
          seldom={seldomActions(actor, sheet)}
        />
      }
    />
  );
}
