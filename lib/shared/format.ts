/** Holds a number and its unit together on one line: narrow no-break space. */
export const THIN_SPACE = "\u202f";
/** True minus, as wide as a plus. */
export const MINUS = "\u2212";

/** How well a past date is known. */
export type PastDatePrecision = "day" | "month" | "year" | "before";

export interface NumberStyle {
  /** Digits after the point. Left out: as many as the value needs, at most two. */
  digits?: number;
  /** Writes + before positive numbers. */
  signed?: boolean;
}

/** `-3.25` → `−3.25`; thousands in groups from 10 000 on (ISO 80000-1). Throws RangeError when not finite. */
export function formatNumber(value: number, style: NumberStyle = {}): string {
  if (!Number.isFinite(value)) throw new RangeError("value must be a finite number");
  const fixed = Math.abs(value).toFixed(style.digits ?? 2);
  const plain = style.digits === undefined ? fixed.replace(/\.?0+$/, "") : fixed;
  const [whole = "0", fraction] = plain.split(".");
  const grouped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE) : whole;
  return sign(value, plain, style.signed) + grouped + (fraction === undefined ? "" : `.${fraction}`);
}

/** A value that rounds to zero has no sign. */
function sign(value: number, rounded: string, signed = false): string {
  if (Number(rounded) === 0) return "";
  if (value < 0) return MINUS;
  return signed ? "+" : "";
}

/** `12.4, "kN"` → `12.4 kN`; the degree sign of an angle stands close: `−3.2°`. */
export function formatQuantity(value: number, unit: string, style: NumberStyle = {}): string {
  const number = formatNumber(value, style);
  return unit === "°" ? number + unit : number + THIN_SPACE + unit;
}

/** kN to one decimal place. */
export function formatKn(valueKn: number): string {
  return formatQuantity(valueKn, "kN", { digits: 1 });
}

/** Metres below a kilometre (whole from 10 m on), kilometres above (one decimal below 100 km). */
export function formatDistanceM(valueM: number): string {
  const size = Math.abs(valueM);
  if (size < 9.95) return formatQuantity(valueM, "m", { digits: 1 });
  if (size < 999.5) return formatQuantity(valueM, "m", { digits: 0 });
  return formatQuantity(valueM / 1000, "km", { digits: size < 99_950 ? 1 : 0 });
}

/** `62.4` → `062°`; a bearing has three digits. */
export function formatBearingDeg(valueDeg: number): string {
  const turned = ((Math.round(valueDeg) % 360) + 360) % 360;
  return `${String(turned).padStart(3, "0")}°`;
}

const MONTHS = [
  "January",
  "February",
  "March",
  "April",
  "May",
  "June",
  "July",
  "August",
  "September",
  "October",
  "November",
  "December",
] as const;

/** `2019-05-04` as well as it is known: `4 May 2019`, `May 2019`, `2019`, `before 2005`. */
export function formatPastDate(on: string, precision: PastDatePrecision = "day"): string {
  const [year = "", month = "01", day = "01"] = on.slice(0, 10).split("-");
  const monthYear = `${MONTHS[Number(month) - 1] ?? ""} ${year}`.trim();
  const full = `${Number(day)} ${monthYear}`;
  switch (precision) {
    case "year":
      return year;
    case "month":
      return monthYear;
    case "day":
      return full;
    case "before":
      // "before 2005" is kept as the first day of 2005; any other day is said in full.
      return `before ${month === "01" && day === "01" ? year : full}`;
  }
}

/** A UTC instant as the clock at the place shows it: `4 May 2019, 14:05`. */
export function formatInstant(at: string, timeZone: string): string {
  const parts = new Intl.DateTimeFormat("en-GB", {
    timeZone,
    year: "numeric",
    month: "numeric",
    day: "numeric",
    hour: "2-digit",
    minute: "2-digit",
    hourCycle: "h23",
  }).formatToParts(new Date(at));
  const part = (type: Intl.DateTimeFormatPartTypes) =>
    parts.find((entry) => entry.type === type)?.value ?? "";
  const monthName = MONTHS[Number(part("month")) - 1] ?? "";
  return `${Number(part("day"))} ${monthName} ${part("year")}, ${part("hour")}:${part("minute")}`;
}

/** `["a", "b", "c"]` → `a, b and c`. */
export function formatList(words: readonly string[], last = "and"): string {
  if (words.length <= 1) return words[0] ?? "";
  return `${words.slice(0, -1).join(", ")} ${last} ${words[words.length - 1]}`;
}

/** `1, "bolt"` → `1 bolt`; `3, "bolt"` → `3 bolts`. */
export function formatCount(count: number, one: string, many = `${one}s`): string {
  return `${formatNumber(count, { digits: 0 })} ${count === 1 ? one : many}`;
}

/** `[1, 2, 3, 5]` → `1–3, 5`; two in a row stay apart. Whole numbers, in any order. */
export function formatRuns(numbers: readonly number[]): string {
  const runs: [number, number][] = [];
  for (const number of [...new Set(numbers)].toSorted((a, b) => a - b)) {
    const run = runs.at(-1);
    if (run && run[1] === number - 1) run[1] = number;
    else runs.push([number, number]);
  }
  return runs
    .map(([from, to]) => (from === to ? `${from}` : to === from + 1 ? `${from}, ${to}` : `${from}–${to}`))
    .join(", ");
}
