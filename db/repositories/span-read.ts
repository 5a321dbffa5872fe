import "server-only";
import { type SQL, sql } from "drizzle-orm";
import type { Handle } from "@/db/client";
import { anchors, areas, sites } from "@/db/schema";
import { seesExactly, visibleAnchors } from "@/db/repositories/visibility";
import type { Condition, Verdict } from "@/lib/domain/vocabulary";
import type { Audience } from "@/lib/shared/audience";

interface SpanEndRow {
  id: string;
  code: string;
  label: string;
  siteId: string;
  siteName: string;
  areaId: string;
  condition: Condition;
  verdict: Verdict | null;
  lon: number;
  lat: number;
  elevationM: number | null;
}

export interface SpanRow extends Record<string, unknown> {
  id: string;
  version: number;
  name: string;
  note: string | null;
  areaSlug: string;
  lengthM: number;
  bearingDeg: number;
  rig: Record<string, unknown> | null;
  a: SpanEndRow;
  b: SpanEndRow;
}

export interface SpanFilter {
  id?: string;
  anchorId?: string;
  areaSlug?: string;
}

/**
 * Spans whose two anchors the audience may see exactly: a line between two places gives both away, so a span
 * at a sensitive site exists for members only.
 */
export async function listSpanRows(db: Handle, who: Audience, filter: SpanFilter = {}): Promise<SpanRow[]> {
  const rows = await db.execute<SpanRow>(sql`
    select s.id, s.version, s.name, s.note, ar.slug as "areaSlug", s.length_m as "lengthM",
      degrees(ST_Azimuth(a.point::geography, b.point::geography)) as "bearingDeg",
      (select r.rig from span_rigs r where r.span_id = s.id order by r.version_no desc limit 1) as rig,
      ${end("a")} as a, ${end("b")} as b
    from spans s
    join areas ar on ar.id = s.area_id
    join anchors a on a.id = s.anchor_a_id join sites sa on sa.id = a.site_id
    join anchors b on b.id = s.anchor_b_id join sites sb on sb.id = b.site_id
    left join anchor_eval ea on ea.anchor_id = a.id left join anchor_eval eb on eb.anchor_id = b.id
    where s.struck_at is null and ${shown(who, "a")} and ${shown(who, "b")}
      ${filter.id === undefined ? sql`` : sql`and s.id = ${filter.id}`}
      ${filter.anchorId === undefined ? sql`` : sql`and ${filter.anchorId} in (s.anchor_a_id, s.anchor_b_id)`}
      ${filter.areaSlug === undefined ? sql`` : sql`and ar.slug = ${filter.areaSlug}`}
    order by s.length_m, s.name`);
  return [...rows];
}

function end(alias: "a" | "b"): SQL {
  const t = sql.raw(alias);
  return sql`json_build_object('id', ${t}.id, 'code', ${t}.code, 'label', ${t}.label, 'siteId', s${t}.id, 'siteName', s${t}.name,
    'areaId', s${t}.area_id, 'condition', ${t}.condition, 'verdict', e${t}.verdict,
    'lon', ST_X(${t}.point), 'lat', ST_Y(${t}.point), 'elevationM', ${t}.elevation_m)`;
}

function shown(who: Audience, alias: "a" | "b"): SQL {
  return sql`exists (select 1 from ${anchors} join ${sites} on ${sites.id} = ${anchors.siteId}
    join ${areas} on ${areas.id} = ${sites.areaId}
    where ${anchors.id} = ${sql.raw(alias)}.id and ${visibleAnchors(who)} and ${seesExactly(who)})`;
}
