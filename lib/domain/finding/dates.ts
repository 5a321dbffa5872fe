import type { DatePrecision } from "@/lib/domain/vocabulary";

/** Calendar arithmetic on `YYYY-MM-DD`. Dates compare as text; nothing here knows a time zone or today. */

const DAY_MS = 86_400_000;

function utc(day: string): Date {
  return new Date(`${day}T00:00:00Z`);
}

function text(date: Date): string {
  return date.toISOString().slice(0, 10);
}

/** Years between two dates, of 365.25 days; negative when `to` is earlier. */
export function yearsBetween(from: string, to: string): number {
  return (utc(to).getTime() - utc(from).getTime()) / (DAY_MS * 365.25);
}

export function addDays(day: string, days: number): string {
  return text(new Date(utc(day).getTime() + days * DAY_MS));
}

/** The same day some months later, or the last day of that month when it is shorter. */
export function addMonths(day: string, months: number): string {
  const date = utc(day);
  const first = new Date(Date.UTC(date.getUTCFullYear(), date.getUTCMonth() + months, 1));
  const last = new Date(Date.UTC(first.getUTCFullYear(), first.getUTCMonth() + 1, 0)).getUTCDate();
  first.setUTCDate(Math.min(date.getUTCDate(), last));
  return text(first);
}

/** Earliest and latest day a date of limited precision may stand for; earliest null: any time before. */
export function span(day: string, precision: DatePrecision): { earliest: string | null; latest: string } {
  switch (precision) {
    case "day":
      return { earliest: day, latest: day };
    case "month":
      return {
        earliest: `${day.slice(0, 7)}-01`,
        latest: addDays(addMonths(`${day.slice(0, 7)}-01`, 1), -1),
      };
    case "year":
      return { earliest: `${day.slice(0, 4)}-01-01`, latest: `${day.slice(0, 4)}-12-31` };
    case "before":
      return { earliest: null, latest: addDays(day, -1) };
  }
}
