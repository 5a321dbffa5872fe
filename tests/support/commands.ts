import { v7 } from "uuid";
import { addPhoto } from "@/lib/commands/add-photo";
import { addPlacement } from "@/lib/commands/add-placement";
import type { CommandContext } from "@/lib/commands/context";
import { createAnchor } from "@/lib/commands/create-anchor";
import { createSpan } from "@/lib/commands/create-span";
import { decideCondition } from "@/lib/commands/decide-condition";
import { fileReport } from "@/lib/commands/file-report";
import { handleReport } from "@/lib/commands/handle-report";
import { logInstall, logInstallSeries } from "@/lib/commands/log-install";
import { moveAnchor } from "@/lib/commands/move-anchor";
import { openReboltJob } from "@/lib/commands/open-rebolt-job";
import { assignJob } from "@/lib/commands/rebolt/assign-job";
import { completeJob } from "@/lib/commands/rebolt/complete-job";
import { decideJob } from "@/lib/commands/rebolt/decide-job";
import { moveJob } from "@/lib/commands/rebolt/move-job";
import { recordHandCheck } from "@/lib/commands/record-hand-check";
import { recordPullTest } from "@/lib/commands/record-pull-test";
import { returnToService } from "@/lib/commands/return-to-service";
import { setWatch } from "@/lib/commands/set-watch";
import { closeBatchWarning } from "@/lib/commands/stewarding/close-batch-warning";
import { createArea } from "@/lib/commands/stewarding/create-area";
import { createSite } from "@/lib/commands/stewarding/create-site";
import { liftClosure } from "@/lib/commands/stewarding/lift-closure";
import { publishBatchWarning } from "@/lib/commands/stewarding/publish-batch-warning";
import { updateSite } from "@/lib/commands/stewarding/update-site";
import { writeClosure } from "@/lib/commands/stewarding/write-closure";
import { strikeRecord } from "@/lib/commands/strike-record";
import { updateAnchor } from "@/lib/commands/update-anchor";
import { updateBolt } from "@/lib/commands/update-bolt";
import { updatePlacement } from "@/lib/commands/update-placement";
import { addPlacementInput, createAnchorInput, createSpanInput } from "@/lib/schemas/anchor";
import { logInstallInput, logInstallSeriesInput } from "@/lib/schemas/bolt";
import { openReboltJobInput } from "@/lib/schemas/rebolt";
import { fileReportInput, handCheckInput } from "@/lib/schemas/report";
import { batchWarningInput, closureInput, createAreaInput, createSiteInput } from "@/lib/schemas/steward";
import { first, installOf, reportOf, smallJpeg } from "@/tests/support/inputs";
import { NOON } from "@/tests/support/people";
import type { Register } from "@/tests/support/register";

/** The least that may run a command: `own`: bolters only what is given to them. */
export type Needs = "person" | "bolter" | "bolter-own" | "steward" | "admin" | "writer-or-member";

interface CommandCase {
  name: string;
  needs: Needs;
  run: (ctx: CommandContext, r: Register) => Promise<unknown>;
}

const version = 1;

/** Every command of the register that people run, with input that is right in all but who sends it. */
export const COMMANDS: readonly CommandCase[] = [
  {
    name: "createAnchor",
    needs: "bolter",
    run: (ctx, r) =>
      createAnchor(
        ctx,
        createAnchorInput.parse({
          id: v7(),
          siteId: r.siteId,
          point: { lon: -9.5, lat: 52.1 },
          label: "New",
          uses: ["belay"],
          placements: [{ id: v7() }, { id: v7() }],
        }),
      ),
  },
  {
    name: "updateAnchor",
    needs: "bolter",
    run: (ctx, r) => updateAnchor(ctx, { id: r.anchor.id, version, change: { label: "Renamed" } }),
  },
  {
    name: "moveAnchor",
    needs: "bolter",
    run: (ctx, r) =>
      moveAnchor(ctx, {
        id: r.anchor.id,
        version,
        move: { point: { lon: -9.51, lat: 52.1 }, reason: "Measured again" },
      }),
  },
  {
    name: "addPlacement",
    needs: "bolter",
    run: (ctx, r) =>
      addPlacement(ctx, addPlacementInput.parse({ id: v7(), anchorId: r.anchor.id, kind: "tree" })),
  },
  {
    name: "updatePlacement",
    needs: "bolter",
    run: (ctx, r) =>
      updatePlacement(ctx, { id: first(r.anchor.placementIds), version, change: { edgeDistanceMm: 400 } }),
  },
  {
    name: "createSpan",
    needs: "bolter",
    run: (ctx, r) =>
      createSpan(
        ctx,
        createSpanInput.parse({ id: v7(), anchorAId: r.anchor.id, anchorBId: r.other.id, name: "The gap" }),
      ),
  },
  {
    name: "logInstall",
    needs: "bolter",
    run: (ctx, r) => logInstall(ctx, logInstallInput.parse(installOf(r))),
  },
  {
    name: "logInstallSeries",
    needs: "bolter",
    run: (ctx, r) => {
      const { anchorId, ...bolt } = installOf(r);
      return logInstallSeries(ctx, logInstallSeriesInput.parse({ anchorId, bolts: [bolt] }));
    },
  },
  {
    name: "updateBolt",
    needs: "bolter",
    run: (ctx, r) => updateBolt(ctx, { id: first(r.anchor.boltIds), version, change: { batch: "B-7" } }),
  },
  {
    name: "recordPullTest",
    needs: "bolter",
    run: (ctx, r) =>
      recordPullTest(ctx, {
        id: v7(),
        boltId: first(r.anchor.boltIds),
        direction: "axial",
        loadKn: 8,
        mode: "held",
        testedOn: "2026-05-31",
      }),
  },
  {
    name: "strikeRecord",
    needs: "steward",
    run: (ctx, r) =>
      strikeRecord(ctx, { subject: "bolt", id: first(r.anchor.boltIds), reason: "Never there" }),
  },
  {
    name: "fileReport",
    needs: "person",
    run: (ctx, r) => fileReport(ctx, fileReportInput.parse(reportOf(r, {}))),
  },
  {
    name: "recordHandCheck",
    needs: "person",
    run: (ctx, r) =>
      recordHandCheck(
        ctx,
        handCheckInput.parse({
          id: v7(),
          anchorId: r.anchor.id,
          placementId: first(r.anchor.placementIds),
          observedAt: NOON.toISOString(),
        }),
      ),
  },
  {
    name: "handleReport",
    needs: "steward",
    run: (ctx, r) =>
      handleReport(ctx, { id: r.reportId, version, answer: { answer: "handled", how: "Tightened" } }),
  },
  {
    name: "decideCondition",
    needs: "steward",
    run: (ctx, r) =>
      decideCondition(ctx, { anchorId: r.anchor.id, condition: "check_first", reason: "After the storm" }),
  },
  {
    name: "returnToService",
    needs: "steward",
    run: (ctx, r) => returnToService(ctx, { anchorId: r.ready.id, reason: "Both checked" }),
  },
  {
    name: "openReboltJob",
    needs: "steward",
    run: (ctx, r) =>
      openReboltJob(
        ctx,
        openReboltJobInput.parse({
          id: v7(),
          anchorId: r.other.id,
          placementIds: r.other.placementIds,
          title: "Old rods",
        }),
      ),
  },
  {
    name: "decideJob",
    needs: "steward",
    run: (ctx, r) => decideJob(ctx, { id: r.jobId, version }, { action: "decide", decision: "accepted" }),
  },
  {
    name: "assignJob",
    needs: "steward",
    run: (ctx, r) => assignJob(ctx, { id: r.jobId, version }, { action: "assign", userIds: [] }),
  },
  {
    name: "moveJob",
    needs: "steward",
    run: (ctx, r) =>
      moveJob(ctx, { id: r.jobId, version }, { action: "move", points: 5, reason: "Busy week" }),
  },
  {
    name: "completeJob",
    needs: "bolter-own",
    run: (ctx, r) =>
      completeJob(
        ctx,
        { id: r.jobId, version },
        { action: "complete", outcome: "tightened", holeFate: null, note: "", photoId: r.jobPhotoId },
      ),
  },
  {
    name: "addPhoto",
    needs: "writer-or-member",
    run: async (ctx, r) =>
      addPhoto(ctx, { id: v7(), caption: "", bytes: await smallJpeg(), to: { reportId: r.reportId } }),
  },
  {
    name: "setWatch",
    needs: "person",
    run: (ctx, r) => setWatch(ctx, { anchorId: r.anchor.id, on: true }),
  },
  {
    name: "publishBatchWarning",
    needs: "steward",
    run: (ctx, r) =>
      publishBatchWarning(
        ctx,
        batchWarningInput.parse({
          id: v7(),
          areaId: r.areaId,
          title: "Brittle eyes",
          body: "Take them out.",
          says: "stop",
          boltTypeId: r.typeId,
        }),
      ),
  },
  {
    name: "closeBatchWarning",
    needs: "steward",
    run: (ctx, r) => closeBatchWarning(ctx, { id: r.warningId, version, reason: "All inspected" }),
  },
  {
    name: "writeClosure",
    needs: "steward",
    run: (ctx, r) =>
      writeClosure(
        ctx,
        closureInput.parse({
          id: v7(),
          areaId: r.areaId,
          siteId: r.siteId,
          reason: "Rockfall",
          startsOn: "2026-06-01",
        }),
      ),
  },
  {
    name: "liftClosure",
    needs: "steward",
    run: (ctx, r) => liftClosure(ctx, { id: r.closureId, version, reason: "The birds are gone" }),
  },
  {
    name: "createArea",
    needs: "admin",
    run: (ctx) => createArea(ctx, createAreaInput.parse({ id: v7(), slug: `a-${v7()}`, name: "North" })),
  },
  {
    name: "createSite",
    needs: "steward",
    run: (ctx, r) =>
      createSite(
        ctx,
        createSiteInput.parse({
          id: v7(),
          areaId: r.areaId,
          slug: `s-${v7()}`,
          name: "The Wall",
          point: { lon: -9.5, lat: 52.1 },
        }),
      ),
  },
  {
    name: "updateSite",
    needs: "steward",
    run: (ctx, r) => updateSite(ctx, { id: r.siteId, version, change: { ucsMpa: 60 } }),
  },
];
