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
import { list, percent, sentence, years } from "@/lib/domain/finding/words";

/** Sea distance within which zinc is no protection, m (common practice). */
const SEA_STOP_M = 1_000;
/** Section lost that ends a bolt's life (common practice). */
const LOST_STOP = 0.1;
const RUST_STOP = 3;

/**
 * metal.plated: carbon steel under zinc, judged by salt, rust and computed loss of section.
 *
 * The section is computed for the bolt alone: a hanger is a plate, a link can be swapped. A link that would stop only limits,
 * as it rusts in plain sight. Age, distance and diameter that are not known are tried at plausible values (a date
 * known as "before" gives the least age); asked for only when the answers differ. Zinc is always a limit outdoors.
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
  const seaM = carefulSeaM(e.place);
  const [age = null] = ages(e);
  const diameters = diametersMm(e.bolt);
  const [diameterMm = 8] = diameters;
  const thicknessUm = coatingUm(e.bolt, part.metal);
  const life = seaM === null ? null : yearsUntilLost(diameterMm, thicknessUm, seaM, LOST_STOP);
  const lost =
    seaM === null || age === null || !dated(e) ? null : sectionLost(diameterMm, thicknessUm, seaM, age);
  const missing = [
    seaM === null ? "the distance to the sea" : null,
    dated(e) ? null : "when it was installed",
    diameters.length > 1 ? "the diameter" : null,
  ].filter((words) => words !== null);
  return {
    code: "metal.plated",
    level,
    title: {
      stop: "Plated steel past its life",
      ask: "Not known how much of the plated steel is left",
      limit: "Plated steel outdoors has a short life",
      note: "Plated steel",
    }[level],
    text: `${sentence(part.part)} of ${metalName(part.metal)}, ${placeInWords(e.place)}.${lifeInWords(life, lost, e)}`,
    clearsWhen:
      level === "ask"
        ? `${list(missing)} ${missing.length > 1 ? "are" : "is"} recorded`
        : `the ${part.part} is replaced by one of ${metalsThatPass(e.place)}`,
    numbers: {
      part: part.part,
      metal: part.metal,
      seaDistanceM: e.place.seaDistanceM,
      rustGrade: e.bolt.rustGrade,
      coatingThicknessUm: thicknessUm,
      diameterMm: diameters.length === 1 ? diameterMm : null,
      ageYears: dated(e) ? age : null,
      sectionLost: lost,
      yearsUntilTenPercentLost: life,
    },
    assumed: [
      e.bolt.coatingThicknessUm === null ? `zinc of ${thicknessUm} µm: not measured` : null,
      "corrosivity from the distance to the sea, upper rate",
      diameters.length > 1 ? `a diameter of ${diameters.join(" to ")} mm: not recorded` : null,
    ].filter((words) => words !== null),
    source: { mark: "published", name: "Rates ISO 9223:2012, growth ISO 9224:2012; bounds: common practice" },
  };
}

function dated(e: BoltEvidence): boolean {
  return e.bolt.installedOn !== null;
}

function levelOf({ part, metal }: MetalPart, e: BoltEvidence): Level {
  const level = levelOfPart(part, metal, e) ?? "limit";
  return part === "link" && level === "stop" ? "limit" : level;
}

function levelOfPart(part: MetalPart["part"], metal: string, e: BoltEvidence): Level | null {
  if (part === "bolt" && e.bolt.rustGrade !== null && e.bolt.rustGrade >= RUST_STOP) return "stop";
  const seaM = carefulSeaM(e.place);
  const distances = seaM === null ? PLAUSIBLE_SEA_M : [seaM];
  if (part !== "bolt") return acrossUnknown(distances.map((m) => (m <= SEA_STOP_M ? "stop" : "limit")));
  const thicknessUm = coatingUm(e.bolt, metal);
  return acrossUnknown(
    distances.flatMap((m) =>
      ages(e).flatMap((age) =>
        diametersMm(e.bolt).map((diameterMm): Level => {
          if (m <= SEA_STOP_M) return "stop";
          return sectionLost(diameterMm, thicknessUm, m, age) >= LOST_STOP - 1e-9 ? "stop" : "limit";
        }),
      ),
    ),
  );
}

function lifeInWords(life: number | null, lost: number | null, e: BoltEvidence): string {
  const seen = e.bolt.rustGrade === null ? "" : ` Rust grade ${e.bolt.rustGrade} was seen.`;
  if (life === null) return seen;
  const loss = lost === null ? "" : ` By computation ${percent(lost)} of its section is gone.`;
  return `${seen} A tenth of the section is gone after ${years(life)} by computation.${loss}`;
}
