import { requireFinite, requirePositive } from "./guard";

type Point = readonly [number, number];
interface Edges {
  uMinM?: number;
  uMaxM?: number;
  vMinM?: number;
  vMaxM?: number;
}

/**
 * How much of its lone-bolt cone each bolt of a group still has, from spacing and free edges.
 *
 * Each bolt breaks out a square of side 3 h around itself; overlaps count once; an edge cuts what lies
 * beyond it.
 *
 *     areaRatio     = area of the union / 9 h²       1 for one bolt far from an edge, n for n apart
 *     psiEdge       = 0.7 + 0.3 c / (1.5 h) <= 1                     c: nearest distance of a bolt to an edge
 *     perBoltFactor = areaRatio psiEdge / n                          equal shares of the group
 *
 *   h  effective depth, m    points (u, v) on the face, m    edges: lines u = uMin …, rock lies between them
 *
 * Axes: with an edge, u and v are taken as given (u along the edge). Without one, u is turned along the pair
 * that lies farthest apart, so that the answer does not depend on how the face was measured.
 * Full strength wants a spacing of 3 h and an edge distance of 1.5 h.
 * Not for: a sideways pull, joints, or bolts of different depth.
 *
 * Source: ACI 318-19 projected areas (A_Nc0 = 9 h², published); psi as in EN 1992-4 and ACI 318-19.
 * Worked example (also a test): a pair 160 mm apart, h 80 mm: area ratio 1.667; 240 mm apart: 2.
 *
 * @throws RangeError when there is no point, h is not positive, or a point lies beyond an edge.
 */
export function groupFactor(i: { pointsM: readonly Point[]; embedM: number; edges?: Edges }): {
  areaRatio: number;
  psiEdge: number;
  perBoltFactor: number;
} {
  requirePositive("embedM", i.embedM);
  if (i.pointsM.length === 0) throw new RangeError("pointsM must hold at least 1 point, got 0");
  for (const [u, v] of i.pointsM) {
    requireFinite("pointsM", u);
    requireFinite("pointsM", v);
  }
  const edges = i.edges ?? {};
  const edgeDistances = distancesToEdges(i.pointsM, edges);
  const points = edgeDistances.length > 0 ? i.pointsM : alongFarthestPair(i.pointsM);

  const areaRatio = unionArea(points, 1.5 * i.embedM, edges) / (9 * i.embedM ** 2);
  const nearestM = Math.min(...edgeDistances, Infinity);
  const psiEdge = Math.min(1, 0.7 + (0.3 * nearestM) / (1.5 * i.embedM));
  return { areaRatio, psiEdge, perBoltFactor: (areaRatio * psiEdge) / points.length };
}

/** Distance of every point to every edge given; refuses a point that lies beyond one. */
function distancesToEdges(points: readonly Point[], edges: Edges): number[] {
  const distances = points.flatMap(([u, v]) => [
    edges.uMinM === undefined ? [] : [u - edges.uMinM],
    edges.uMaxM === undefined ? [] : [edges.uMaxM - u],
    edges.vMinM === undefined ? [] : [v - edges.vMinM],
    edges.vMaxM === undefined ? [] : [edges.vMaxM - v],
  ]);
  return distances.flat().map((distanceM) => {
    if (!(distanceM > 0))
      throw new RangeError(`edges must lie beyond every point, got a distance of ${distanceM}`);
    return distanceM;
  });
}

/** The same points with u turned along the pair that lies farthest apart. */
function alongFarthestPair(points: readonly Point[]): readonly Point[] {
  let farthestM = 0;
  let axis: Point = [1, 0];
  for (const [u1, v1] of points) {
    for (const [u2, v2] of points) {
      const apartM = Math.hypot(u2 - u1, v2 - v1);
      if (apartM > farthestM) {
        farthestM = apartM;
        axis = [(u2 - u1) / apartM, (v2 - v1) / apartM];
      }
    }
  }
  const [cos, sin] = axis;
  return points.map(([u, v]): Point => [u * cos + v * sin, v * cos - u * sin]);
}

/** Area covered by squares of the given half side around the points, cut at the edges, by a sweep over u. */
function unionArea(points: readonly Point[], halfM: number, edges: Edges): number {
  const squares = points.map(([u, v]) => ({
    u0: Math.max(u - halfM, edges.uMinM ?? -Infinity),
    u1: Math.min(u + halfM, edges.uMaxM ?? Infinity),
    v0: Math.max(v - halfM, edges.vMinM ?? -Infinity),
    v1: Math.min(v + halfM, edges.vMaxM ?? Infinity),
  }));
  const cuts = squares.flatMap((s) => [s.u0, s.u1]).sort((a, b) => a - b);
  let areaM2 = 0;
  let left = cuts[0] ?? 0;
  for (const right of cuts) {
    const strips = squares.filter((s) => s.u0 <= left && s.u1 >= right).sort((a, b) => a.v0 - b.v0);
    let coveredM = 0;
    let top = -Infinity;
    for (const s of strips) {
      coveredM += Math.max(0, s.v1 - Math.max(s.v0, top));
      top = Math.max(top, s.v1);
    }
    areaM2 += coveredM * (right - left);
    left = right;
  }
  return areaM2;
}
