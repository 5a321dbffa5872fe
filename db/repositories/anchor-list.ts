import "server-only";
import { and, asc, eq, gt, inArray, or, type SQL, sql } from "drizzle-orm";
import type { Handle } from "@/db/client";
import {
  anchorEval,
  anchors,
  areas,
  boltTypes,
  bolts,
  findings,
  placements,
  reports,
  sites,
} from "@/db/schema";
import { seesExactly, shownPoint, visibleAnchors } from "@/db/repositories/visibility";
import type { Condition, Form, Level, RuleCode, Use, Verdict } from "@/lib/domain/vocabulary";
import type { Audience } from "@/lib/shared/audience";

/** West, south, east, north in degrees. West greater than east crosses the antimeridian. */
export type Box = readonly [number, number, number, number];

export interface AnchorFilter {
  bbox?: Box;
  areaSlug?: string;
  siteSlug?: string;
  codes?: readonly string[];
  use?: Use;
  condition?: readonly Condition[];
  verdict?: Verdict;
  finding?: RuleCode;
  metal?: string;
  form?: Form;
  /** Leaves out sensitive sites the audience is not a member of: the answer would give their distance away. */
  seaWithinM?: number;
  /** Words in label, code, site or row name. */
  q?: string;
  near?: { lon: number; lat: number };
}

export interface PageRequest {
  limit: number;
  after: { code: string; distanceM: number | null } | null;
}

/** What is known of hand checks and installs: the newest date a person had a hand on the anchor. */
export const lastCheckSql = sql<string | null>`(
  select max(d)::date::text from (
    select r.observed_at::date as d from ${reports} r
      where r.anchor_id = ${anchors.id} and r.kind = 'routine_check' and r.depth <> 'seen' and r.state <> 'struck'
    union all
    select b.installed_on from ${bolts} b join ${placements} p on p.id = b.placement_id
      where p.anchor_id = ${anchors.id} and b.removed_on is null and b.struck_at is null
        and b.installed_on_precision <> 'before'
  ) checks)`;

const boltCountSql = sql<number>`(
  select count(*)::int from ${bolts} b join ${placements} p on p.id = b.placement_id
  where p.anchor_id = ${anchors.id} and b.removed_on is null and b.struck_at is null)`;

/** How each bolt in force is fixed and what it is made of, each pair told once. */
const hardwareSql = sql<{ form: Form; metal: string | null }[]>`(
  select coalesce(json_agg(json_build_object('form', h.form, 'metal', h.metal) order by h.form, h.metal), '[]'::json)
  from (select distinct b.form, coalesce(b.bolt_metal, t.bolt_metal) as metal
        from ${bolts} b join ${placements} p on p.id = b.placement_id left join ${boltTypes} t on t.id = b.bolt_type_id
        where p.anchor_id = ${anchors.id} and b.removed_on is null and b.struck_at is null) h)`;

const openReportsSql = sql<number>`(
  select count(*)::int from ${reports} r where r.anchor_id = ${anchors.id} and r.state = 'open')`;

/** The worst three reasons, each told once. */
const reasonsSql = sql<{ code: RuleCode; level: Level; title: string }[]>`(
  select coalesce(json_agg(json_build_object('code', w.code, 'level', w.level, 'title', w.title) order by w.rank), '[]'::json)
  from (select f.code, f.level, f.title, array_position(array['stop','ask','limit','note'], f.level) as rank
        from ${findings} f where f.anchor_id = ${anchors.id} group by f.code, f.level, f.title
        order by rank, f.code limit 3) w)`;

/** Rows of lists and panels, narrowed to what the audience may know. */
export async function listAnchorRows(db: Handle, who: Audience, filter: AnchorFilter, page: PageRequest) {
  const distance = filter.near ? distanceTo(who, filter.near) : null;
  const rows = await db
    .select({
      id: anchors.id,
      code: anchors.code,
      label: anchors.label,
      areaId: sites.areaId,
      areaSlug: areas.slug,
      siteSlug: sites.slug,
      siteName: sites.name,
      siteVisibility: sites.visibility,
      uses: anchors.uses,
      rowName: anchors.rowName,
      condition: anchors.condition,
      verdict: anchorEval.verdict,
      utilisation: anchorEval.utilisation,
      lon: sql<number>`ST_X(${shownPoint(who)})`,
      lat: sql<number>`ST_Y(${shownPoint(who)})`,
      seaDistanceM: anchors.seaDistanceM,
      boltCount: boltCountSql,
      hardware: hardwareSql,
      openReports: openReportsSql,
      lastCheckOn: lastCheckSql,
      reasons: reasonsSql,
      distanceM: distance ? sql<number>`${distance}` : sql<null>`null`,
    })
    .from(anchors)
    .innerJoin(sites, eq(sites.id, anchors.siteId))
    .innerJoin(areas, eq(areas.id, sites.areaId))
    .leftJoin(anchorEval, eq(anchorEval.anchorId, anchors.id))
    .where(and(visibleAnchors(who), ...conditionsOf(who, filter), after(page, distance)))
    .orderBy(...(distance ? [asc(distance), asc(anchors.code)] : [asc(anchors.code)]))
    .limit(page.limit);
  return rows;
}

export type AnchorListRow = Awaited<ReturnType<typeof listAnchorRows>>[number];

/** How many fit, whatever the page. */
export async function countAnchors(db: Handle, who: Audience, filter: AnchorFilter): Promise<number> {
  const [row] = await db
    .select({ n: sql<number>`count(*)::int` })
    .from(anchors)
    .innerJoin(sites, eq(sites.id, anchors.siteId))
    .innerJoin(areas, eq(areas.id, sites.areaId))
    .leftJoin(anchorEval, eq(anchorEval.anchorId, anchors.id))
    .where(and(visibleAnchors(who), ...conditionsOf(who, filter)));
  return row?.n ?? 0;
}

function conditionsOf(who: Audience, filter: AnchorFilter): (SQL | undefined)[] {
  return [
    filter.bbox && insideBox(who, filter.bbox),
    filter.areaSlug === undefined ? undefined : eq(areas.slug, filter.areaSlug),
    filter.siteSlug === undefined ? undefined : eq(sites.slug, filter.siteSlug),
    filter.codes && (filter.codes.length > 0 ? inArray(anchors.code, [...filter.codes]) : sql`false`),
    filter.use && sql`${filter.use} = any(${anchors.uses})`,
    filter.condition && inArray(anchors.condition, [...filter.condition]),
    filter.verdict && eq(anchorEval.verdict, filter.verdict),
    filter.finding && sql`${filter.finding} = any(${anchorEval.codes})`,
    filter.metal === undefined
      ? undefined
      : hasBolt(
          sql`(${filter.metal} in (b.bolt_metal, b.hanger_metal, b.link_metal, t.bolt_metal, t.hanger_metal, t.link_metal))`,
        ),
    filter.form && hasBolt(sql`b.form = ${filter.form}`),
    filter.seaWithinM === undefined
      ? undefined
      : and(seesExactly(who), sql`${anchors.seaDistanceM} <= ${filter.seaWithinM}`),
    filter.q === undefined || filter.q.trim() === "" ? undefined : matches(filter.q),
  ];
}

function hasBolt(condition: SQL): SQL {
  return sql`exists (
    select 1 from bolts b join placements p on p.id = b.placement_id left join bolt_types t on t.id = b.bolt_type_id
    where p.anchor_id = ${anchors.id} and b.removed_on is null and b.struck_at is null and ${condition})`;
}

function matches(q: string): SQL | undefined {
  const pattern = `%${q.trim().replace(/[\\%_]/g, (sign) => `\\${sign}`)}%`;
  return or(
    sql`${anchors.label} ilike ${pattern}`,
    sql`${anchors.code} ilike ${pattern}`,
    sql`${anchors.rowName} ilike ${pattern}`,
    sql`${sites.name} ilike ${pattern}`,
  );
}

function insideBox(who: Audience, [west, south, east, north]: Box): SQL | undefined {
  const point = shownPoint(who);
  const box = (w: number, e: number) =>
    sql`ST_Intersects(${point}, ST_MakeEnvelope(${w}, ${south}, ${e}, ${north}, 4326))`;
  return west <= east ? box(west, east) : or(box(west, 180), box(-180, east));
}

function distanceTo(who: Audience, { lon, lat }: { lon: number; lat: number }): SQL {
  return sql`ST_Distance((${shownPoint(who)})::geography, ST_SetSRID(ST_MakePoint(${lon}, ${lat}), 4326)::geography)`;
}

function after({ after: last }: PageRequest, distance: SQL | null): SQL | undefined {
  if (!last) return undefined;
  if (!distance || last.distanceM === null) return gt(anchors.code, last.code);
  return sql`(${distance}, ${anchors.code}) > (${last.distanceM}, ${last.code})`;
}
