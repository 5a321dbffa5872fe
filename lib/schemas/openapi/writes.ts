import { z } from "zod";
import { anchorPatch, createAnchorInput, createSpanInput } from "@/lib/schemas/anchor";
import { boltPatch, logInstallInput } from "@/lib/schemas/bolt";
import { type Paths, write } from "@/lib/schemas/openapi/parts";
import { idParam } from "@/lib/schemas/query";
import { jobAction, openReboltJobInput } from "@/lib/schemas/rebolt";
import { fileReportInput, handleReportInput } from "@/lib/schemas/report";
import { batchWarningInput, closureInput } from "@/lib/schemas/steward";
import { whatIfInput } from "@/lib/schemas/verdict";
import { findingView, placeClassView, verdictView } from "@/lib/schemas/views/common";

/** What a write answers at the least: the record's id and, for existing ones, its new version. */
const stored = z.looseObject({ id: z.string(), version: z.number().optional() }).meta({ id: "Stored" });

const whatIfAnswer = z
  .object({
    verdict: verdictView,
    engine: z.string(),
    placeClass: placeClassView.nullable(),
    findings: z.array(findingView),
    caution: z.string(),
  })
  .meta({ id: "WhatIfAnswer" });

const photoUpload = z.object({
  id: z.uuid(),
  file: z.string().meta({ format: "binary", description: "JPEG, PNG or WebP, at most 20 MB" }),
  caption: z.string().optional(),
});

/** Every POST and PATCH of the API. */
export const writePaths: Paths = {
  "/verdicts": {
    post: write({
      summary: "What if: the verdict on a bolt that is not stored",
      body: whatIfInput,
      answer: whatIfAnswer,
      computesOnly: true,
    }),
  },
  "/anchors": { post: write({ summary: "Register an anchor", body: createAnchorInput, answer: stored }) },
  "/anchors/{id}": {
    patch: write({
      summary: "Correct or move an anchor",
      body: anchorPatch,
      answer: stored,
      params: idParam,
      onExisting: true,
    }),
  },
  "/spans": { post: write({ summary: "Register a span", body: createSpanInput, answer: stored }) },
  "/bolts": { post: write({ summary: "Log an install", body: logInstallInput, answer: stored }) },
  "/bolts/{id}": {
    patch: write({
      summary: "Correct a bolt's record",
      body: boltPatch,
      answer: stored,
      params: idParam,
      onExisting: true,
    }),
  },
  "/reports": { post: write({ summary: "Report what you saw", body: fileReportInput, answer: stored }) },
  "/reports/{id}": {
    patch: write({
      summary: "Answer a report",
      body: handleReportInput,
      answer: stored,
      params: idParam,
      onExisting: true,
    }),
  },
  "/reports/{id}/photos": {
    post: write({
      summary: "Add a photo to a report",
      body: photoUpload,
      answer: stored,
      params: idParam,
      mediaType: "multipart/form-data",
    }),
  },
  "/bolts/{id}/photos": {
    post: write({
      summary: "Add a photo to a bolt",
      body: photoUpload,
      answer: stored,
      params: idParam,
      mediaType: "multipart/form-data",
    }),
  },
  "/rebolt-jobs/{id}/photos": {
    post: write({
      summary: "Add a photo of the finished work to a rebolt job",
      body: photoUpload,
      answer: stored,
      params: idParam,
      mediaType: "multipart/form-data",
    }),
  },
  "/rebolt-jobs": {
    post: write({ summary: "Open a rebolt entry", body: openReboltJobInput, answer: stored }),
  },
  "/rebolt-jobs/{id}": {
    patch: write({
      summary: "Decide, assign, move or complete a job",
      body: jobAction,
      answer: stored,
      params: idParam,
      onExisting: true,
    }),
  },
  "/batch-warnings": {
    post: write({ summary: "Publish a batch warning", body: batchWarningInput, answer: stored }),
  },
  "/closures": {
    post: write({ summary: "Close an area, a site or an anchor", body: closureInput, answer: stored }),
  },
};
