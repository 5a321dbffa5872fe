import { NavIcon } from "@/components/layout/nav-icon";
import { SignOutButton } from "@/components/layout/sign-out-button";
import type { Viewer } from "@/components/layout/viewer";
import { LinkButton } from "@/components/ui/link-button";
import { Menu, type MenuEntry } from "@/components/ui/menu";

const STEWARD_ENTRIES: readonly MenuEntry[] = [
  { href: "/people", label: "People" },
  { href: "/batch-warnings", label: "Batch warnings" },
  { href: "/closures", label: "Closures" },
  { href: "/failed-mail", label: "Failed mail" },
];

/** The reader's own corner: sign in, or name, settings and sign-out. */
export function AccountMenu({ viewer }: { viewer: Viewer | null }) {
  if (viewer === null) {
    return (
      <LinkButton href="/sign-in" tone="secondary" className="whitespace-nowrap">
        Sign in
      </LinkButton>
    );
  }
  return (
    <Menu
      trigger={
        <button
          type="button"
          className="flex touch max-w-56 cursor-pointer items-center gap-2 border border-transparent px-2 hover:text-action data-popup-open:border-frame"
        >
          <NavIcon icon="account" className="text-muted" />
          <span className="sr-only">Account: </span>
          <span className="hidden truncate font-semibold sm:inline">{viewer.name}</span>
        </button>
      }
      entries={[
        { href: "/settings", label: "Settings", detail: viewer.name },
        ...(viewer.isSteward ? STEWARD_ENTRIES : []),
      ]}
      footer={<SignOutButton />}
    />
  );
}
