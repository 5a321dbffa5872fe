import type { Place } from "./corrosion";
import { isOneOf, PLATED, TITANIUM } from "./corrosion";
import { requireNotNegative } from "./guard";
import { classOf } from "./metal-class";

/**
 * Whether chloride stress-corrosion cracking must be expected of a metal in a place.
 *
 * The worst kind of failure a fixed anchor has: no section is lost, often nothing is seen, and a cracked bolt
 * can break under body weight. It is a table of grade against salt, shelter and heat, not a formula.
 *
 *     group A   1.4301 1.4306 1.4307 1.4311 1.4318 1.4541 1.4567   (no molybdenum)
 *     group B   1.4401 1.4404 1.4429 1.4432 1.4435 1.4571 1.4578   (with molybdenum)
 *     accepted  1.4529 1.4547 1.4565 and titanium
 *
 *     sheltered (washing is not `rain`)   A <= 10 km stop · B <= 1 km stop, to 10 km limit
 *                                         any other stainless <= 10 km limit
 *     washed by rain                      A <= 1 km limit
 *     sheltered, warm and dry             10 to 100 km note
 *
 * A cleaning regime does not count as washed: it is what fails unnoticed. Indoors (controlled) is taken as
 * out of reach of salt; a tunnel with de-icing salt as sheltered beside the sea. Plated steel does not crack
 * this way: its own rule speaks for it.
 *
 * Not known. Each unknown (distance, washing, metal) is tried at every plausible value. One answer for all
 * of them is the answer; `ok` beside `note` is `note`; anything else is `ask`.
 *
 * Source: accepted grades are those pool codes allow for uncleaned fasteners (EN 13451-1:2011 and others,
 * published); the distances are common practice, from summaries of climbing federation papers.
 * Worked example (also a test): 1.4401, 80 m from the sea, never washed: stop.
 *
 * @throws RangeError when the distance is negative or not finite.
 */
export function metalAgainstStressCorrosion(
  metal: string | null,
  p: Place,
): { level: StressCorrosionLevel; reason: string } {
  if (p.seaDistanceM !== null) requireNotNegative("seaDistanceM", p.seaDistanceM);
  const groups =
    metal === null ? ALL_GROUPS : [groupOf(metal)].flatMap((g) => (g === null ? ALL_GROUPS : [g]));
  const distances = p.saltTunnel ? [0] : p.seaDistanceM === null ? ONE_PER_BAND_M : [p.seaDistanceM];
  const washings = p.saltTunnel ? [false] : p.washing === null ? [true, false] : [p.washing === "rain"];

  const answers = groups.flatMap((group) =>
    distances.flatMap((distanceM) =>
      washings.map((washed) => judge(group, p.indoor ? Infinity : distanceM, washed, p.warmDry ?? false)),
    ),
  );
  return combine(answers, p, metal);
}

export type StressCorrosionLevel = "stop" | "limit" | "note" | "ok" | "ask";
/** Accepted stands for titanium and the three accepted grades, plated for zinc on carbon steel. */
type Group = "A" | "B" | "other" | "accepted" | "plated";
type Answer = { level: Exclude<StressCorrosionLevel, "ask">; reason: string };

const GROUP_A = ["1.4301", "1.4306", "1.4307", "1.4311", "1.4318", "1.4541", "1.4567"];
const GROUP_B = ["1.4401", "1.4404", "1.4429", "1.4432", "1.4435", "1.4571", "1.4578"];
const ACCEPTED = ["1.4529", "1.4547", "1.4565"];
const ALL_GROUPS: readonly Group[] = ["A", "B", "other", "accepted", "plated"];
/** One distance inside each band of the table, m. */
const ONE_PER_BAND_M: readonly number[] = [0, 5_000, 50_000, 200_000];

/** The group of a metal; null when it is not in any table. */
function groupOf(metal: string): Group | null {
  if (isOneOf(PLATED, metal)) return "plated";
  if (isOneOf(TITANIUM, metal) || ACCEPTED.includes(metal)) return "accepted";
  if (GROUP_A.includes(metal)) return "A";
  if (GROUP_B.includes(metal)) return "B";
  return classOf(metal) === null ? null : "other";
}

function judge(group: Group, distanceM: number, washed: boolean, warmDry: boolean): Answer {
  if (group === "plated") return { level: "ok", reason: "Plated carbon steel: its zinc life decides." };
  if (group === "accepted") return { level: "ok", reason: "Accepted for unwashed salt." };
  if (washed) {
    return group === "A" && distanceM <= 1_000
      ? { level: "limit", reason: "A grade without molybdenum within 1 km of the sea." }
      : { level: "ok", reason: "Washed by rain, at this distance from the sea." };
  }
  if (distanceM <= 10_000) {
    if (group === "A")
      return { level: "stop", reason: "A grade without molybdenum, unwashed, within 10 km of the sea." };
    if (group === "B" && distanceM <= 1_000) {
      return { level: "stop", reason: "A molybdenum grade, unwashed, within 1 km of the sea." };
    }
    return { level: "limit", reason: "Not an accepted grade, unwashed, within 10 km of the sea." };
  }
  return warmDry && distanceM <= 100_000
    ? { level: "note", reason: "Unwashed, warm and dry, within 100 km of the sea." }
    : { level: "ok", reason: "Out of reach of sea salt." };
}

/** One answer for every plausible value, or `ask` with what is missing. */
function combine(
  answers: readonly Answer[],
  p: Place,
  metal: string | null,
): { level: StressCorrosionLevel; reason: string } {
  const levels = new Set(answers.map((a) => a.level));
  const harmless = !levels.has("stop") && !levels.has("limit");
  if (levels.size === 1 || harmless) {
    const answer = answers.find((a) => a.level === "note") ?? answers[0];
    if (answer !== undefined) return answer;
  }
  const missing = [
    metal === null || groupOf(metal) === null ? "the metal" : null,
    p.seaDistanceM === null ? "the distance to the sea" : null,
    p.washing === null ? "whether rain washes the place" : null,
  ].filter((word) => word !== null);
  return { level: "ask", reason: `Not known: ${missing.join(", ")}.` };
}
