import { formatPastDate, THIN_SPACE } from "@/lib/shared/format";

const UNITS = ["kN", "mm", "cm", "m", "km", "MPa", "m/s", "°C", "%", "µm", "kg"];
const NUMBER_AND_UNIT = new RegExp(String.raw`(\d) (${UNITS.join("|")})(?![\w/])`, "gu");
const DAY = /\b(\d{4}-\d{2}-\d{2})(?![\dT])/g;

/**
 * A stored sentence as people read it: numbers hold on to their unit ("12.4 kN" never breaks), and days stored as
 * `2013-08-03` become "3 August 2013". What programs read stays as it is stored.
 */
export function readableText(text: string): string {
  return text.replace(NUMBER_AND_UNIT, `$1${THIN_SPACE}$2`).replace(DAY, (day) => formatPastDate(day));
}
