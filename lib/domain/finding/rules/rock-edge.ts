import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { isHighline, isSerious } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { exceeds, mm } from "@/lib/domain/finding/words";

/** Distances of serious uses, mm, and of the others in depths (common practice; 1.5 h_ef as in EN 1992-4). */
const SERIOUS_STOP_MM = 200;
const SERIOUS_LIMIT_MM = 500;
const OTHERS_DEPTHS = 1.5;
/** Depth taken where none is on record, mm. */
const DEPTH_TAKEN_MM = 80;

/**
 * rock.edge: a free edge near the bolt, on the side it is pulled to.
 *
 * A highline can pull to any side and wind turns it further: every edge counts. In the other uses the load
 * hangs: an edge above the bolt is not pulled to, any other is. A side that is not on record counts as
 * pulled to.
 */
export function rockEdge(e: BoltEvidence): Finding | null {
  if (e.placement === null || e.placement.edgeDistanceMm === null) return null;
  const { edgeDistanceMm, edgeSide } = e.placement;
  if (edgeSide === "above" && !isHighline(e.use)) return null;

  const depthMm = e.bolt.embedmentMm ?? DEPTH_TAKEN_MM;
  const wantedMm = isSerious(e.use) ? SERIOUS_LIMIT_MM : OTHERS_DEPTHS * depthMm;
  if (!exceeds(wantedMm, edgeDistanceMm)) return null;
  const level: Level = isSerious(e.use) && exceeds(SERIOUS_STOP_MM, edgeDistanceMm) ? "stop" : "limit";
  return {
    code: "rock.edge",
    level,
    title: "Free edge on the side it is pulled to",
    text: `The rock ends ${mm(edgeDistanceMm)} from the bolt${edgeSide === null ? "" : ` (${edgeSide})`}; ${mm(wantedMm)} is wanted here.`,
    clearsWhen: `a bolt at least ${mm(wantedMm)} from the edge is placed`,
    numbers: { edgeDistanceMm, edgeSide, wantedMm, embedmentMm: e.bolt.embedmentMm },
    assumed: [
      edgeSide === null ? "the side of the edge is not recorded: taken as pulled to" : null,
      e.bolt.embedmentMm === null && !isSerious(e.use)
        ? `a depth of ${mm(DEPTH_TAKEN_MM)}: not recorded`
        : null,
    ].filter((words) => words !== null),
    source: {
      mark: "common_practice",
      name: "Edge distances in rock; 1.5 depths as in EN 1992-4 for concrete",
    },
  };
}
