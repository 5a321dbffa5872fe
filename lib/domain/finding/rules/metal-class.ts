import type { Place } from "@/lib/engineering";
import { metalAgainstClass, placeClass, rank } from "@/lib/engineering";
import { metalName } from "@/lib/domain/catalogue/metals";
import { metalsThatPass } from "@/lib/domain/catalogue/metals-that-pass";
import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import type { MetalPart } from "@/lib/domain/finding/parts";
import { metalParts } from "@/lib/domain/finding/parts";
import {
  everyPlace,
  placeAssumed,
  placeClassOf,
  placeInWords,
  placeMissing,
} from "@/lib/domain/finding/place";
import { acrossUnknown, severity } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";
import { areRecorded, sentence } from "@/lib/domain/finding/words";

/**
 * metal.class: every stainless part against the corrosion class the place asks for.
 *
 * The worst part speaks. A link is replaceable and rusts in plain sight, so a short class on a link limits
 * and does not stop. A distance or washing that is not known is tried at every plausible value: it is asked
 * for only when the answers differ. Titanium passes every class; plated parts are for `metal.plated`.
 */
export function metalClass(e: BoltEvidence): Finding | null {
  const worst = metalParts(e.bolt)
    .map((part) => ({ part, level: levelOf(part, e) }))
    .reduce<{ part: MetalPart; level: Level } | null>((found, { part, level }) => {
      if (level === null) return found;
      return found === null || severity(level) > severity(found.level) ? { part, level } : found;
    }, null);
  if (worst === null) return null;

  const { part, level } = worst;
  const wanted = placeClassOf(e.place);
  const has = metalAgainstClass(part.metal, "I").metalClass;
  const missing = placeMissing(e.place);
  const asks = wanted === null ? "a class that is not known" : `class ${wanted.crc} (factor ${wanted.crf})`;
  return {
    code: "metal.class",
    level,
    title: {
      stop: "Metal far below what the place asks for",
      ask: "Not known whether the metal suits the place",
      limit: "Metal one class below what the place asks for",
      note: "Metal just meets the place",
    }[level],
    text: `${sentence(part.part)} of ${metalName(part.metal)}: resistance class ${has ?? "not known"}. The place asks for ${asks}: ${placeInWords(e.place)}.`,
    clearsWhen: level === "ask" ? areRecorded(missing) : better(level, part, e),
    numbers: {
      part: part.part,
      metal: part.metal,
      metalClass: has,
      crc: wanted?.crc ?? null,
      crf: wanted?.crf ?? null,
      seaDistanceM: e.place.seaDistanceM,
      washing: e.place.washing,
    },
    assumed: placeAssumed(e.place),
    source: { mark: "published", name: "EN 1993-1-4:2006+A1:2015, Annex A" },
  };
}

function levelOf({ part, metal }: MetalPart, e: BoltEvidence): Level | null {
  return acrossUnknown(
    everyPlace(e.place).map((place) => {
      const level = judge(metal, place);
      return level === "stop" && part === "link" ? "limit" : level;
    }),
  );
}

function judge(metal: string, place: Place): Level | null {
  const wanted = placeClass(place);
  if (wanted === null) return null;
  const { reason, metalClass } = metalAgainstClass(metal, wanted.crc);
  if (metalClass === null || metalClass === "beyond") return null;
  const short = rank(wanted.crc) - rank(metalClass);
  if (reason === "class-short") return short >= 2 ? "stop" : "limit";
  return short === 0 ? "note" : null;
}

function better(level: Level, { part }: MetalPart, e: BoltEvidence): string | null {
  if (level === "note") return null;
  return `the ${part} is of a metal that suits the place: ${metalsThatPass(e.place)}`;
}
