import type { DatePrecision } from "@/lib/domain/vocabulary";

/** A past day, as well as it is known. */
export interface Past {
  on: string;
  precision: DatePrecision;
}

export const onDay = (on: string): Past => ({ on, precision: "day" });
export const inMonth = (month: string): Past => ({ on: `${month}-01`, precision: "month" });
export const inYear = (year: number): Past => ({ on: `${year}-01-01`, precision: "year" });
export const beforeYear = (year: number): Past => ({ on: `${year}-01-01`, precision: "before" });

const DAY_MS = 86_400_000;

/**
 * The demo's own calendar. What is old keeps its date; what is recent is told in days before the seeding, so that
 * checks do not all fall overdue when the demo is set up a year later.
 */
export class Calendar {
  constructor(readonly now: Date) {}

  /** A day so many days ago. */
  ago(days: number): Past {
    return onDay(this.instantAgo(days).toISOString().slice(0, 10));
  }

  /** The same as an instant, late morning at the cliff. */
  instantAgo(days: number, hour = 11): Date {
    const day = new Date(this.now.getTime() - days * DAY_MS);
    day.setUTCHours(hour, 20, 0, 0);
    return day > this.now ? new Date(this.now) : day;
  }

  /** A day so many days ahead. */
  ahead(days: number): string {
    return new Date(this.now.getTime() + days * DAY_MS).toISOString().slice(0, 10);
  }
}

/** Half past five in the evening of a day: when people write down what they did. */
export function eveningOf(on: string): Date {
  return new Date(`${on}T17:30:00Z`);
}
