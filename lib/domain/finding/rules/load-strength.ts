import type { LoadPolicy } from "@/lib/domain/policy";
import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import type { LoadCase, Loads } from "@/lib/domain/finding/loads";
import { loadsOf, onBolt } from "@/lib/domain/finding/loads";
import type { Rated } from "@/lib/domain/finding/strengths";
import { ratedOf } from "@/lib/domain/finding/strengths";
import { isSerious } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { atLeastKn, atMostKn, exceeds, kn, percent, ratio } from "@/lib/domain/finding/words";

/** Margins under which a rating limits: on the working and on the peak case (common practice). */
const WORKING_MARGIN = 2.5;
const PEAK_MARGIN = 1.25;

const TITLES: Readonly<Record<Level, string>> = {
  stop: "Breaks under the load expected here",
  ask: "May break under the load expected here",
  limit: "Little margin against breaking",
  note: "Little margin against breaking",
};

/**
 * load.strength: does the bolt break under the load expected here?
 *
 * Steel interaction (exponent 2), taken as the factor sqrt(sum): it grows in step with the load, so the
 * margins mean what they say. Levels are taken with one bolt carrying all; a stop that an equal share would
 * clear becomes "not known" (serious) or a limit (others). A rating that is missing is for `load.unknown`
 * to say.
 */
export function loadStrength(e: BoltEvidence, policy: LoadPolicy): Finding | null {
  const loads = loadsOf(e, policy);
  const rated = ratedOf(e.bolt);
  if (loads === null || rated.radialKn === null) return null;

  const level = levelOf(e, loads, rated);
  if (level === null) return null;
  const governing = hardest(loads, rated, level === "stop" || level === "ask");
  const carried = onBolt(governing.load, 1);
  const pulls = [`${kn(carried.radialKn)} across the bolt`];
  if (carried.axialKn > 0) pulls.push(`${kn(carried.axialKn)} along its axis`);
  const used = Math.max(...loads.peaks.map((load) => breakUse(load, 1, rated)));
  return {
    code: "load.strength",
    level,
    title: TITLES[level],
    text: `The ${governing.load.name} puts ${pulls.join(" and ")}: ${percent(breakUse(governing.load, 1, rated))} of the rated ${ratingInWords(rated)}.`,
    clearsWhen: clearsWhen(loads, rated),
    numbers: {
      use: e.use,
      workingKn: loads.working.kn,
      peakKn: governing.load === loads.working ? e.demand.peakKn : governing.load.kn,
      radialKn: carried.radialKn,
      axialKn: carried.axialKn,
      ratedRadialKn: rated.radialKn,
      ratedAxialKn: rated.axialKn,
      sharedBy: loads.sharedBy,
      utilisation: used,
    },
    assumed: [...loads.assumed, ...rated.assumed],
    source: {
      mark: "common_practice",
      name: "Rating against 2.5 times the working and 1.25 times the peak case",
    },
  };
}

function levelOf(e: BoltEvidence, loads: Loads, rated: Rated): Level | null {
  const breaks = (share: number) => loads.peaks.some((load) => exceeds(breakUse(load, share, rated), 1));
  if (breaks(1)) {
    if (breaks(loads.friendliestShare)) return "stop";
    return isSerious(e.use) ? "ask" : "limit";
  }
  return exceeds(hardest(loads, rated, false).used, 1) ? "limit" : null;
}

/** Part of the rating a case uses up: 1 breaks. In step with the load. */
export function breakUse(load: LoadCase, share: number, rated: Rated): number {
  const { axialKn, radialKn } = onBolt(load, share);
  const axial = rated.axialKn === null ? 0 : ratio(axialKn, rated.axialKn);
  const radial = rated.radialKn === null ? 0 : ratio(radialKn, rated.radialKn);
  return Math.hypot(axial, radial);
}

/** The case that comes nearest to its bound, with one bolt carrying all. */
function hardest(
  loads: Loads,
  rated: Rated,
  peaksOnly: boolean,
): { load: LoadCase; margin: number; used: number } {
  const withMargin = (load: LoadCase, margin: number) => ({
    load,
    margin,
    used: margin * breakUse(load, 1, rated),
  });
  const working = withMargin(loads.working, WORKING_MARGIN);
  const peaks = loads.peaks.map((load) => withMargin(load, PEAK_MARGIN));
  const [first = working, ...rest] = peaksOnly ? peaks : [working, ...peaks];
  return rest.reduce((a, b) => (b.used > a.used ? b : a), first);
}

function ratingInWords(rated: Rated): string {
  const axial = rated.axialKn === null ? "" : ` and ${kn(rated.axialKn)} along the axis`;
  return `${kn(rated.radialKn ?? 0)} across${axial}`;
}

/** The rating at which nothing would be said, and the load the present one carries with nothing said. */
function clearsWhen(loads: Loads, rated: Rated): string {
  const { load, margin, used } = hardest(loads, rated, false);
  const { axialKn, radialKn } = onBolt(load, 1);
  const left = 1 - (rated.axialKn === null ? 0 : ratio(margin * axialKn, rated.axialKn)) ** 2;
  const bolt =
    left > 0 && radialKn > 0
      ? `a bolt rated at least ${atLeastKn((margin * radialKn) / Math.sqrt(left))} across is placed`
      : `a bolt rated at least ${atLeastKn(margin * axialKn)} along its axis is placed`;
  return `${bolt}, or the ${load.name} brings at most ${atMostKn(load.kn / used)} on this bolt`;
}
