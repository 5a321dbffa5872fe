import "server-only";
import { getDb } from "@/db/client";
import journal from "@/db/migrations/meta/_journal.json";
import { appliedMigrations } from "@/db/repositories/health-read";
import { drainLagS } from "@/db/repositories/outbox-read";
import { log } from "@/lib/config/log";

export interface Readiness {
  ready: boolean;
  database: "up" | "down";
  migrations: "current" | "behind" | "unknown";
  /** Seconds the oldest mail that is due has been waiting. */
  mailLagS: number | null;
}

/** Whether requests can be served: the database answers and has every migration of this build. */
export async function readiness(): Promise<Readiness> {
  try {
    const [applied, lag] = await Promise.all([appliedMigrations(getDb()), drainLagS(getDb())]);
    const current = applied >= journal.entries.length;
    return {
      ready: current,
      database: "up",
      migrations: current ? "current" : "behind",
      mailLagS: Math.round(lag),
    };
  } catch (error) {
    log().error({ err: error }, "not ready");
    return { ready: false, database: "down", migrations: "unknown", mailLagS: null };
  }
}
