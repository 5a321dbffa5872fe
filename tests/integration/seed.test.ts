import { readFileSync } from "node:fs";
import path from "node:path";
import { verify } from "@node-rs/argon2";
import { getTableName, is, sql } from "drizzle-orm";
import { PgTable } from "drizzle-orm/pg-core";
import geodesic from "geographiclib-geodesic";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { Db } from "@/db/client";
import * as schema from "@/db/schema";
import { seedTarrow } from "@/db/seed";
import { reevaluateAll } from "@/lib/commands/evaluation/reevaluate-all";
import { freshDatabase } from "@/tests/support/fresh-database";

// Expected numbers are those the product's description gives for its demonstration island, not our own output.
const NOW = new Date("2026-10-20T12:00:00Z");

let db: Db;
let twin: Db;
const drops: (() => Promise<void>)[] = [];

beforeAll(async () => {
  const first = await freshDatabase("seed_first");
  const second = await freshDatabase("seed_second");
  drops.push(first.drop, second.drop);
  [db, twin] = [first.db, second.db];
  await seedTarrow(db, NOW);
  await seedTarrow(twin, NOW);
}, 60_000);

afterAll(() => Promise.all(drops.map((drop) => drop())));

const count = (table: PgTable) => db.$count(table);

async function rows<T extends Record<string, unknown>>(query: ReturnType<typeof sql>) {
  return [...(await db.execute<T>(query))];
}

describe("the Isle of Tarrow", () => {
  it("has the records its description promises", async () => {
    expect(await count(schema.anchors)).toBeGreaterThanOrEqual(110);
    expect(await count(schema.anchors)).toBeLessThanOrEqual(130);
    expect(await count(schema.bolts)).toBeGreaterThanOrEqual(380);
    expect(await count(schema.bolts)).toBeLessThanOrEqual(440);
    expect(await count(schema.boltTypes)).toBe(25);
    expect(await count(schema.reports)).toBe(60);
    expect(await count(schema.webbings)).toBe(5);
    const forms = await rows(sql`select distinct form from bolt_types`);
    expect(forms).toHaveLength(6);
  });

  it("has six sites in the open area, one of them sensitive, and a small area only members see", async () => {
    const sites = await rows<{ area: string; seen: string; slug: string; visibility: string }>(sql`
      select a.slug as area, a.visibility as seen, s.slug, s.visibility from sites s join areas a on a.id = s.area_id order by s.slug`);
    expect(sites.filter(({ area }) => area === "tarrow").map(({ slug }) => slug)).toEqual([
      "crown-moor",
      "fellgate-wall",
      "gannet-cleft",
      "lowden-quarry",
      "pillar-stack",
      "the-undercroft",
    ]);
    expect(sites.filter(({ visibility }) => visibility === "sensitive").map(({ slug }) => slug)).toEqual([
      "the-undercroft",
    ]);
    expect(sites.filter(({ area }) => area === "skerry")).toEqual([
      expect.objectContaining({ seen: "members" }),
    ]);
  });

  it("measures 44 by 30 kilometres", async () => {
    const [size] = await rows<{ wide: number; high: number }>(sql`
      with shore as (select geom from coastline order by ST_NPoints(geom) desc limit 1),
      middle as (select ST_YMin(geom) as south, ST_YMax(geom) as north, ST_XMin(geom) as west, ST_XMax(geom) as east from shore)
      select ST_Distance(ST_Point(west, (south + north) / 2, 4326)::geography, ST_Point(east, (south + north) / 2, 4326)::geography) as wide,
        ST_Distance(ST_Point(west, south, 4326)::geography, ST_Point(west, north, 4326)::geography) as high
      from middle`);
    expect(Math.abs((size?.wide ?? 0) - 44_000)).toBeLessThan(250);
    expect(Math.abs((size?.high ?? 0) - 30_000)).toBeLessThan(250);
  });

  it.each([
    ["gannet-cleft", 60, 250],
    ["the-undercroft", 80, 100],
    ["pillar-stack", 0, 60],
    ["lowden-quarry", 2_200, 2_600],
    ["fellgate-wall", 5_800, 6_200],
    ["crown-moor", 10_000, 16_000],
  ])("keeps every anchor of %s between %d and %d m from its shore", async (slug, nearM, farM) => {
    const [found] = await rows<{ near: number; far: number }>(sql`
      select min(m) as near, max(m) as far from (
        select min(ST_Distance(a.point::geography, c.geom::geography)) as m
        from anchors a join sites s on s.id = a.site_id cross join coastline c where s.slug = ${slug} group by a.id) d`);
    expect(found?.near).toBeGreaterThanOrEqual(nearM);
    expect(found?.far).toBeLessThanOrEqual(farM);
  });

  it("stands on land", async () => {
    const afloat = await rows(sql`
      select a.label from anchors a where not exists (
        select 1 from coastline c where ST_Contains(ST_MakePolygon(c.geom), a.point))`);
    expect(afloat).toEqual([]);
  });

  it.each([
    ["Throat", 62],
    ["Waist", 118],
    ["Mouth", 205],
    ["Stack line", 96],
    ["Little Moor", 190],
    ["Long Moor", 480],
  ])("spans %s over %d m, as geographiclib measures it", async (name, nominalM) => {
    const [span] = await rows<{ m: number; a: string; b: string }>(sql`
      select s.length_m as m, ST_Y(a.point) || ' ' || ST_X(a.point) as a, ST_Y(b.point) || ' ' || ST_X(b.point) as b
      from spans s join anchors a on a.id = s.anchor_a_id join anchors b on b.id = s.anchor_b_id where s.name = ${name}`);
    const [latA = NaN, lonA = NaN] = (span?.a ?? "").split(" ").map(Number);
    const [latB = NaN, lonB = NaN] = (span?.b ?? "").split(" ").map(Number);
    const outside = geodesic.Geodesic.WGS84.Inverse(latA, lonA, latB, lonB).s12 ?? NaN;
    expect(Math.abs((span?.m ?? NaN) - outside)).toBeLessThan(0.001);
    expect(Math.abs(outside - nominalM)).toBeLessThan(0.5);
  });

  it("lets the demo accounts in with the printed password, each with its role", async () => {
    const people = await rows<{ email: string; password_hash: string; role: string | null }>(sql`
      select u.email, u.password_hash, (select m.role from memberships m join areas a on a.id = m.area_id
        where m.user_id = u.id and a.slug = 'tarrow') as role from users u order by u.email`);
    expect(people.map(({ email, role }) => [email.split("@")[0], role])).toEqual([
      ["admin", null],
      ["bolter", "bolter"],
      ["rigger", "rigger"],
      ["steward", "steward"],
      ["visitor", null],
    ]);
    for (const { password_hash } of people) {
      expect(password_hash).toMatch(/^\$argon2id\$/);
      expect(await verify(password_hash, "tarrow-demo-2026")).toBe(true);
    }
  });

  it("tells nothing that lies in the future, and no bolt that went before it came", async () => {
    const [late] = await rows<{ n: string }>(sql`
      select (select count(*) from bolts where installed_on > ${NOW.toISOString()}::date or removed_on > ${NOW.toISOString()}::date)
        + (select count(*) from reports where observed_at > ${NOW.toISOString()} or handled_at > ${NOW.toISOString()})
        + (select count(*) from events where at > ${NOW.toISOString()})
        + (select count(*) from bolts where removed_on < installed_on)
        + (select count(*) from bolts b join bolts old on old.id = b.replaces_bolt_id
            where b.installed_on < old.installed_on or b.placement_id <> old.placement_id or old.removed_on is null) as n`);
    expect(Number(late?.n)).toBe(0);
  });

  it("leaves about a dozen reports unanswered and a queue in every state, two jobs with the bolter", async () => {
    const [open] = await rows<{ n: string }>(sql`select count(*) as n from reports where state = 'open'`);
    expect(Number(open?.n)).toBe(12);
    const states = await rows(sql`select distinct state from rebolt_jobs`);
    expect(states).toHaveLength(4);
    const [given] = await rows<{ n: string }>(sql`
      select count(*) as n from rebolt_jobs j join rebolt_job_assignees a on a.job_id = j.id join users u on u.id = a.user_id
      where j.state = 'accepted' and u.email like 'bolter@%'`);
    expect(Number(given?.n)).toBe(2);
  });

  it("comes out the same every time", async () => {
    const all = Object.values(schema).flatMap((one) => (is(one, PgTable) ? [one] : []));
    const digest = async (of: Db, name: string) => {
      const columns = name === "users" ? sql`(to_jsonb(t) - 'password_hash')` : sql`to_jsonb(t)`;
      const [row] = await of.execute<{ digest: string | null }>(sql`
        select md5(string_agg(${columns}::text, '|' order by ${columns}::text)) as digest from ${sql.identifier(name)} t`);
      return [name, row?.digest];
    };
    for (const table of all) {
      const name = getTableName(table);
      expect(await digest(db, name)).toEqual(await digest(twin, name));
    }
  });

  it("shows no way, name or water near the site that is kept private", async () => {
    const file = path.join(import.meta.dirname, "..", "..", "public", "tiles", "tarrow.geojson");
    const drawn = readFileSync(file, "utf8");
    const [near] = await rows<{ n: string; lines: string }>(sql`
      with f as (select jsonb_array_elements(${drawn}::jsonb -> 'features') as f)
      select count(*) as lines, count(*) filter (where ST_DWithin(
        ST_SetSRID(ST_GeomFromGeoJSON(f -> 'geometry'), 4326)::geography, s.point::geography, 1500)) as n
      from f, sites s where s.slug = 'the-undercroft' and f -> 'properties' ->> 'kind' <> 'land'`);
    expect(Number(near?.lines)).toBeGreaterThan(20);
    expect(Number(near?.n)).toBe(0);
    expect(drawn).not.toMatch(/Undercroft|Skerry/);
  });
});

describe("the island judged", () => {
  beforeAll(async () => {
    expect(await reevaluateAll(db, { now: NOW })).toBe(await count(schema.anchors));
  }, 60_000);

  it("finds nothing against most ordinary protection bolts, or only limits", async () => {
    const verdicts = await rows<{ verdict: string; n: string }>(sql`
      select e.verdict, count(*) as n from bolt_eval e join anchors a on a.id = e.anchor_id join sites s on s.id = a.site_id
      where a.uses = '{protection}' and s.slug <> 'the-undercroft' group by 1`);
    const n = (...names: string[]) =>
      verdicts.filter(({ verdict }) => names.includes(verdict)).reduce((sum, row) => sum + Number(row.n), 0);
    const all = n("nothing_against", "within_limits", "not_enough_known", "do_not_use");
    expect(n("nothing_against", "within_limits") / all).toBeGreaterThan(0.85);
    expect(n("nothing_against") / all).toBeGreaterThan(0.5);
  });

  it("has some of every verdict", async () => {
    const verdicts = await rows<{ verdict: string; part: number }>(sql`
      select verdict, count(*)::float / sum(count(*)) over () as part from bolt_eval group by 1 order by 1`);
    expect(verdicts.map(({ verdict }) => verdict)).toEqual([
      "do_not_use",
      "not_enough_known",
      "nothing_against",
      "within_limits",
    ]);
    const stopped = verdicts.find(({ verdict }) => verdict === "do_not_use")?.part;
    expect(stopped).toBeLessThan(0.2);
    expect(stopped).toBeGreaterThan(0.03);
  });

  it("stops every steel below class IV in the sea cave", async () => {
    const steel = await rows<{ verdict: string }>(sql`
      select e.verdict from bolt_eval e join bolts b on b.id = e.bolt_id join bolt_types t on t.id = b.bolt_type_id
      join anchors a on a.id = e.anchor_id join sites s on s.id = a.site_id
      where s.slug = 'the-undercroft' and t.bolt_metal in ('1.4301', '1.4307', '1.4401', '1.4404')`);
    expect(steel.length).toBeGreaterThan(10);
    expect(new Set(steel.map(({ verdict }) => verdict))).toEqual(new Set(["do_not_use"]));
  });

  it("keeps the anchor whose bolt the storm bent out of use, with its reason and its queue entry", async () => {
    const [bent] = await rows<{ condition: string; code: string; state: string; angle: number }>(sql`
      select a.condition, f.code, j.state, (r.measured ->> 'bendAngleDeg')::float as angle
      from reports r join anchors a on a.id = r.anchor_id join sites s on s.id = a.site_id
      join findings f on f.bolt_id = r.bolt_id and f.level = 'stop'
      join rebolt_jobs j on j.opened_by_report_id = r.id
      where r.kind = 'deformation' and r.state = 'open' and s.slug = 'crown-moor'`);
    expect(bent).toEqual({ condition: "out_of_use", code: "care.report-open", state: "accepted", angle: 70 });
  });

  it("warns about the glue batch, and asks where the batch was not written down", async () => {
    const levels = await rows<{ level: string }>(sql`
      select distinct level from findings where code = 'record.warning' order by level`);
    expect(levels.map(({ level }) => level)).toEqual(["ask", "limit"]);
  });
});
