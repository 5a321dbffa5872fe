import "server-only";
import { sql } from "drizzle-orm";
import type { Db } from "@/db/client";

/** What a database is: `empty` of people and areas, the `demo` with its accounts, or a `real` register. */
export type InstallationKind = "empty" | "demo" | "real";

/** @throws when the database has not been migrated. */
export async function installationKind(db: Db): Promise<InstallationKind> {
  const [row] = await db.execute<{ empty: boolean; demo: boolean }>(
    sql`select not exists (select 1 from users) and not exists (select 1 from areas) as empty,
      exists (select 1 from users where is_demo) as demo`,
  );
  if (row?.demo) return "demo";
  return row?.empty ? "empty" : "real";
}

/**
 * Drops every table, view, sequence and function of ours and the record of migrations.
 * PostGIS, an extension, stays.
 */
export async function dropEverything(db: Db): Promise<void> {
  await db.execute(sql`drop schema if exists drizzle cascade`);
  await db.execute(sql`do $$
    declare it record;
    begin
      for it in select c.oid::regclass::text as name,
          case c.relkind when 'v' then 'view' when 'm' then 'materialized view' when 'S' then 'sequence' else 'table' end as kind
        from pg_class c
        where c.relnamespace = 'public'::regnamespace and c.relkind in ('r', 'p', 'v', 'm', 'S')
          and not exists (select 1 from pg_depend d where d.objid = c.oid and d.deptype = 'e')
        order by array_position(array['v', 'm', 'p', 'r', 'S']::"char"[], c.relkind)
      loop execute format('drop %s if exists %s cascade', it.kind, it.name); end loop;
      for it in select p.oid::regprocedure::text as name from pg_proc p
        where p.pronamespace = 'public'::regnamespace
          and not exists (select 1 from pg_depend d where d.objid = p.oid and d.deptype = 'e')
      loop execute format('drop routine if exists %s cascade', it.name); end loop;
    end $$`);
}
