import "server-only";
import { inTransaction, type Tx } from "@/db/client";
import {
  findAnchorRow,
  findPlacement,
  lockAnchor,
  updateAnchorRow,
  updatePlacementRow,
} from "@/db/repositories/anchors";
import { type BoltRow, findBolt, findBoltInForce, updateBoltRow } from "@/db/repositories/bolts";
import { appendEvents } from "@/db/repositories/events";
import {
  findReport,
  lastReturnAt,
  newestOutOfUseEvent,
  reopenReports,
  setOutOfUseSince,
  updateReportRow,
} from "@/db/repositories/reports";
import { findSpan, updateSpanRow } from "@/db/repositories/spans";
import type { CommandContext } from "@/lib/commands/context";
import { authorize } from "@/lib/commands/writing/authorize";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { invalidField, notFound } from "@/lib/commands/writing/refusals";
import { by } from "@/lib/commands/writing/stamp";
import { audience } from "@/lib/policy/audience";
import type { StrikeInput } from "@/lib/schemas/bolt";
import type { Person } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

type Struck = { struckAt: Date; struckBy: string; struckReason: string };

/** Strikes a wrong record through, with a reason. Nothing is deleted: it stays in history and export. */
export async function strikeRecord(ctx: CommandContext, input: StrikeInput): Promise<{ id: string }> {
  const anchorId = await anchorIdOf(ctx, input);
  return inTransaction(ctx.db, async (tx) => {
    const anchor = anchorId === null ? null : await lockAnchor(tx, audience(ctx.actor), anchorId);
    if (!anchor) throw notFound();
    const person = authorize(ctx.actor, "record.strike", { areaId: anchor.areaId });
    const struck = { struckAt: ctx.now, struckBy: person.userId, struckReason: input.reason };
    await strike(tx, input, struck, { person, now: ctx.now, anchorId: anchor.id });
    await appendEvents(tx, ctx, [
      {
        areaId: anchor.areaId,
        anchorId: anchor.id,
        subjectType: input.subject,
        subjectId: input.id,
        kind: `${input.subject}.struck`,
        summary: `Struck through: ${input.subject}`,
        reason: input.reason,
      },
    ]);
    await reevaluate(tx, ctx, [anchor.id]);
    return { id: input.id };
  });
}

async function anchorIdOf(ctx: CommandContext, { subject, id }: StrikeInput): Promise<string | null> {
  switch (subject) {
    case "anchor":
      return (await findAnchorRow(ctx.db, id))?.id ?? null;
    case "placement":
      return (await findPlacement(ctx.db, id))?.anchorId ?? null;
    case "bolt":
      return (await findBolt(ctx.db, id))?.anchorId ?? null;
    case "span":
      return (await findSpan(ctx.db, id))?.anchorAId ?? null;
    case "report":
      return (await findReport(ctx.db, id))?.anchorId ?? null;
  }
}

async function strike(
  tx: Tx,
  { subject, id, reason }: StrikeInput,
  struck: Struck,
  { person, now, anchorId }: { person: Person; now: Date; anchorId: string },
): Promise<void> {
  const who = by(person, now);
  switch (subject) {
    case "anchor":
      return updateAnchorRow(tx, id, struck, who);
    case "placement":
      if ((await findPlacement(tx, id))?.struckAt) throw struckAlready();
      if (await findBoltInForce(tx, id)) throw invalidField("id", "A bolt stands in it: strike that first.");
      return updatePlacementRow(tx, id, struck, who);
    case "bolt": {
      const found = await findBolt(tx, id);
      if (found?.bolt.struckAt) throw struckAlready();
      await updateBoltRow(tx, id, struck, who);
      return reviveFormer(tx, found?.bolt ?? null, who);
    }
    case "span":
      if ((await findSpan(tx, id))?.struckAt) throw struckAlready();
      return updateSpanRow(tx, id, struck, who);
    case "report": {
      const report = await findReport(tx, id);
      if (report?.state === "struck") throw struckAlready();
      const answer = {
        state: "struck" as const,
        handledAt: now,
        handledBy: person.userId,
        handledHow: reason,
      };
      await updateReportRow(tx, id, answer, who);
      if (!report?.tookOutOfUse) return;
      return setOutOfUseSince(
        tx,
        anchorId,
        await newestOutOfUseEvent(tx, anchorId, await lastReturnAt(tx, anchorId)),
      );
    }
  }
}

/** When the install was never made, the bolt it had replaced still stands in the hole, with all said against it. */
async function reviveFormer(tx: Tx, bolt: BoltRow | null, who: { userId: string; now: Date }): Promise<void> {
  if (!bolt || bolt.removedOn !== null) return;
  await reopenReports(tx, { placementId: bolt.placementId, handledAt: bolt.createdAt }, who);
  if (bolt.replacesBoltId === null) return;
  await updateBoltRow(tx, bolt.replacesBoltId, { removedOn: null, removedBy: null, removedWhy: null }, who);
}

function struckAlready(): AppError {
  return new AppError("conflict", "This record is struck through already.");
}
