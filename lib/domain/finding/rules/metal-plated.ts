import { metalName, familyOf } from "@/lib/domain/catalogue/metals";
import { metalsThatPass } from "@/lib/domain/catalogue/metals-that-pass";
import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import type { MetalPart } from "@/lib/domain/finding/parts";
import { metalParts } from "@/lib/domain/finding/parts";
import { carefulSeaM, PLAUSIBLE_SEA_M, placeInWords } from "@/lib/domain/finding/place";
import { ages, coatingUm, diametersMm, sectionLost, yearsUntilLost } from "@/lib/domain/finding/plated-life";
import { acrossUnknown, severity } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { areRecorded, exceeds, percent, sentence, years } from "@/lib/domain/finding/words";

/** Sea distance within which zinc is no protection, m (common practice). */
const SEA_STOP_M = 1_000;
/** Section lost that ends a bolt's life (common practice). */
const LOST_STOP = 0.1;
const RUST_STOP = 3;

/**
 * metal.plated: carbon steel under zinc, judged by salt, rust and computed loss of section.
 *
 * The section is computed for the bolt alone: a hanger is a plate, a link can be swapped. A link that would
 * stop only limits, as it rusts in plain sight. Age, distance and diameter that are not known are tried at
 * plausible values (a date known as "before" gives the least age); asked for only when the answers differ.
 * Zinc is always a limit outdoors.
 */
export function metalPlated(e: BoltEvidence): Finding | null {
  const worst = metalParts(e.bolt)
    .filter(({ metal }) => familyOf(metal) === "plated")
    .map((part) => ({ part, level: levelOf(part, e) }))
    .reduce<{ part: MetalPart; level: Level } | null>(
      (found, next) => (found === null || severity(next.level) > severity(found.level) ? next : found),
      null,
    );
  if (worst === null) return null;

  const { part, level } = worst;
  const life = lifeOf(part, e);
  const missing = [
    e.place.seaDistanceM === null ? "the distance to the sea" : null,
    dated(e) ? null : "when it was installed",
    life.diameterMm === null ? "the diameter" : null,
  ].filter((words) => words !== null);
  return {
    code: "metal.plated",
    level,
    title: TITLES[level],
    text: `${sentence(part.part)} of ${metalName(part.metal)}, ${placeInWords(e.place)}.${lifeInWords(life, e)}`,
    clearsWhen:
      level === "ask"
        ? areRecorded(missing)
        : `the ${part.part} is replaced by one of ${metalsThatPass(e.place)}`,
    numbers: {
      part: part.part,
      metal: part.metal,
      seaDistanceM: e.place.seaDistanceM,
      rustGrade: e.bolt.rustGrade,
      ...life,
    },
    assumed: assumedOf(life, e),
    source: { mark: "published", name: "Rates ISO 9223:2012, growth ISO 9224:2012; bounds: common practice" },
  };
}

const TITLES: Readonly<Record<Level, string>> = {
  stop: "Plated steel past its life",
  ask: "Not known how much of the plated steel is left",
  limit: "Plated steel outdoors has a short life",
  note: "Plated steel",
};

/** The numbers of the computed life; null where it is not known, or the part is not the bolt. */
interface Life {
  coatingThicknessUm: number | null;
  diameterMm: number | null;
  ageYears: number | null;
  sectionLost: number | null;
  yearsUntilTenPercentLost: number | null;
}

function lifeOf({ part, metal }: MetalPart, e: BoltEvidence): Life {
  const none = {
    coatingThicknessUm: null,
    ageYears: null,
    sectionLost: null,
    yearsUntilTenPercentLost: null,
  };
  const diameters = diametersMm(e.bolt);
  const [smallestMm = 8] = diameters;
  const diameterMm = diameters.length === 1 ? smallestMm : null;
  const seaM = carefulSeaM(e.place);
  if (part !== "bolt" || seaM === null) return { ...none, diameterMm };

  const thicknessUm = coatingUm(e.bolt, metal);
  const ageYears = dated(e) ? (ages(e)[0] ?? null) : null;
  return {
    coatingThicknessUm: thicknessUm,
    diameterMm,
    ageYears,
    sectionLost: ageYears === null ? null : sectionLost(smallestMm, thicknessUm, seaM, ageYears),
    yearsUntilTenPercentLost: yearsUntilLost(smallestMm, thicknessUm, seaM, LOST_STOP),
  };
}

function assumedOf(life: Life, e: BoltEvidence): string[] {
  if (life.coatingThicknessUm === null) return [];
  return [
    e.bolt.coatingThicknessUm === null ? `zinc of ${life.coatingThicknessUm} µm: not measured` : null,
    "corrosivity from the distance to the sea, upper rate",
    life.diameterMm === null ? `a diameter of ${diametersMm(e.bolt).join(" to ")} mm: not recorded` : null,
  ].filter((words) => words !== null);
}

function dated(e: BoltEvidence): boolean {
  return e.bolt.installedOn !== null;
}

function levelOf({ part, metal }: MetalPart, e: BoltEvidence): Level {
  if (part === "bolt" && e.bolt.rustGrade !== null && e.bolt.rustGrade >= RUST_STOP) return "stop";
  const seaM = carefulSeaM(e.place);
  const distances = seaM === null ? PLAUSIBLE_SEA_M : [seaM];
  const levels = distances.flatMap((m): readonly Level[] => {
    if (part === "link") return ["limit"];
    if (m <= SEA_STOP_M) return ["stop"];
    return part === "bolt" ? bySection(e, metal, m) : ["limit"];
  });
  return acrossUnknown(levels) ?? "limit";
}

/** The level by computed loss of section, at every age and diameter the bolt may have. */
function bySection(e: BoltEvidence, metal: string, seaM: number): readonly Level[] {
  const thicknessUm = coatingUm(e.bolt, metal);
  return ages(e).flatMap((age) =>
    diametersMm(e.bolt).map((diameterMm): Level => {
      const lost = sectionLost(diameterMm, thicknessUm, seaM, age);
      return exceeds(LOST_STOP, lost) ? "limit" : "stop";
    }),
  );
}

function lifeInWords({ yearsUntilTenPercentLost, sectionLost: lost }: Life, e: BoltEvidence): string {
  const seen = e.bolt.rustGrade === null ? "" : ` Rust grade ${e.bolt.rustGrade} was seen.`;
  if (yearsUntilTenPercentLost === null) return seen;
  const loss = lost === null ? "" : ` By computation ${percent(lost)} of its section is gone.`;
  return `${seen} A tenth of the section is gone after ${years(yearsUntilTenPercentLost)} by computation.${loss}`;
}
