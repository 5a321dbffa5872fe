import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { isGlued, isMechanical, isSerious } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { exceeds, mm } from "@/lib/domain/finding/words";

/** EN 959:2018, 4.2.6: glued length, and mechanical length in hole diameters (published). */
const GLUED_FLOOR_MM = 70;
const MECHANICAL_FLOOR_DIAMETERS = 5;
/** Part of the floor below which a bolt is not to be used (common practice). */
const STOP_PART = 0.7;
/** Depth by rock strength, lower ends (common practice): under 25 MPa, 25 to under 50. */
const SOFT_MPA = 25;
const SOFT_DEPTH_MM = 120;
const MEDIUM_MPA = 50;
const MEDIUM_DEPTH_MM = 90;

/**
 * rock.embedment: is the bolt deep enough, by the standard's floor and by the rock it sits in?
 *
 * Depth means h_ef for studs, engaged thread for screws, straight rod for glued bolts. The mechanical floor wants the hole
 * diameter, or the shank's, which for these bolts is the same; without either only the depth by rock is
 * compared. A bolt that is both expanded and glued keeps the higher floor. At 50 MPa the rock counts as hard.
 */
export function rockEmbedment(e: BoltEvidence): Finding | null {
  const { embedmentMm } = e.bolt;
  const { ucsMpa } = e.rock;
  const floorMm = floorOf(e);
  const level = embedmentMm === null ? unrecorded(e) : levelOf(embedmentMm, floorMm, ucsMpa);
  if (level === null) return null;

  const wantedMm = Math.max(floorMm ?? 0, depthByRock(ucsMpa));
  const found = embedmentMm === null ? "The depth is not recorded" : `It sits ${mm(embedmentMm)} deep`;
  const floor =
    floorMm === null
      ? "the standard's floor needs the hole diameter"
      : `the standard's floor is ${mm(floorMm)}`;
  const byRock =
    depthByRock(ucsMpa) > 0 ? `; rock of ${ucsMpa ?? ""} MPa wants ${mm(depthByRock(ucsMpa))}` : "";
  return {
    code: "rock.embedment",
    level,
    title: embedmentMm === null ? "Depth not recorded" : "Not deep enough",
    text: `${found}; ${floor}${byRock}.`,
    clearsWhen:
      embedmentMm === null ? "the depth is recorded" : `a bolt at least ${mm(wantedMm)} deep is placed`,
    numbers: { embedmentMm, floorMm, wantedMm, ucsMpa, holeDiameterMm: e.bolt.holeDiameterMm },
    assumed: ucsMpa === null ? ["rock not graded: only the standard's floor is compared"] : [],
    source: { mark: "published", name: "EN 959:2018, 4.2.6; depth by rock strength: common practice" },
  };
}

function unrecorded(e: BoltEvidence): Level {
  return isSerious(e.use) || e.use === "belay" ? "ask" : "note";
}

function levelOf(embedmentMm: number, floorMm: number | null, ucsMpa: number | null): Level | null {
  if (floorMm !== null && exceeds(STOP_PART * floorMm, embedmentMm)) return "stop";
  if (floorMm !== null && exceeds(floorMm, embedmentMm)) return "limit";
  if (!exceeds(depthByRock(ucsMpa), embedmentMm)) return null;
  return ucsMpa !== null && ucsMpa < SOFT_MPA ? "limit" : "note";
}

/** The floor of the standard, mm; null: it needs a diameter that is not known. */
function floorOf(e: BoltEvidence): number | null {
  const holeMm = e.bolt.holeDiameterMm ?? e.bolt.shankDiameterMm;
  const glued = isGlued(e.bolt) ? GLUED_FLOOR_MM : null;
  const expanded = isMechanical(e.bolt) || e.bolt.method === "mechanical_and_glue";
  const mechanical = expanded && holeMm !== null ? MECHANICAL_FLOOR_DIAMETERS * holeMm : null;
  if (glued === null) return mechanical;
  return Math.max(glued, mechanical ?? 0);
}

/** Depth the rock wants beyond the floor, mm; 0 in hard rock or rock that is not graded. */
function depthByRock(ucsMpa: number | null): number {
  if (ucsMpa === null || ucsMpa >= MEDIUM_MPA) return 0;
  return ucsMpa < SOFT_MPA ? SOFT_DEPTH_MM : MEDIUM_DEPTH_MM;
}
