import { FollowButton } from "@/components/anchor/follow-button";
import { PrintButton } from "@/components/anchor/print-button";
import { Button } from "@/components/ui/button";
import { LinkButton } from "@/components/ui/link-button";
import { Menu, type MenuEntry } from "@/components/ui/menu";
import type { FormAction } from "@/lib/shared/action-state";

interface SheetActionsProps {
  code: string;
  anchorId: string;
  /** Installing is a button of its own; what is done more seldom stands in the menu. */
  mayInstall: boolean;
  seldom: readonly MenuEntry[];
  /** Null: nobody is signed in, nobody follows. */
  watched: boolean | null;
  follow: FormAction<{ on: boolean }>;
}

/** What this reader can do with this anchor. */
export function SheetActions({ code, anchorId, mayInstall, seldom, watched, follow }: SheetActionsProps) {
  return (
    <>
      <span className="hidden sm:contents">
        <PrintButton />
      </span>
      {watched === null ? null : <FollowButton anchorId={anchorId} watched={watched} action={follow} />}
      {seldom.length > 0 ? <Menu trigger={<Button>Change…</Button>} entries={seldom} /> : null}
      {mayInstall ? <LinkButton href={`/anchors/${code}/install`}>Log an install</LinkButton> : null}
      <LinkButton tone="primary" href={`/report?anchor=${code}`}>
        Report what you saw
      </LinkButton>
    </>
  );
}
