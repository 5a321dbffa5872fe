"use client";

import { useState } from "react";

/** Ends the session on this device and goes back to the map. */
export function SignOutButton() {
  const [busy, setBusy] = useState(false);
  return (
    <button
      type="button"
      disabled={busy}
      className="block touch w-full cursor-pointer border-t border-line px-4 py-2 text-left hover:bg-sunk hover:text-action"
      onClick={() => {
        setBusy(true);
        leave().catch(() => setBusy(false));
      }}
    >
      {busy ? "Signing out…" : "Sign out"}
    </button>
  );
}

/** Loaded when it is needed: hardly anybody signs out at the cliff. */
async function leave(): Promise<void> {
  const { signOut } = await import("next-auth/react");
  await signOut({ callbackUrl: "/" });
}
