import type { LoadPolicy } from "@/lib/domain/policy";
import type { RuleCode } from "@/lib/domain/vocabulary";
import { METALS } from "@/lib/domain/catalogue/metals";
import { addDays } from "@/lib/domain/finding/dates";
import { boltFindings } from "@/lib/domain/finding/bolt-findings";
import type { BoltEvidence, BoltFacts } from "@/lib/domain/finding/evidence";
import { PLAUSIBLE_SEA_M } from "@/lib/domain/finding/place";
import type { Finding } from "@/lib/domain/finding/types";

/** The one fact that would settle most. */
export interface HelpMost {
  /** Stable key of the fact: `place.seaDistanceM`. */
  fact: string;
  /** How a person would say it: "the distance to the sea". */
  label: string;
  /** Open questions it settles on average over its plausible values, and how many there are. */
  settles: number;
  of: number;
}

/** A fact that is not known, with the evidence as it would be at each plausible value. */
interface Trial {
  fact: string;
  label: string;
  missing: (e: BoltEvidence) => boolean;
  tries: (e: BoltEvidence) => readonly BoltEvidence[];
}

function withBolt(e: BoltEvidence, bolt: Partial<BoltFacts>): BoltEvidence {
  return { ...e, bolt: { ...e.bolt, ...bolt } };
}

/** Ordered by how easily a person finds it out: of facts that settle as much, the first is named. */
const TRIALS: readonly Trial[] = [
  {
    fact: "place.washing",
    label: "whether rain washes the place",
    missing: (e) => e.place.washing === null,
    tries: (e) => (["rain", "none"] as const).map((washing) => ({ ...e, place: { ...e.place, washing } })),
  },
  {
    fact: "place.seaDistanceM",
    label: "the distance to the sea",
    missing: (e) => e.place.seaDistanceM === null,
    tries: (e) => PLAUSIBLE_SEA_M.map((seaDistanceM) => ({ ...e, place: { ...e.place, seaDistanceM } })),
  },
  {
    fact: "rock.ucsMpa",
    label: "the grade of the rock",
    missing: (e) => e.rock.ucsMpa === null,
    tries: (e) => [15, 35, 75, 150].map((ucsMpa) => ({ ...e, rock: { ucsMpa } })),
  },
  {
    fact: "bolt.metal",
    label: "the metal of the bolt",
    missing: (e) => e.bolt.metal === null,
    tries: (e) => METALS.map((metal) => withBolt(e, { metal })),
  },
  {
    fact: "bolt.rating",
    label: "the rated strength, or the standard it was made to",
    missing: (e) => e.bolt.ratedRadialKn === null || e.bolt.ratedAxialKn === null,
    tries: (e) =>
      [
        [25, 15],
        [20, 10],
      ].map(([ratedRadialKn, ratedAxialKn]) => withBolt(e, { ratedRadialKn, ratedAxialKn })),
  },
  {
    fact: "bolt.bendOnsetKn",
    label: "the load at which it begins to bend, tested or from the maker",
    missing: (e) => e.bolt.bendOnsetKn === null || !["tested", "maker"].includes(e.bolt.bendOnsetBasis),
    tries: (e) =>
      [4, 8, 12, 18, 24].map((bendOnsetKn) =>
        withBolt(e, { bendOnsetKn, bendOnsetHighKn: bendOnsetKn, bendOnsetBasis: "tested" }),
      ),
  },
  {
    fact: "bolt.embedmentMm",
    label: "how deep it sits",
    missing: (e) => e.bolt.embedmentMm === null,
    tries: (e) => [40, 60, 80, 100, 130].map((embedmentMm) => withBolt(e, { embedmentMm })),
  },
  {
    fact: "bolt.installedOn",
    label: "when it was installed",
    missing: (e) => e.bolt.installedOn === null,
    tries: (e) =>
      [1, 8, 15, 25, 40].map((age) =>
        withBolt(e, { installedOn: addDays(e.onDate, -365 * age), installedOnPrecision: "year" }),
      ),
  },
  {
    fact: "bolt.method",
    label: "the glue it was set with",
    missing: (e) => e.bolt.method === null,
    tries: (e) => (["epoxy", "vinylester", "polyester"] as const).map((method) => withBolt(e, { method })),
  },
  {
    fact: "bolt.batch",
    label: "the batch of the hardware or glue",
    missing: (e) => (e.care?.warnings ?? []).some((warning) => warning.match === "batch_unknown"),
    tries: (e) =>
      (["exact", null] as const).map((match) => ({
        ...e,
        care: e.care && {
          ...e.care,
          warnings: e.care.warnings.flatMap((warning) => {
            if (warning.match !== "batch_unknown") return [warning];
            return match === null ? [] : [{ ...warning, match }];
          }),
        },
      })),
  },
];

/** What to say where no single value can be tried: by the rule that asks. */
const OTHERWISE: Partial<Record<RuleCode, { fact: string; label: string }>> = {
  "load.bend": { fact: "group.geometry", label: "the positions of the placements and the masterpoint" },
  "load.strength": { fact: "group.geometry", label: "the positions of the placements and the masterpoint" },
  "care.overdue": { fact: "care.check", label: "a check by hand" },
  "care.report-open": { fact: "care.report", label: "whether the open report is true" },
  "metal.plated": { fact: "bolt.shankDiameterMm", label: "the diameter of the bolt" },
};

/**
 * The missing fact that settles most of the open questions, found by trying its plausible values and
 * counting, on average, how many questions are no longer asked. Null: nothing is open.
 */
export function helpMost(e: BoltEvidence, findings: readonly Finding[], policy: LoadPolicy): HelpMost | null {
  const open = findings.filter((found) => found.level === "ask").map((found) => found.code);
  if (open.length === 0) return null;
  let best: HelpMost | null = null;
  for (const trial of TRIALS) {
    if (!trial.missing(e)) continue;
    const tries = trial.tries(e);
    const settled = tries.reduce((sum, tried) => {
      const still = boltFindings(tried, policy).filter((found) => found.level === "ask");
      return sum + open.length - open.filter((code) => still.some((found) => found.code === code)).length;
    }, 0);
    const settles = settled / tries.length;
    if (settles > (best?.settles ?? 0)) {
      best = { fact: trial.fact, label: trial.label, settles, of: open.length };
    }
  }
  if (best !== null) return best;
  const other = open.map((code) => OTHERWISE[code]).find((entry) => entry !== undefined);
  return other === undefined ? null : { ...other, settles: 1, of: open.length };
}
