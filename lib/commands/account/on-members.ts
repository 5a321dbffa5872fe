import "server-only";
import { inTransaction, type Tx } from "@/db/client";
import { countStewards, lockArea } from "@/db/repositories/memberships";
import type { CommandContext } from "@/lib/commands/context";
import { authorize } from "@/lib/commands/writing/authorize";
import { notFound } from "@/lib/commands/writing/refusals";
import { audience, isMember } from "@/lib/policy/audience";
import type { Person } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

export interface OnMembers {
  tx: Tx;
  area: { id: string; name: string };
  person: Person;
}

/**
 * One transaction on who belongs to an area, which is locked first: two stewards change it one after the other.
 * @throws AppError `not_found` when the area is absent or hidden, `not_signed_in`, `forbidden`.
 */
export function onMembers<T>(
  ctx: CommandContext,
  areaId: string,
  work: (on: OnMembers) => Promise<T>,
): Promise<T> {
  return inTransaction(ctx.db, async (tx) => {
    const area = await lockArea(tx, areaId);
    const seen = area !== null && (area.visibility === "public" || isMember(audience(ctx.actor), areaId));
    if (!seen) throw notFound();
    const person = authorize(ctx.actor, "people.manage", { areaId });
    return work({ tx, area, person });
  });
}

/** @throws AppError `refused_by_rule` when the area would be left without a steward. */
export async function refuseLastSteward(tx: Tx, area: { id: string; name: string }): Promise<void> {
  if ((await countStewards(tx, area.id)) > 1) return;
  throw new AppError(
    "refused_by_rule",
    `This is the last steward of ${area.name}. Make somebody else a steward first.`,
  );
}
