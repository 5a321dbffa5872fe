import "server-only";
import { drizzle, type PostgresJsDatabase } from "drizzle-orm/postgres-js";
import postgres from "postgres";
import * as schema from "@/db/schema";
import { env } from "@/lib/config/env";

export type Db = PostgresJsDatabase<typeof schema>;
/** A transaction handle; everything a command writes goes through one. */
export type Tx = Parameters<Parameters<Db["transaction"]>[0]>[0];
/** What a repository's read may be given. */
export type Handle = Db | Tx;

/** Opens a pool. The caller closes it with `close()`. */
export function connect(url: string, max = 10): { db: Db; close: () => Promise<void> } {
  const client = postgres(url, { max, onnotice: () => undefined });
  return { db: drizzle(client, { schema, casing: "snake_case" }), close: () => client.end({ timeout: 5 }) };
}

declare global {
  // Kept on the global object so that hot reload in development does not open a pool per edit.
  var byssusPool: ReturnType<typeof connect> | undefined;
}

/** The process-wide pool; survives hot reload in development. */
export function getDb(): Db {
  globalThis.byssusPool ??= connect(env().DATABASE_URL, env().DATABASE_POOL_MAX);
  return globalThis.byssusPool.db;
}

/** Runs one command's writes in one transaction. */
export function inTransaction<T>(db: Db, work: (tx: Tx) => Promise<T>): Promise<T> {
  return db.transaction(work);
}
