import "server-only";
import { getDb } from "@/db/client";
import { type AnchorFilter, listAnchorRows } from "@/db/repositories/anchor-list";
import { listSpanRows } from "@/db/repositories/span-read";
import { audience } from "@/lib/policy/audience";
import { summaryView } from "@/lib/queries/anchor-view";
import type { MapFeatures } from "@/lib/schemas/views/map";
import type { Actor } from "@/lib/shared/actor";

/** More than a village register has; tiles take over beyond it. */
const MOST_ANCHORS = 5000;

/** Anchors and spans as two GeoJSON collections, narrowed and rounded like every other output. */
export async function mapFeatures(actor: Actor, filter: AnchorFilter = {}): Promise<MapFeatures> {
  const db = getDb();
  const who = audience(actor);
  const [anchors, spans] = await Promise.all([
    listAnchorRows(db, who, filter, { limit: MOST_ANCHORS, after: null }),
    listSpanRows(db, who, filter.areaSlug === undefined ? {} : { areaSlug: filter.areaSlug }),
  ]);
  return {
    anchors: {
      type: "FeatureCollection",
      features: anchors.map((row) => {
        const { point, ...properties } = summaryView(row, actor);
        return { type: "Feature", id: properties.id, geometry: point, properties };
      }),
    },
    spans: {
      type: "FeatureCollection",
      features: spans.map(({ id, name, lengthM, a, b }) => ({
        type: "Feature",
        id,
        geometry: {
          type: "LineString",
          coordinates: [
            [a.lon, a.lat],
            [b.lon, b.lat],
          ],
        },
        properties: {
          id,
          name,
          lengthM,
          aCode: a.code,
          bCode: b.code,
          conditions: [a.condition, b.condition],
        },
      })),
    },
  };
}
