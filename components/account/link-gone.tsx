import { Page } from "@/components/layout/page";
import { LinkButton } from "@/components/ui/link-button";
import { EmptyState } from "@/components/ui/state-panel";

/** Instead of a page whose link was used, taken back or has expired. `again`: where to get a new one. */
export function LinkGone({ again, children }: { again?: string; children?: React.ReactNode }) {
  return (
    <Page title="This link no longer works" width="read">
      <EmptyState
        title="Links from a mail work once, and for a while"
        actions={
          again ? (
            <LinkButton href={again} tone="primary">
              Ask for a new one
            </LinkButton>
          ) : null
        }
      >
        {children ?? "It was used already, has expired, or was not copied whole."}
      </EmptyState>
    </Page>
  );
}
