/** How numbers are written inside reasons. One decimal for forces; metres turn to kilometres at 1000. */

/** Tolerance of comparisons: floating point must not decide what lies exactly on a bound. */
const HAIR = 1e-9;

/** Strictly greater, up to rounding noise. */
export function exceeds(value: number, bound: number): boolean {
  return value > bound + HAIR * Math.max(1, Math.abs(bound));
}

/** Below this a length, thickness or strength is as good as none, in whatever unit the register uses. */
const NOTHING = 1e-6;

/** Known, and more than nothing. */
export function isSome(value: number | null): value is number {
  return value !== null && value > NOTHING;
}

/** Beyond this a ratio says nothing more: nothing is ever divided by a strength of zero. */
const RATIO_CAP = 99;

/** Load over resistance: 0 for no load, capped when the resistance is zero or next to it. */
export function ratio(load: number, resistance: number): number {
  if (load <= 0) return 0;
  return resistance <= NOTHING ? RATIO_CAP : Math.min(RATIO_CAP, load / resistance);
}

export function kn(value: number): string {
  return `${value.toFixed(1)} kN`;
}

/** Rounded up: a strength of at least this clears. */
export function atLeastKn(value: number): string {
  return kn(Math.ceil(value * 10 - 1e-6) / 10);
}

/** Rounded down: a load of at most this clears. */
export function atMostKn(value: number): string {
  return kn(Math.floor(value * 10 + 1e-6) / 10);
}

export function mm(value: number): string {
  return `${Number(value.toFixed(1))} mm`;
}

export function distance(metres: number): string {
  return metres < 1000 ? `${Math.round(metres)} m` : `${Number((metres / 1000).toFixed(1))} km`;
}

export function percent(ratio: number): string {
  return `${Math.round(ratio * 100)} %`;
}

export function years(value: number): string {
  return `${value.toFixed(1)} years`;
}

/** "a", "a and b", "a, b and c". */
export function list(words: readonly string[]): string {
  if (words.length < 2) return words.join("");
  return `${words.slice(0, -1).join(", ")} and ${words[words.length - 1] ?? ""}`;
}

/** "a and b are recorded": how a gap is closed. */
export function areRecorded(words: readonly string[]): string {
  return `${list(words)} ${words.length > 1 ? "are" : "is"} recorded`;
}

/** The same words with a capital first letter. */
export function sentence(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
