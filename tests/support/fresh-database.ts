import { existsSync, readFileSync } from "node:fs";
import path from "node:path";
import { drizzle } from "drizzle-orm/postgres-js";
import postgres from "postgres";
import type { Db } from "@/db/client";
import { migrateDatabase } from "@/db/migrate";
import journal from "@/db/migrations/meta/_journal.json";
import * as schema from "@/db/schema";

type Server = ReturnType<typeof postgres>;

/** Any number of our own: workers must not make the template at once. */
const TEMPLATE_LOCK = 7_311_948;

/**
 * A migrated, empty database of its own on the server of DATABASE_URL, or of the development cluster;
 * dropped by `drop()`. It is a copy of a template that is migrated once.
 */
export async function freshDatabase(name: string): Promise<{ db: Db; drop: () => Promise<void> }> {
  const address = serverAddress();
  const own = `${name}_${process.pid}`;
  const server = postgres(address, { max: 1, onnotice: () => undefined });
  await server`select pg_advisory_lock(${TEMPLATE_LOCK})`;
  try {
    const template = await migratedTemplate(server, address);
    await server.unsafe(`drop database if exists "${own}" with (force)`);
    await server.unsafe(`create database "${own}" template "${template}"`);
  } finally {
    await server`select pg_advisory_unlock(${TEMPLATE_LOCK})`;
  }
  const client = postgres(databaseAddress(address, own), { max: 4, onnotice: () => undefined });
  return {
    db: drizzle(client, { schema, casing: "snake_case" }),
    drop: async () => {
      await client.end({ timeout: 5 });
      await server.unsafe(`drop database if exists "${own}" with (force)`);
      await server.end({ timeout: 5 });
    },
  };
}

/** The template's name tells which migrations it has, so an older one is never copied. */
async function migratedTemplate(server: Server, address: string): Promise<string> {
  const last = journal.entries.at(-1);
  const name = `byssus_template_${journal.entries.length}_${last?.when ?? 0}`;
  const [found] = await server`select 1 from pg_database where datname = ${name} and datistemplate`;
  if (found) return name;
  await server.unsafe(`drop database if exists "${name}" with (force)`);
  await server.unsafe(`create database "${name}" template template1`);
  const client = postgres(databaseAddress(address, name), { max: 1, onnotice: () => undefined });
  try {
    await migrateDatabase(drizzle(client, { schema, casing: "snake_case" }));
  } finally {
    await client.end({ timeout: 5 });
  }
  await server.unsafe(`alter database "${name}" is_template true`);
  return name;
}

function databaseAddress(address: string, database: string): string {
  const url = new URL(address);
  url.pathname = `/${database}`;
  return url.href;
}

/** The test command sets DATABASE_URL; a single file run by hand uses the development cluster. */
export function serverAddress(): string {
  const file = path.join(process.cwd(), ".local", "dev-url");
  const address = process.env.DATABASE_URL ?? (existsSync(file) ? readFileSync(file, "utf8").trim() : "");
  if (address === "")
    throw new Error("No database server: run node scripts/cluster.mjs up, or set DATABASE_URL.");
  return address;
}
