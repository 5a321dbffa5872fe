import { date, doublePrecision, index, jsonb, pgTable, primaryKey, text, uuid } from "drizzle-orm/pg-core";
import { audit, instant, sentDigest } from "@/db/columns/audit";
import { anchors, placements } from "@/db/schema/anchor";
import { areas } from "@/db/schema/area";
import { bolts } from "@/db/schema/bolt";
import { users } from "@/db/schema/people";
import { reports } from "@/db/schema/report";
import type { HoleFate, JobOutcome, JobState } from "@/lib/domain/vocabulary";

/** One named part of a priority, as computed. */
export interface PriorityPart {
  key: string;
  label: string;
  points: number;
  max: number;
  why: string;
}

/** An entry of the rebolt queue; accepted and given to somebody it is a job. */
export const reboltJobs = pgTable(
  "rebolt_jobs",
  {
    id: uuid().primaryKey(),
    areaId: uuid()
      .notNull()
      .references(() => areas.id),
    anchorId: uuid()
      .notNull()
      .references(() => anchors.id),
    state: text().$type<JobState>().notNull().default("proposed"),
    title: text().notNull(),
    /** Computed rank; stays visible when a steward moves the entry. */
    priority: doublePrecision().notNull().default(0),
    priorityParts: jsonb().$type<PriorityPart[]>().notNull().default([]),
    /** Points a steward added or took away, and why. Null: not moved. */
    movedBy: uuid(),
    movedPoints: doublePrecision(),
    movedReason: text(),
    /** The report that opened it; null: proposed by hand. */
    openedByReportId: uuid().references(() => reports.id),
    waitingSince: instant().notNull(),
    dueOn: date({ mode: "string" }),
    outcome: text().$type<JobOutcome>(),
    holeFate: text().$type<HoleFate>(),
    outcomeNote: text(),
    outcomePhotoId: uuid(),
    newBoltId: uuid().references(() => bolts.id),
    decidedReason: text(),
    decidedBy: uuid(),
    decidedAt: instant(),
    doneAt: instant(),
    doneBy: uuid(),
    ...sentDigest(),
    ...audit(),
  },
  (t) => [index().on(t.areaId, t.state), index().on(t.anchorId)],
);

/** Which placements a job is about, and the bolt that stood there when it was opened. */
export const reboltJobPlacements = pgTable(
  "rebolt_job_placements",
  {
    jobId: uuid()
      .notNull()
      .references(() => reboltJobs.id),
    placementId: uuid()
      .notNull()
      .references(() => placements.id),
    boltId: uuid().references(() => bolts.id),
  },
  (t) => [primaryKey({ columns: [t.jobId, t.placementId] })],
);

export const reboltJobAssignees = pgTable(
  "rebolt_job_assignees",
  {
    jobId: uuid()
      .notNull()
      .references(() => reboltJobs.id),
    userId: uuid()
      .notNull()
      .references(() => users.id),
    createdAt: instant().notNull().defaultNow(),
  },
  (t) => [primaryKey({ columns: [t.jobId, t.userId] })],
);
