import { FollowButton } from "@/components/anchor/follow-button";
import { PrintButton } from "@/components/anchor/print-button";
import { LinkButton } from "@/components/ui/link-button";
import type { FormAction } from "@/lib/shared/action-state";

export interface SheetRights {
  report: boolean;
  install: boolean;
  edit: boolean;
  move: boolean;
}

interface SheetActionsProps {
  code: string;
  anchorId: string;
  rights: SheetRights;
  signedIn: boolean;
  watched: boolean;
  follow: FormAction<{ on: boolean }>;
}

/** What this reader can do with this anchor. */
export function SheetActions({ code, anchorId, rights, signedIn, watched, follow }: SheetActionsProps) {
  return (
    <>
      {signedIn ? <FollowButton anchorId={anchorId} watched={watched} action={follow} /> : null}
      <PrintButton />
      {rights.edit ? <LinkButton href={`/anchors/${code}/edit`}>Correct</LinkButton> : null}
      {rights.move ? <LinkButton href={`/anchors/${code}/move`}>Move</LinkButton> : null}
      {rights.install ? <LinkButton href={`/anchors/${code}/install`}>Log an install</LinkButton> : null}
      <LinkButton tone="primary" href={`/report?anchor=${code}`}>
        Report what you saw
      </LinkButton>
    </>
  );
}
