import { LinkButton } from "@/components/ui/link-button";
import { EmptyState } from "@/components/ui/state-panel";

export default function NotFound() {
  return (
    <EmptyState
      headingLevel={1}
      title="Nothing here, or not shown to you"
      actions={
        <>
          <LinkButton href="/">Map</LinkButton>
          <LinkButton href="/sites">Sites</LinkButton>
          <LinkButton href="/sign-in">Sign in</LinkButton>
        </>
      }
    >
      What is hidden from you looks the same as what does not exist.
    </EmptyState>
  );
}
