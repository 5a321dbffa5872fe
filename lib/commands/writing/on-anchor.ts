import "server-only";
import { inTransaction, type Tx } from "@/db/client";
import { type LockedAnchor, lockAnchor } from "@/db/repositories/anchors";
import type { CommandContext } from "@/lib/commands/context";
import { authorize } from "@/lib/commands/writing/authorize";
import { notFound } from "@/lib/commands/writing/refusals";
import { audience } from "@/lib/policy/audience";
import type { Action } from "@/lib/policy/can";
import type { Person } from "@/lib/shared/actor";

/** What a command on one anchor works with. */
export interface OnAnchor {
  tx: Tx;
  anchor: LockedAnchor;
  person: Person;
}

/**
 * One transaction on one anchor, which is locked first: two commands on the same anchor run one after the other.
 * @throws AppError `not_found` when it is absent or hidden, `not_signed_in`, `forbidden`.
 */
export function onAnchor<T>(
  ctx: CommandContext,
  anchorId: string | null,
  action: Action,
  work: (on: OnAnchor) => Promise<T>,
): Promise<T> {
  return inTransaction(ctx.db, async (tx) => {
    const anchor = anchorId === null ? null : await lockAnchor(tx, audience(ctx.actor), anchorId);
    if (!anchor) throw notFound();
    const person = authorize(ctx.actor, action, { areaId: anchor.areaId });
    return work({ tx, anchor, person });
  });
}
