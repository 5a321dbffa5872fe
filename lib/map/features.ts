import type { FeatureCollection, LineString, Point } from "geojson";
import { countMarks, type MapAnchor, mapMark, type MapSpan, MARK_RANK, worstOf } from "@/lib/map/map-anchor";
import type { Mark } from "@/lib/map/marks";
import { formatDistanceM } from "@/lib/shared/format";

export interface PointProperties {
  code: string;
  label: string;
  mark: Mark;
  rank: number;
}

/** The anchors that may be drawn where they are. */
export function anchorPoints(anchors: readonly MapAnchor[]): FeatureCollection<Point, PointProperties> {
  return {
    type: "FeatureCollection",
    features: anchors
      .filter((anchor) => anchor.exact)
      .map((anchor) => {
        const mark = mapMark(anchor);
        const properties = { code: anchor.code, label: anchor.label, mark, rank: MARK_RANK[mark] };
        return { type: "Feature", geometry: pointOf(anchor.point.coordinates), properties };
      }),
  };
}

export interface PlaceProperties {
  site: string;
  name: string;
  count: number;
  mark: Mark;
}

/** Sensitive sites: one soft circle each, around a point rounded on purpose. */
export function softPlaces(anchors: readonly MapAnchor[]): FeatureCollection<Point, PlaceProperties> {
  return {
    type: "FeatureCollection",
    features: [...groups(anchors)].flatMap(([site, members]) => {
      const [first] = members;
      const mark = worstOf(countMarks(members));
      if (!first || !mark) return [];
      const properties = { site, name: first.siteName, count: members.length, mark };
      return [{ type: "Feature", geometry: pointOf(first.point.coordinates), properties }];
    }),
  };
}

function groups(anchors: readonly MapAnchor[]): Map<string, MapAnchor[]> {
  const bySite = new Map<string, MapAnchor[]>();
  for (const anchor of anchors) {
    if (anchor.exact) continue;
    bySite.set(anchor.siteSlug, [...(bySite.get(anchor.siteSlug) ?? []), anchor]);
  }
  return bySite;
}

export interface SpanProperties {
  name: string;
  /** Written along the line, as a dimension is. */
  length: string;
  /** The worse end. */
  mark: Mark;
}

export function spanLines(
  spans: readonly MapSpan[],
  anchors: readonly MapAnchor[],
): FeatureCollection<LineString, SpanProperties> {
  const byCode = new Map(anchors.map((anchor) => [anchor.code, anchor]));
  return {
    type: "FeatureCollection",
    features: spans.map(({ name, lengthM, aCode, bCode, coordinates: [a, b] }) => {
      const ends = [byCode.get(aCode), byCode.get(bCode)].filter((end) => end !== undefined);
      // An end that is not known is no proof of a good one.
      const mark = ends.length < 2 ? "not_enough_known" : (worstOf(countMarks(ends)) ?? "not_enough_known");
      return {
        type: "Feature",
        geometry: { type: "LineString", coordinates: [[...a], [...b]] },
        properties: { name, length: formatDistanceM(lengthM), mark },
      };
    }),
  };
}

export type Bounds = [west: number, south: number, east: number, north: number];

/** Around every point, in degrees; null when there is none. Not for places across the antimeridian. */
export function boundsOf(anchors: readonly MapAnchor[]): Bounds | null {
  const [first] = anchors;
  if (!first) return null;
  const [lon, lat] = first.point.coordinates;
  return anchors.reduce<Bounds>(
    (
      [west, south, east, north],
      {
        point: {
          coordinates: [x, y],
        },
      },
    ) => [Math.min(west, x), Math.min(south, y), Math.max(east, x), Math.max(north, y)],
    [lon, lat, lon, lat],
  );
}

function pointOf([lon, lat]: readonly [number, number]): Point {
  return { type: "Point", coordinates: [lon, lat] };
}
