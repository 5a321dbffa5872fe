import { z } from "zod";

export const EXPORT_FILES = ["anchors.geojson", "anchors.csv", "anchors.gpx"] as const;
export const exportParam = z.object({ file: z.enum(EXPORT_FILES) });
export type ExportFile = (typeof EXPORT_FILES)[number];
