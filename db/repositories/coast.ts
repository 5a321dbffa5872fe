import "server-only";
import { sql } from "drizzle-orm";
import type { LonLat } from "@/db/columns/point";
import type { Handle } from "@/db/client";

export interface SeaDistance {
  distanceM: number;
  /** How far the coastline may lie from the real shore. */
  errorM: number;
  /** The coast it was computed from. */
  source: string;
}

/**
 * Geodesic distance to the nearest recorded shore. Null: no coast on record is near enough to know, because
 * a coast says nothing beyond the distance it covers.
 */
export async function seaDistanceAt(db: Handle, { lon, lat }: LonLat): Promise<SeaDistance | null> {
  const rows = await db.execute<{
    distance_m: number;
    error_m: number;
    source: string;
    covers_m: number;
  }>(sql`
    with here as (select ST_SetSRID(ST_MakePoint(${lon}, ${lat}), 4326) as g),
    near as (
      select c.source, c.error_m, c.covers_m, c.geom from coastline c, here
      order by c.geom <-> here.g limit 8)
    select near.source, near.error_m, near.covers_m,
      ST_Distance(near.geom::geography, here.g::geography) as distance_m
    from near, here order by distance_m limit 1`);
  const [nearest] = rows;
  if (!nearest || nearest.distance_m > nearest.covers_m) return null;
  return { distanceM: nearest.distance_m, errorM: nearest.error_m, source: nearest.source };
}

/** Length of the geodesic between two points on the WGS84 ellipsoid, m. */
export async function geodesicM(db: Handle, a: LonLat, b: LonLat): Promise<number> {
  const [row] = await db.execute<{ m: number }>(sql`
    select ST_Distance(
      ST_SetSRID(ST_MakePoint(${a.lon}, ${a.lat}), 4326)::geography,
      ST_SetSRID(ST_MakePoint(${b.lon}, ${b.lat}), 4326)::geography) as m`);
  return row?.m ?? 0;
}
