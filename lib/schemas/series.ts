import { z } from "zod";
import { logInstallSeriesInput } from "@/lib/schemas/bolt";
import { formInput } from "@/lib/schemas/form-input";

const record = z.record(z.string(), z.unknown());
const sent = z.looseObject({
  anchorId: z.unknown(),
  common: record.default({}),
  bolts: z.record(z.string(), record).default({}),
});

/**
 * The series form: what all bolts share is sent once under `common`, the rest under `bolts.0`, `bolts.1`…
 * A bolt's own value wins over the common one.
 */
export const seriesForm = z.preprocess((value) => {
  const parsed = sent.safeParse(value);
  if (!parsed.success) return value;
  const { anchorId, common, bolts } = parsed.data;
  const rows = Object.entries(bolts).toSorted(([a], [b]) => Number(a) - Number(b));
  return { anchorId, bolts: rows.map(([, bolt]) => ({ ...common, ...bolt })) };
}, formInput(logInstallSeriesInput));
