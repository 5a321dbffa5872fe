import type { Level } from "@/lib/domain/vocabulary";
import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import { isMechanical, isSerious } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";

/** Strengths of the rock that decide, MPa (ISRM grades R1/R2 and R2/R3; 40 is common practice). */
const NO_BOLT_MPA = 5;
const SOFT_MPA = 25;
const MECHANICAL_MPA = 40;

/**
 * rock.method: does this way of holding suit the rock?
 *
 * Rock that is not graded asks in a serious use; elsewhere it leaves a note, so that it is never passed
 * over in silence and never turns a whole crag grey. 40 MPa itself still limits a mechanical bolt.
 */
export function rockMethod(e: BoltEvidence): Finding | null {
  const { ucsMpa } = e.rock;
  const level = levelOf(e);
  if (level === null) return null;
  const how = isMechanical(e.bolt) ? "a mechanical bolt" : "a glued bolt";
  const wantedMpa = isMechanical(e.bolt) ? MECHANICAL_MPA : NO_BOLT_MPA;
  return {
    code: "rock.method",
    level,
    title: ucsMpa === null ? "Rock not graded" : "Rock too soft for this way of holding",
    text:
      ucsMpa === null
        ? `The strength of the rock is not on record, so it is not known whether ${how} suits it.`
        : `Rock of ${ucsMpa} MPa and ${how}.`,
    clearsWhen: clearsWhen(e),
    numbers: { ucsMpa, form: e.bolt.form, method: e.bolt.method, wantedMpa },
    assumed: [],
    source: {
      mark: "common_practice",
      name: "Rock grades: ISRM (published); bounds by method: common practice",
    },
  };
}

function levelOf(e: BoltEvidence): Level | null {
  const { ucsMpa } = e.rock;
  if (ucsMpa === null) return isSerious(e.use) ? "ask" : "note";
  if (ucsMpa < NO_BOLT_MPA) return "stop";
  if (!isMechanical(e.bolt)) return null;
  if (ucsMpa < SOFT_MPA) return e.bolt.form === "expansion_stud_hanger" ? "stop" : "limit";
  return ucsMpa <= MECHANICAL_MPA ? "limit" : null;
}

function clearsWhen(e: BoltEvidence): string | null {
  const { ucsMpa } = e.rock;
  if (ucsMpa === null) {
    return "the rock is graded; a hammer and a knife are enough to tell the grades apart";
  }
  return ucsMpa < NO_BOLT_MPA ? null : "a glued bolt is placed";
}
