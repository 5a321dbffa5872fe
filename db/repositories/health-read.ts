import "server-only";
import { sql } from "drizzle-orm";
import type { Db } from "@/db/client";

/** How many migrations the database has seen. @throws when the database does not answer. */
export async function appliedMigrations(db: Db): Promise<number> {
  const [row] = await db.execute<{ n: number }>(
    sql`select count(*)::int as n from drizzle.__drizzle_migrations`,
  );
  return row?.n ?? 0;
}

/** Whether nobody and nothing is registered yet. */
export async function isEmptyRegister(db: Db): Promise<boolean> {
  const [row] = await db.execute<{ empty: boolean }>(
    sql`select not exists (select 1 from users) and not exists (select 1 from areas) as empty`,
  );
  return row?.empty ?? true;
}

/** Drops every table and function of ours and the record of migrations. PostGIS, an extension, stays. */
export async function dropEverything(db: Db): Promise<void> {
  await db.execute(sql`drop schema if exists drizzle cascade`);
  await db.execute(sql`do $$
    declare it record;
    begin
      for it in select c.relname from pg_class c join pg_namespace n on n.oid = c.relnamespace
        where n.nspname = 'public' and c.relkind = 'r'
          and not exists (select 1 from pg_depend d where d.objid = c.oid and d.deptype = 'e')
      loop execute format('drop table if exists public.%I cascade', it.relname); end loop;
    end $$`);
  await db.execute(sql`drop function if exists refuse_change() cascade`);
}
