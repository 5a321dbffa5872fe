import { estimateBond, estimateRockCone } from "@/lib/engineering";
import type { LoadPolicy } from "@/lib/domain/policy";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { loadsOf, onBolt } from "@/lib/domain/finding/loads";
import { isGlued } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { atMostKn, exceeds, isSome, kn } from "@/lib/domain/finding/words";

/** Bond strength of glue in sound clean holes where its sheet is not on record, MPa (common practice). */
const BOND_LOW_MPA = 5;
const BOND_HIGH_MPA = 12;
/** Quality of the rock where nobody judged it: the default of the cone estimate. */
const QUALITY = 0.5;

/** Ends of the estimate, kN, of what holds the bolt in its hole, and what it is of. */
interface Hold {
  what: string;
  lowKn: number;
  highKn: number;
}

/**
 * rock.hold: do glue and rock hold the pull along the axis, by estimate?
 *
 * Lowering only: it never clears anything, and says nothing where depth, hole or rock are not known (other
 * rules ask for them). The peak is taken with one bolt carrying all. The weaker of bond and cone decides
 * each end of the range.
 */
export function rockHold(e: BoltEvidence, policy: LoadPolicy): Finding | null {
  const loads = loadsOf(e, policy);
  if (loads === null) return null;
  const demandKn = Math.max(...loads.peaks.map((load) => onBolt(load, 1).axialKn));
  const holds = [bond(e), cone(e)].filter((hold) => hold !== null);
  if (demandKn <= 0 || holds.length === 0) return null;

  const lowKn = Math.min(...holds.map((hold) => hold.lowKn));
  const highKn = Math.min(...holds.map((hold) => hold.highKn));
  if (!exceeds(demandKn, lowKn)) return null;
  const weakest = holds.find((hold) => hold.lowKn === lowKn)?.what ?? "the hold";
  return {
    code: "rock.hold",
    level: exceeds(demandKn, highKn) ? "limit" : "note",
    title: "May pull out of the rock",
    text: `${kn(demandKn)} along the axis; by estimate ${weakest} holds ${kn(lowKn)} to ${kn(highKn)}. An estimate is never a rating.`,
    clearsWhen: `a pull test along the axis holds, or at most ${atMostKn(lowKn)} pulls along the axis`,
    numbers: {
      axialKn: demandKn,
      holdLowKn: lowKn,
      holdHighKn: highKn,
      embedmentMm: e.bolt.embedmentMm,
      ucsMpa: e.rock.ucsMpa,
      bondMpa: e.bolt.bondMpa,
    },
    assumed: [...loads.assumed, "sound, clean, dry hole; rock of middling quality"],
    source: { mark: "arithmetic", name: "Bond and cone estimates in the form of EN 1992-4: never a rating" },
  };
}

function bond(e: BoltEvidence): Hold | null {
  const { embedmentMm, holeDiameterMm, bondMpa } = e.bolt;
  if (!isGlued(e.bolt) || !isSome(embedmentMm) || !isSome(holeDiameterMm)) return null;
  const at = (mpa: number) =>
    (estimateBond({
      holeDiaM: holeDiameterMm / 1000,
      barDiaM: holeDiameterMm / 1000,
      embedM: embedmentMm / 1000,
      tauHolePa: mpa * 1e6,
    }).axialN ?? 0) / 1000;
  if (bondMpa !== null && !isSome(bondMpa)) return { what: "the bond", lowKn: 0, highKn: 0 };
  return { what: "the bond", lowKn: at(bondMpa ?? BOND_LOW_MPA), highKn: at(bondMpa ?? BOND_HIGH_MPA) };
}

function cone(e: BoltEvidence): Hold | null {
  const { embedmentMm } = e.bolt;
  const { ucsMpa } = e.rock;
  if (!isSome(embedmentMm) || !isSome(ucsMpa)) return null;
  const estimate = estimateRockCone({ embedM: embedmentMm / 1000, ucsPa: ucsMpa * 1e6, quality: QUALITY });
  return {
    what: "the cone of rock",
    lowKn: (estimate.lowN ?? 0) / 1000,
    highKn: (estimate.highN ?? 0) / 1000,
  };
}
