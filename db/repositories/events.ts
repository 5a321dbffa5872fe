import "server-only";
import { v7 } from "uuid";
import type { Tx } from "@/db/client";
import { events } from "@/db/schema";
import type { Actor } from "@/lib/shared/actor";

export type NewEvent = Omit<typeof events.$inferInsert, "id" | "at" | "actorUserId" | "actorName">;

/** Appends to the audit trail. The name is kept as it is now, so the trail still reads well after a rename. */
export async function appendEvents(
  tx: Tx,
  by: { actor: Actor; now: Date },
  rows: readonly NewEvent[],
): Promise<void> {
  if (rows.length === 0) return;
  const who =
    by.actor.kind === "person"
      ? { actorUserId: by.actor.userId, actorName: by.actor.name }
      : { actorUserId: null, actorName: "nobody signed in" };
  await tx.insert(events).values(rows.map((row) => ({ ...row, ...who, id: v7(), at: by.now })));
}
