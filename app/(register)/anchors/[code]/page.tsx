import type { Metadata } from "next";
import { followAnchor } from "@/app/(register)/anchors/[code]/actions";
import { AnchorSheet } from "@/components/anchor/anchor-sheet";
import { SheetActions } from "@/components/anchor/sheet-actions";
import { Notice } from "@/components/ui/notice";
import { getActor } from "@/lib/auth/get-actor";
import { orNotFound } from "@/lib/http/or-not-found";
import { can } from "@/lib/policy/can";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";

interface AnchorPageProps {
  params: Promise<{ code: string }>;
  searchParams: Promise<{ installed?: string }>;
}

export async function generateMetadata({ params }: AnchorPageProps): Promise<Metadata> {
  const sheet = await orNotFound(getAnchorSheet(await getActor(), await params));
  return { title: `${sheet.code} ${sheet.label}` };
}

export default async function AnchorPage({ params, searchParams }: AnchorPageProps) {
  const actor = await getActor();
  const sheet = await orNotFound(getAnchorSheet(actor, await params));
  const { installed } = await searchParams;
  const subject = { areaId: sheet.area.id };
  return (
    <AnchorSheet
      sheet={sheet}
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
          signedIn={actor.kind === "person"}
          watched={sheet.watched}
          follow={followAnchor}
          rights={{
            report: can(actor, "report.file", subject),
            install: can(actor, "bolt.install", subject),
            edit: can(actor, "anchor.edit", subject),
            move: can(actor, "anchor.move", subject),
          }}
        />
      }
    />
  );
}
