import type { TokenScope } from "@/lib/shared/actor";

/** What each right of an API token means, in words. */
export const SCOPE_MEANS: Record<TokenScope, { label: string; detail: string }> = {
  read: { label: "Read", detail: "Everything you can see, members’ parts too." },
  report: { label: "Report", detail: "File reports and add photos in your name." },
  write: { label: "Write", detail: "Everything else your roles allow: installs, corrections, the queue." },
};
