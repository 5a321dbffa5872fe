import { z } from "zod";
import {
  anchorFilter,
  anchorListQuery,
  areaQuery,
  idParam,
  matrixQuery,
  queueQuery,
  reportListQuery,
  slugParam,
} from "@/lib/schemas/query";
import { exportParam } from "@/lib/schemas/export";
import { type Paths, read } from "@/lib/schemas/openapi/parts";
import { anchorSheetView, anchorSummaryView, closureView } from "@/lib/schemas/views/anchor";
import { boltDetailView } from "@/lib/schemas/views/bolt-detail";
import { listOf } from "@/lib/schemas/views/common";
import { mapFeaturesView } from "@/lib/schemas/views/map";
import {
  areaDetailView,
  areaView,
  boltTypeView,
  matrixView,
  reportView,
  siteSummaryView,
  siteView,
  spanView,
} from "@/lib/schemas/views/register";
import { batchWarningView, jobView, queueEntryView } from "@/lib/schemas/views/steward";

/** Every GET of the API. */
export const readPaths: Paths = {
  "/areas": { get: read({ summary: "Areas you may know of", answer: listOf(areaView) }) },
  "/areas/{slug}": {
    get: read({
      summary: "An area with its sites and demand",
      answer: areaDetailView,
      params: slugParam,
      tagged: true,
    }),
  },
  "/sites": { get: read({ summary: "Sites", answer: listOf(siteSummaryView), query: areaQuery }) },
  "/sites/{id}": { get: read({ summary: "A site with its anchors", answer: siteView, params: idParam }) },
  "/anchors": {
    get: read({
      summary: "Anchors by place, use, condition, verdict, reason, hardware or words",
      answer: listOf(anchorSummaryView).extend({ total: z.number() }),
      query: anchorListQuery,
    }),
  },
  "/anchors/{id}": {
    get: read({ summary: "The sheet of an anchor", answer: anchorSheetView, params: idParam, tagged: true }),
  },
  "/bolts/{id}": {
    get: read({
      summary: "A bolt with its chain and reasons",
      answer: boltDetailView,
      params: idParam,
      tagged: true,
    }),
  },
  "/bolt-types": { get: read({ summary: "The catalogue", answer: listOf(boltTypeView) }) },
  "/bolt-types/{id}": { get: read({ summary: "A type", answer: boltTypeView, params: idParam }) },
  "/bolt-types/{id}/matrix": {
    get: read({
      summary: "The verdict on a type for every use and kind of place",
      answer: matrixView,
      params: idParam,
      query: matrixQuery,
    }),
  },
  "/spans": { get: read({ summary: "Spans", answer: listOf(spanView), query: areaQuery }) },
  "/spans/{id}": { get: read({ summary: "A span", answer: spanView, params: idParam, tagged: true }) },
  "/reports": {
    get: read({ summary: "Reports, newest first", answer: listOf(reportView), query: reportListQuery }),
  },
  "/reports/{id}": { get: read({ summary: "A report", answer: reportView, params: idParam, tagged: true }) },
  "/rebolt-jobs": {
    get: read({
      summary: "The rebolt queue",
      answer: listOf(queueEntryView),
      query: queueQuery,
      signedIn: true,
    }),
  },
  "/rebolt-jobs/{id}": {
    get: read({ summary: "A rebolt job", answer: jobView, params: idParam, tagged: true, signedIn: true }),
  },
  "/batch-warnings": { get: read({ summary: "Batch warnings", answer: listOf(batchWarningView) }) },
  "/closures": { get: read({ summary: "Closures in force", answer: listOf(closureView) }) },
  "/map": {
    get: read({ summary: "Anchors and spans as GeoJSON", answer: mapFeaturesView, query: anchorFilter }),
  },
  "/export/{file}": {
    get: {
      ...read({
        summary: "Members' export as GeoJSON, CSV or GPX",
        answer: z.string(),
        params: exportParam,
        query: anchorFilter,
        signedIn: true,
      }),
      responses: {
        "200": {
          description: "The file",
          content: {
            "application/geo+json": { schema: z.string() },
            "text/csv": { schema: z.string() },
            "application/gpx+xml": { schema: z.string() },
          },
        },
      },
    },
  },
};
