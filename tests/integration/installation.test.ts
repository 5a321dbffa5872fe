import { eq, sql } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { Db } from "@/db/client";
import { migrateDatabase } from "@/db/migrate";
import { dropEverything, installationKind } from "@/db/repositories/installation";
import { anchorEval, users } from "@/db/schema";
import { reevaluateOutdated } from "@/lib/commands/evaluation/reevaluate-outdated";
import { ENGINE_VERSION } from "@/lib/domain/finding/engine";
import { freshDatabase } from "@/tests/support/fresh-database";
import { addArea, addCast, addPerson, NOON } from "@/tests/support/people";
import { addRegister } from "@/tests/support/register";

const opened: (() => Promise<void>)[] = [];
afterAll(async () => {
  await Promise.all(opened.map((drop) => drop()));
});

async function open(name: string): Promise<Db> {
  const { db, drop } = await freshDatabase(name);
  opened.push(drop);
  return db;
}

async function ourTables(db: Db): Promise<string[]> {
  const rows = await db.execute<{ name: string }>(
    sql`select relname as name from pg_class where relnamespace = 'public'::regnamespace and relkind in ('r', 'S')
      and not exists (select 1 from pg_depend where objid = pg_class.oid and deptype = 'e') order by 1`,
  );
  return rows.map((row) => row.name);
}

describe("a database", () => {
  it("is empty, then a real register as soon as it knows somebody, and a demo when it has a demo account", async () => {
    const db = await open("installation_kind");
    expect(await installationKind(db)).toBe("empty");
    const { userId } = await addPerson(db);
    expect(await installationKind(db)).toBe("real");
    await db.update(users).set({ isDemo: true }).where(eq(users.id, userId));
    expect(await installationKind(db)).toBe("demo");
  });

  it("that is emptied keeps PostGIS and nothing of ours, and can be migrated again", async () => {
    const db = await open("installation_drop");
    await addCast(db, await addArea(db));
    const before = await ourTables(db);
    expect(before).toContain("anchors");
    await dropEverything(db);
    expect(await ourTables(db)).toEqual([]);
    const functions = await db.execute(sql`select 1 from pg_proc where proname = 'refuse_change'`);
    expect(functions).toHaveLength(0);
    await migrateDatabase(db);
    expect(await ourTables(db)).toEqual(before);
    expect(await installationKind(db)).toBe("empty");
  });
});

describe("before a new version serves", () => {
  let db: Db;
  beforeAll(async () => {
    db = await open("installation_rules");
    const areaId = await addArea(db);
    await addRegister(db, { areaId, ...(await addCast(db, areaId)) });
    // Reports and warnings were added behind the back of the anchors' verdicts.
    await db.delete(anchorEval);
    await reevaluateOutdated(db, NOON);
  });

  it("an anchor judged by other rules is judged again, and only that one", async () => {
    expect(await reevaluateOutdated(db, NOON)).toBe(0);
    const [one] = await db.select().from(anchorEval).limit(1);
    if (!one) throw new Error("The register has anchors with verdicts.");
    const old = { engineVersion: "0.0.0", verdict: "nothing_against", findingCount: 0 } as const;
    await db.update(anchorEval).set(old).where(eq(anchorEval.anchorId, one.anchorId));
    expect(await reevaluateOutdated(db, NOON)).toBe(1);
    const [again] = await db.select().from(anchorEval).where(eq(anchorEval.anchorId, one.anchorId));
    expect(again).toMatchObject({
      engineVersion: ENGINE_VERSION,
      verdict: one.verdict,
      findingCount: one.findingCount,
    });
  });

  it("an anchor without a verdict gets one", async () => {
    const all = await db.select().from(anchorEval);
    expect(all.length).toBeGreaterThan(1);
    await db.delete(anchorEval);
    expect(await reevaluateOutdated(db, NOON)).toBe(all.length);
    expect(await db.select().from(anchorEval)).toHaveLength(all.length);
  });
});
