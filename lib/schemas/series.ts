import { z } from "zod";
import { logInstallSeriesInput } from "@/lib/schemas/bolt";
import { formInput } from "@/lib/schemas/form-input";

const record = z.record(z.string(), z.unknown());
const sent = z.looseObject({ common: record.default({}), bolts: z.record(z.string(), record).default({}) });

/**
 * A form for several bolts: what they share is sent once under `common`, the rest under `bolts.0`, `bolts.1`…
 * Here each bolt gets the common values; its own value wins.
 */
export function spreadCommon(value: unknown): Record<string, unknown> & { bolts: unknown[] } {
  const parsed = sent.safeParse(value);
  if (!parsed.success) return { bolts: [] };
  const { common, bolts, ...rest } = parsed.data;
  const rows = Object.entries(bolts).toSorted(([a], [b]) => Number(a) - Number(b));
  return { ...rest, bolts: rows.map(([, bolt]) => ({ ...common, ...bolt })) };
}

export const seriesForm = z.preprocess(spreadCommon, formInput(logInstallSeriesInput));
