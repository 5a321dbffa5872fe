import { z } from "zod";
import { anchorSummaryView } from "@/lib/schemas/views/anchor";
import { conditionView, pointView } from "@/lib/schemas/views/common";

const position = z.tuple([z.number(), z.number()]);

/** What the map draws; the list twin shows the same. */
export const mapFeaturesView = z
  .object({
    anchors: z.object({
      type: z.literal("FeatureCollection"),
      features: z.array(
        z.object({
          type: z.literal("Feature"),
          id: z.string(),
          geometry: pointView,
          properties: anchorSummaryView.omit({ point: true }),
        }),
      ),
    }),
    spans: z.object({
      type: z.literal("FeatureCollection"),
      features: z.array(
        z.object({
          type: z.literal("Feature"),
          id: z.string(),
          geometry: z.object({ type: z.literal("LineString"), coordinates: z.tuple([position, position]) }),
          properties: z.object({
            id: z.string(),
            name: z.string(),
            lengthM: z.number(),
            aCode: z.string(),
            bCode: z.string(),
            conditions: z.array(conditionView),
          }),
        }),
      ),
    }),
  })
  .meta({ id: "MapFeatures" });

export type MapFeatures = z.infer<typeof mapFeaturesView>;
