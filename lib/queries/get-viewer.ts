import "server-only";
import { getDb } from "@/db/client";
import { countWaiting } from "@/db/repositories/viewer-read";
import { usesMailSink } from "@/lib/config/env";
import { can } from "@/lib/policy/can";
import type { Actor, Role } from "@/lib/shared/actor";

/** What header and navigation need to know of who is looking; null: nobody is signed in. */
export interface Viewer {
  name: string;
  email: string;
  isAdmin: boolean;
  /** The highest role the person holds anywhere; null: no membership. */
  role: Role | null;
  seesQueue: boolean;
  stewards: boolean;
  /** Open reports and proposed queue entries in the areas the person stewards. */
  waiting: { reports: number; proposals: number; jobs: number };
  hasMailbox: boolean;
}

export async function getViewer(actor: Actor): Promise<Viewer | null> {
  if (actor.kind === "visitor") return null;
  const stewarded = Object.keys(actor.roles).filter((areaId) => can(actor, "report.handle", { areaId }));
  const roles = Object.values(actor.roles);
  const role: Role | null = roles.includes("steward")
    ? "steward"
    : roles.includes("bolter")
      ? "bolter"
      : (roles[0] ?? null);
  const waiting = await countWaiting(getDb(), actor.isAdmin ? "all" : stewarded, actor.userId);
  return {
    name: actor.name,
    email: actor.email,
    isAdmin: actor.isAdmin,
    role,
    seesQueue: actor.isAdmin || role === "steward" || role === "bolter",
    stewards: actor.isAdmin || role === "steward",
    waiting,
    hasMailbox: usesMailSink(),
  };
}
