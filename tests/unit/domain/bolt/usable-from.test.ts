import { describe, expect, it } from "vitest";
import { usableFrom } from "@/lib/domain/bolt/usable-from";

/** An invented cure table: steps, as product sheets print them. */
const TABLE = [
  { minTempC: -5, workMin: 90, cureMin: 720 },
  { minTempC: 5, workMin: 25, cureMin: 180 },
  { minTempC: 20, workMin: 6, cureMin: 60 },
];
const at = (glueTempC: number | null, rockTempC: number | null, table = TABLE) =>
  usableFrom({ installedAt: "2026-06-01T10:00:00.000Z", table, glueTempC, rockTempC });

describe("usableFrom", () => {
  it("adds the cure time of the row the colder temperature falls in", () => {
    expect(at(25, 8)).toMatchObject({ ok: true, usableFrom: "2026-06-01T13:00:00.000Z", coldestC: 8 });
    expect(at(8, 25)).toMatchObject({ ok: true, usableFrom: "2026-06-01T13:00:00.000Z", coldestC: 8 });
    expect(at(20, 20)).toMatchObject({ ok: true, usableFrom: "2026-06-01T11:00:00.000Z" });
  });

  it("never reads between two rows: 19.9 °C is the row of 5 °C, 4.9 °C that of -5 °C", () => {
    expect(at(19.9, 19.9)).toMatchObject({ row: { minTempC: 5 } });
    expect(at(4.9, 30)).toMatchObject({ row: { minTempC: -5 }, usableFrom: "2026-06-01T22:00:00.000Z" });
  });

  it("refuses below the first row, and says where the table begins", () => {
    expect(at(10, -5.1)).toEqual({
      ok: false,
      reason: "At -5.1 °C this glue is not to be used: its table begins at -5 °C.",
    });
    expect(at(-5, -5)).toMatchObject({ ok: true });
  });

  it("refuses to guess a temperature or a table", () => {
    expect(at(null, 10)).toMatchObject({ ok: false });
    expect(at(10, null)).toMatchObject({ ok: false });
    expect(at(10, 10, [])).toMatchObject({ ok: false });
  });
});
