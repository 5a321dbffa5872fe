/** Who is reading, as far as the frame of the page needs to know. */
export interface Viewer {
  name: string;
  /** Steward or bolter somewhere: the rebolt queue is theirs. */
  seesQueue: boolean;
  /** Steward somewhere, or administrator: people, warnings and closures are theirs. */
  isSteward: boolean;
}

/** A place the navigation leads to. */
export interface NavEntry {
  href: string;
  label: string;
  icon: "map" | "sites" | "types" | "queue" | "mailbox";
}

/** Only what exists, and only what this reader may open. */
export function navEntries(viewer: Viewer | null, hasMailbox: boolean): NavEntry[] {
  return [
    { href: "/", label: "Map", icon: "map" },
    { href: "/sites", label: "Sites", icon: "sites" },
    { href: "/types", label: "Types", icon: "types" },
    ...(viewer?.seesQueue ? [{ href: "/queue", label: "Queue", icon: "queue" } as const] : []),
    ...(hasMailbox ? [{ href: "/mailbox", label: "Mailbox", icon: "mailbox" } as const] : []),
  ];
}
