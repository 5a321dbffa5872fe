import "server-only";
import { type Db, getDb } from "@/db/client";
import type { Actor } from "@/lib/shared/actor";

/** What every command is given beside its input. */
export interface CommandContext {
  db: Db;
  actor: Actor;
  now: Date;
  requestId: string;
}

/** The context a door hands to its command: what it knows, and the process-wide pool. */
export function commandContext({ actor, now, requestId }: Omit<CommandContext, "db">): CommandContext {
  return { db: getDb(), actor, now, requestId };
}
