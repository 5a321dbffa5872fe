import { afterAll, beforeAll, vi } from "vitest";
import type { Db } from "@/db/client";
import { freshDatabase } from "@/tests/support/fresh-database";

/**
 * A database of the test file's own, which is also the process-wide pool: sign-in and rate limits use that.
 * Call it at the top of the file; the returned function gives the handle inside tests.
 */
export function accountDatabase(name: string): () => Db {
  let own: Awaited<ReturnType<typeof freshDatabase>> | undefined;
  beforeAll(async () => {
    vi.stubEnv("NEXTAUTH_SECRET", "only-for-tests-only-for-tests-only-for-tests");
    vi.stubEnv("BYSSUS_URL", "https://register.example");
    vi.stubEnv("BYSSUS_DEMO", "0");
    vi.stubEnv("LOG_LEVEL", "silent");
    own = await freshDatabase(name);
    globalThis.byssusPool = { db: own.db, close: async () => undefined };
  }, 60_000);
  afterAll(async () => {
    globalThis.byssusPool = undefined;
    await own?.drop();
  });
  return () => {
    if (!own) throw new Error("The database is made in beforeAll.");
    return own.db;
  };
}
