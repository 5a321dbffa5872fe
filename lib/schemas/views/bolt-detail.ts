import { z } from "zod";
import { sheetFindingView, sheetReportView } from "@/lib/schemas/views/anchor";
import { boltView } from "@/lib/schemas/views/bolt";
import { useView } from "@/lib/schemas/views/common";

/** One bolt with the hole it sits in, its predecessors (newest first, itself included) and its reasons. */
export const boltDetailView = z
  .object({
    bolt: boltView,
    anchor: z.object({
      id: z.string(),
      code: z.string(),
      label: z.string(),
      siteName: z.string(),
      siteSlug: z.string(),
      timeZone: z.string(),
      uses: z.array(useView),
    }),
    placementNumber: z.number(),
    hole: z.object({ diameterMm: z.number().nullable(), depthMm: z.number().nullable() }),
    chain: z.array(boltView),
    findings: z.array(sheetFindingView),
    reports: z.array(sheetReportView),
    caution: z.string(),
  })
  .meta({ id: "BoltDetail" });

export type BoltDetail = z.infer<typeof boltDetailView>;
