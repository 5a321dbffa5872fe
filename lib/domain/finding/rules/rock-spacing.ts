import { groupFactor } from "@/lib/engineering";
import type { LoadPolicy } from "@/lib/domain/policy";
import type { BoltEvidence, PlacementFacts } from "@/lib/domain/finding/evidence";
import { loadsOf, onBolt } from "@/lib/domain/finding/loads";
import type { Finding } from "@/lib/domain/finding/types";
import { exceeds, isSome, mm, percent } from "@/lib/domain/finding/words";

/** Parts of a lone bolt's cone below which it is said (common practice). */
const LIMIT_BELOW = 0.6;
const NOTE_BELOW = 0.9;
/** Cone spacing at which bolts do not weaken each other, in depths (ACI 318-19, published). */
const FULL_SPACING_DEPTHS = 3;

/**
 * rock.spacing: how much of its rock cone is left to the bolt beside its neighbours.
 *
 * Cones resist a pull along the axis only, so a pull square across says nothing here. The share is the
 * group's: where one bolt carries all, its neighbours do not pull at the same rock. A dead hole counts like
 * one more bolt of the pair it forms with this one, since the direction to it is not in the evidence.
 */
export function rockSpacing(e: BoltEvidence, policy: LoadPolicy): Finding | null {
  const loads = loadsOf(e, policy);
  const { embedmentMm } = e.bolt;
  if (loads === null || loads.sharedBy < 2 || e.group === null || e.placement === null) return null;
  if (!isSome(embedmentMm)) return null;
  if (![loads.working, ...loads.peaks].some((load) => onBolt(load, 1).axialKn > 0)) return null;

  const points = pointsOf(e.placement, e.group.placements);
  const embedM = embedmentMm / 1000;
  const beside = points.length < 2 ? 1 : groupFactor({ pointsM: points, embedM }).perBoltFactor;
  const factor = e.placement.deadHoleDistancesMm.reduce(
    (left, apartMm) => left * pairFactor(apartMm, embedM),
    beside,
  );
  if (!exceeds(NOTE_BELOW, factor)) return null;
  const wantedMm = FULL_SPACING_DEPTHS * embedmentMm;
  return {
    code: "rock.spacing",
    level: exceeds(LIMIT_BELOW, factor) ? "limit" : "note",
    title: "Holes close together share their rock",
    text: `Beside its neighbours${e.placement.deadHoleDistancesMm.length > 0 ? " and dead holes" : ""} the bolt keeps ${percent(factor)} of the cone it would have alone, pulled along its axis.`,
    clearsWhen: `holes are at least ${mm(wantedMm)} apart`,
    numbers: {
      factor,
      embedmentMm,
      wantedMm,
      bolts: points.length,
      deadHoles: e.placement.deadHoleDistancesMm.length,
    },
    assumed: ["cones as in concrete: no code covers anchors in rock"],
    source: { mark: "published", name: "Projected areas of ACI 318-19; bounds: common practice" },
  };
}

/** Positions on the face of the bolt and of those that share its load, m. */
function pointsOf(
  own: PlacementFacts,
  all: readonly PlacementFacts[],
): readonly (readonly [number, number])[] {
  return all
    .filter((other) => other.kind === "bolt" && other.role === own.role)
    .flatMap(({ xMm, yMm }) => (xMm === null || yMm === null ? [] : [[xMm / 1000, yMm / 1000] as const]));
}

function pairFactor(apartMm: number, embedM: number): number {
  const pair = [[0, 0] as const, [Math.max(0, apartMm) / 1000, 0] as const];
  return groupFactor({ pointsM: pair, embedM }).perBoltFactor;
}
