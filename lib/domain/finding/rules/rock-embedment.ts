import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { acrossUnknown, isGlued, isSerious } from "@/lib/domain/finding/traits";
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

/** Hole diameters in use for mechanical bolts, mm: tried where the diameter is not on record. */
const PLAUSIBLE_HOLES_MM = [8, 10, 12];

/**
 * rock.embedment: is the bolt deep enough, by the standard's floor and by the rock it sits in?
 *
 * Depth means h_ef for studs, engaged thread for screws, straight rod for glued bolts. The mechanical floor
 * wants the hole diameter, or the shank's, which for these bolts is the same; without either the usual
 * diameters are tried, and when they disagree the diameter is missing as much as a depth would be. A bolt
 * that is both expanded and glued keeps the higher floor. At 50 MPa the rock counts as hard.
 */
export function rockEmbedment(e: BoltEvidence): Finding | null {
  const { embedmentMm } = e.bolt;
  const { ucsMpa } = e.rock;
  const floors = floorsOf(e);
  const level = embedmentMm === null ? unrecorded(e) : levelAcross(e, embedmentMm, floors, ucsMpa);
  if (level === null) return null;

  const floorMm = floors.length === 1 ? (floors[0] ?? null) : null;
  const byRockMm = depthByRock(ucsMpa);
  const wantedMm = Math.max(byRockMm, ...floors);
  const found = embedmentMm === null ? "The depth is not recorded" : `It sits ${mm(embedmentMm)} deep`;
  const floor =
    floorMm === null
      ? "the standard's floor needs the hole diameter"
      : `the standard's floor is ${mm(floorMm)}`;
  const byRock = byRockMm > 0 && ucsMpa !== null ? `; rock of ${ucsMpa} MPa wants ${mm(byRockMm)}` : "";
  const open = embedmentMm === null ? "the depth is recorded" : "the hole diameter is recorded";
  const short = level === "stop" || level === "limit" || (floorMm !== null && embedmentMm !== null);
  return {
    code: "rock.embedment",
    level,
    title: short
      ? "Not deep enough"
      : embedmentMm === null
        ? "Depth not recorded"
        : "Not known whether it is deep enough",
    text: `${found}; ${floor}${byRock}.`,
    clearsWhen: short ? `a bolt at least ${mm(wantedMm)} deep is placed` : open,
    numbers: { embedmentMm, floorMm, wantedMm, ucsMpa, holeDiameterMm: e.bolt.holeDiameterMm },
    assumed: ucsMpa === null ? ["rock not graded: only the standard's floor is compared"] : [],
    source: { mark: "published", name: "EN 959:2018, 4.2.6; depth by rock strength: common practice" },
  };
}

function unrecorded(e: BoltEvidence): Level {
  return isSerious(e.use) || e.use === "belay" ? "ask" : "note";
}

function levelAcross(
  e: BoltEvidence,
  embedmentMm: number,
  floors: readonly number[],
  ucsMpa: number | null,
): Level | null {
  const level = acrossUnknown(floors.map((floorMm) => levelOf(embedmentMm, floorMm, ucsMpa)));
  return level === "ask" ? unrecorded(e) : level;
}

function levelOf(embedmentMm: number, floorMm: number, ucsMpa: number | null): Level | null {
  if (exceeds(STOP_PART * floorMm, embedmentMm)) return "stop";
  if (exceeds(floorMm, embedmentMm)) return "limit";
  if (!exceeds(depthByRock(ucsMpa), embedmentMm)) return null;
  return ucsMpa !== null && ucsMpa < SOFT_MPA ? "limit" : "note";
}

/** The floor of the standard, mm: one for each diameter the hole may have. */
function floorsOf(e: BoltEvidence): readonly number[] {
  const glued = isGlued(e.bolt) ? GLUED_FLOOR_MM : 0;
  if (glued > 0 && e.bolt.method !== "mechanical_and_glue") return [glued];
  const holeMm = e.bolt.holeDiameterMm ?? e.bolt.shankDiameterMm;
  const holes = holeMm === null ? PLAUSIBLE_HOLES_MM : [holeMm];
  return holes.map((diameterMm) => Math.max(glued, MECHANICAL_FLOOR_DIAMETERS * diameterMm));
}

/** Depth the rock wants beyond the floor, mm; 0 in hard rock or rock that is not graded. */
function depthByRock(ucsMpa: number | null): number {
  if (ucsMpa === null || ucsMpa >= MEDIUM_MPA) return 0;
  return ucsMpa < SOFT_MPA ? SOFT_DEPTH_MM : MEDIUM_DEPTH_MM;
}
