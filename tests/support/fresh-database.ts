import path from "node:path";
import { drizzle } from "drizzle-orm/postgres-js";
import { migrate } from "drizzle-orm/postgres-js/migrator";
import postgres from "postgres";
import type { Db } from "@/db/client";
import * as schema from "@/db/schema";

/** A migrated, empty database of its own on the server of DATABASE_URL; dropped by `drop()`. */
export async function freshDatabase(name: string): Promise<{ db: Db; drop: () => Promise<void> }> {
  const address = process.env.DATABASE_URL;
  if (address === undefined)
    throw new Error("DATABASE_URL names the server that test databases are made on.");
  const own = `${name}_${process.pid}`;
  const server = postgres(address, { max: 1, onnotice: () => undefined });
  await server.unsafe(`drop database if exists "${own}"`);
  await server.unsafe(`create database "${own}" template template1`);

  const url = new URL(address);
  url.pathname = `/${own}`;
  const client = postgres(url.href, { max: 4, onnotice: () => undefined });
  const db = drizzle(client, { schema, casing: "snake_case" });
  await migrate(db, { migrationsFolder: path.join(import.meta.dirname, "..", "..", "db", "migrations") });
  return {
    db,
    drop: async () => {
      await client.end({ timeout: 5 });
      await server.unsafe(`drop database if exists "${own}"`);
      await server.end({ timeout: 5 });
    },
  };
}
