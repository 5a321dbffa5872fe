import type { ReportKind } from "@/lib/domain/vocabulary";

/** One thing a report asks its writer to measure or look at. */
export type Measurement = { key: string; label: string } & (
  | { type: "number"; unit: string; min: number; max: number; whole: boolean }
  | { type: "yes_no" }
  | { type: "choice"; options: readonly string[] }
);

function number(key: string, label: string, unit: string, min: number, max: number): Measurement {
  return { key, label, type: "number", unit, min, max, whole: false };
}

function grade(key: string, label: string): Measurement {
  return { key, label, type: "number", unit: "of 4", min: 0, max: 4, whole: true };
}

function yesNo(key: string, label: string): Measurement {
  return { key, label, type: "yes_no" };
}

const BEND_DIRECTIONS = ["up", "down", "left", "right", "outward"] as const;
const DIAMETER_LEFT = number("diameterLeftMm", "Diameter left", "mm", 0, 60);
const METAL_CRACKED = yesNo("metalCracked", "Crack in the metal");
const PLAY = number("playMm", "Play", "mm", 0, 30);

/**
 * What each kind of report asks for. Bounds are what the hand can measure there: beyond them it is a slip
 * of the pen. All of it may be left out; a report filed with cold hands is worth more than one not filed.
 */
export const REPORT_MEASUREMENTS: Readonly<Record<ReportKind, readonly Measurement[]>> = {
  routine_check: [PLAY, grade("rustGrade", "Rust grade")],
  deformation: [
    number("bendAngleDeg", "Bend", "°", 0, 180),
    { key: "bendDirection", label: "Bent towards", type: "choice", options: BEND_DIRECTIONS },
    METAL_CRACKED,
  ],
  corrosion: [grade("rustGrade", "Rust grade"), DIAMETER_LEFT, METAL_CRACKED],
  nut_loose: [number("turns", "Turns until it holds", "turns", 0, 30)],
  hanger_spins: [PLAY],
  stud_turns: [number("turnDeg", "It turns by", "°", 0, 360)],
  glue_in_moves: [PLAY],
  rock: [
    number("crackLengthMm", "Length of the crack", "mm", 0, 20_000),
    number("crackWidthMm", "Width of the crack", "mm", 0, 1_000),
    yesNo("crackNew", "The crack is new"),
    yesNo("crackMoves", "It moves under load or hand"),
    yesNo("soundsHollow", "Sounds hollow when tapped"),
  ],
  wear: [DIAMETER_LEFT, METAL_CRACKED],
  after_storm: [
    number("gustMps", "Strongest gust", "m/s", 0, 100),
    number("peakKn", "Greatest force read", "kN", 0, 100),
  ],
  missing: [],
  not_in_register: [],
  other: [],
};
