// npm run tiles - writes the map's ground to public/tiles: the world's land and the invented island.
// Both come out the same every time, so the files are kept in the repository.
import { mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { createRequire } from "node:module";
import path from "node:path";
import type { Feature as GeoFeature, FeatureCollection, Position } from "geojson";
import { feature } from "topojson-client";
import type { GeometryCollection, Topology } from "topojson-specification";
import type { LonLat } from "@/db/columns/point";
import { islandFeatures } from "@/db/seed/island/features";
import { places } from "@/db/seed/island/places";

const folder = path.join(import.meta.dirname, "..", "public", "tiles");
/** Land at 1:50 million is off by kilometres: two decimals of a degree, about 1 km, lose nothing. */
const LAND_DECIMALS = 2;
/** Points nearer than this to the one before are left out. */
const LAND_STEP_DEG = 0.07;

function position({ lon, lat }: LonLat): Position {
  return [lon, lat];
}

function tarrow(): FeatureCollection {
  const at = places();
  const land = (name: string, ring: readonly LonLat[]): GeoFeature => ({
    type: "Feature",
    properties: { kind: "land", name },
    geometry: { type: "Polygon", coordinates: [ring.map(position)] },
  });
  return {
    type: "FeatureCollection",
    features: [
      land("Isle of Tarrow", at.shore),
      land("Pillar Stack", at.stackShore),
      // No name: only members know what is on it.
      land("", at.skerryShore),
      ...islandFeatures(at).map(({ kind, name, points }): GeoFeature => {
        const [first] = points.map(position);
        const isLabel = points.length === 1 && first !== undefined;
        return {
          type: "Feature",
          properties: { kind, name },
          geometry: isLabel
            ? { type: "Point", coordinates: first }
            : { type: "LineString", coordinates: points.map(position) },
        };
      }),
    ],
  };
}

/** Natural Earth's land polygons as one collection, coordinates rounded and thinned. */
function worldLand(): FeatureCollection {
  const file = createRequire(import.meta.url).resolve("world-atlas/land-50m.json");
  const topology: Topology<{ land: GeometryCollection }> = JSON.parse(readFileSync(file, "utf8"));
  const collection = feature(topology, topology.objects.land);
  return {
    type: "FeatureCollection",
    features: collection.features.flatMap(({ geometry }) =>
      geometry.type === "MultiPolygon"
        ? [
            {
              type: "Feature",
              properties: {},
              geometry: {
                type: "MultiPolygon",
                coordinates: geometry.coordinates
                  .map((polygon) => polygon.map(thinned).filter((ring) => ring.length >= 4))
                  .filter((polygon) => polygon.length > 0),
              },
            } satisfies GeoFeature,
          ]
        : [],
    ),
  };
}

function thinned(ring: readonly Position[]): Position[] {
  return ring
    .map((at) => at.map((degrees) => Number(degrees.toFixed(LAND_DECIMALS))))
    .reduce<Position[]>((kept, at, index) => {
      const before = kept.at(-1);
      // The last point closes the ring and stays.
      return index === ring.length - 1 || before === undefined || apart(before, at) >= LAND_STEP_DEG
        ? [...kept, at]
        : kept;
    }, []);
}

function apart([fromLon = 0, fromLat = 0]: Position, [toLon = 0, toLat = 0]: Position): number {
  return Math.hypot(toLon - fromLon, toLat - fromLat);
}

mkdirSync(folder, { recursive: true });
for (const [name, collection] of [
  ["tarrow.geojson", tarrow()],
  ["land.geojson", worldLand()],
] as const) {
  const text = `${JSON.stringify(collection)}\n`;
  writeFileSync(path.join(folder, name), text);
  process.stdout.write(
    `${name}: ${collection.features.length} features, ${Math.round(text.length / 1024)} KB\n`,
  );
}
