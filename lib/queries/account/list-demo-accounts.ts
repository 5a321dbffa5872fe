import "server-only";
import { getDb } from "@/db/client";
import { listDemoUsers } from "@/db/repositories/people";
import { env } from "@/lib/config/env";

export interface DemoAccount {
  email: string;
  name: string;
}

/** The accounts of the demo; none outside it. */
export async function listDemoAccounts(): Promise<DemoAccount[]> {
  return env().BYSSUS_DEMO === "1" ? listDemoUsers(getDb()) : [];
}
