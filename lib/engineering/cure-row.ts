import { requireFinite } from "./guard";

/** One step of an adhesive's cure table: from this temperature up, until the next row. */
export interface CureRow {
  minTempC: number;
  /** Minutes in which the glue can be worked. */
  workMin: number;
  /** Minutes after which the bolt may be loaded. */
  cureMin: number;
}

/**
 * The row of an adhesive's cure table that applies at a temperature, or null: do not install.
 *
 * The table is a staircase. Between two rows the colder one applies; below the first there is no row. Never
 * interpolated, never extrapolated: the maker tested the steps and nothing else. The temperature to ask
 * with is the colder of glue or air and rock. Rows may come in any order.
 *
 * Source: the product sheet of the adhesive; reading it as steps is common practice and what the sheets ask
 * for. Worked example (also a test): rows at 0 °C and 5 °C, asked at 4.9 °C: the row of 0 °C.
 *
 * @throws RangeError when the temperature or a row's temperature is not finite.
 */
export function cureRow(table: readonly CureRow[], tempC: number): CureRow | null {
  requireFinite("tempC", tempC);
  let found: CureRow | null = null;
  for (const row of table) {
    requireFinite("minTempC", row.minTempC);
    if (row.minTempC <= tempC && (found === null || row.minTempC > found.minTempC)) found = row;
  }
  return found;
}
