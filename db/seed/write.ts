import { sql } from "drizzle-orm";
import type { PgTable } from "drizzle-orm/pg-core";
import type { Tx } from "@/db/client";
import * as schema from "@/db/schema";
import type { Book } from "@/db/seed/book";
import { rounded } from "@/db/seed/island/coast";
import type { Places } from "@/db/seed/island/places";
import type { LonLat } from "@/db/columns/point";

/** How far the generated shore may lie from "the real one", and how far out no other land lies. */
const COAST_SOURCE = "Isle of Tarrow coast";
const COAST_ERROR_M = 5;
const COAST_COVERS_M = 60_000;
const ROWS_AT_ONCE = 500;

/** Inserts the whole book, table by table in the order the references want. */
export async function writeBook(tx: Tx, book: Book, places: Places): Promise<void> {
  await writeCoast(tx, places);
  await rows(tx, schema.areas, book.areas);
  await rows(tx, schema.sites, book.sites);
  await rows(tx, schema.boltTypes, book.boltTypes);
  await rows(tx, schema.adhesives, book.adhesives);
  await rows(tx, schema.webbings, book.webbings);
  await rows(tx, schema.anchors, book.anchors);
  await rows(tx, schema.rockBodies, book.rockBodies);
  await rows(tx, schema.placements, book.placements);
  await rows(tx, schema.edges, book.edges);
  await rows(tx, schema.fittings, book.fittings);
  await rows(tx, schema.bolts, book.bolts);
  await rows(tx, schema.pullTests, book.pullTests);
  await rows(tx, schema.spans, book.spans);
  await rows(tx, schema.spanRigs, book.spanRigs);
  await rows(tx, schema.kits, book.kits);
  await rows(tx, schema.lineLog, book.lineLog);
  await rows(tx, schema.closures, book.closures);
  await rows(tx, schema.batchWarnings, book.batchWarnings);
  await rows(tx, schema.reports, book.reports);
  await rows(tx, schema.reboltJobs, book.reboltJobs);
  await rows(tx, schema.reboltJobPlacements, book.reboltJobPlacements);
  await rows(tx, schema.reboltJobAssignees, book.reboltJobAssignees);
  await rows(tx, schema.watches, book.watches);
  await rows(tx, schema.events, book.events);
  await measure(tx);
}

/** One insert for many rows, a few hundred at a time: a statement has a limit of parameters. */
async function rows<T extends PgTable>(tx: Tx, table: T, all: T["$inferInsert"][]): Promise<void> {
  for (let start = 0; start < all.length; start += ROWS_AT_ONCE) {
    await tx.insert(table).values(all.slice(start, start + ROWS_AT_ONCE));
  }
}

/** The three shores as lines: a distance to an area would be nothing for whoever stands in it. */
async function writeCoast(tx: Tx, { shore, stackShore, skerryShore }: Places): Promise<void> {
  await tx.insert(schema.coastline).values(
    [shore, stackShore, skerryShore].map((ring) => ({
      source: COAST_SOURCE,
      errorM: COAST_ERROR_M,
      coversM: COAST_COVERS_M,
      geom: line(ring),
    })),
  );
}

function line(ring: readonly LonLat[]): string {
  return `SRID=4326;LINESTRING(${ring.map(({ lon, lat }) => `${rounded(lon)} ${rounded(lat)}`).join(",")})`;
}

/** What only the database measures on the ellipsoid: spans, and distances to the sea nobody taped. */
async function measure(tx: Tx): Promise<void> {
  await tx.execute(sql`
    update ${schema.spans} set length_m = ST_Distance(a.point::geography, b.point::geography)
    from ${schema.anchors} a, ${schema.anchors} b
    where a.id = spans.anchor_a_id and b.id = spans.anchor_b_id`);
  await tx.execute(sql`
    update ${schema.anchors} set
      sea_distance_m = nearest.metres,
      sea_distance_source = 'coast',
      sea_distance_error_m = nearest.error_m + coalesce(anchors.point_error_m, 0)
    from (
      select a.id, min(ST_Distance(a.point::geography, c.geom::geography)) as metres, max(c.error_m) as error_m
      from ${schema.anchors} a cross join ${schema.coastline} c
      where a.sea_distance_source is null
      group by a.id
    ) nearest
    where nearest.id = anchors.id`);
}
