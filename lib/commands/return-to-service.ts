import "server-only";
import type { Tx } from "@/db/client";
import { appendEvents } from "@/db/repositories/events";
import { loadEvidenceRows } from "@/db/repositories/evidence";
import { listRecipients } from "@/db/repositories/recipients";
import { listReportsWithPhoto, setOutOfUseSince } from "@/db/repositories/reports";
import type { CommandContext } from "@/lib/commands/context";
import { conditionOf } from "@/lib/commands/evaluation/apply-conditions";
import { handCheckOf, openFacts } from "@/lib/commands/evaluation/reports-by-bolt";
import { type RowsOfAnchor, rowsByAnchor } from "@/lib/commands/evaluation/rows-by-anchor";
import { nudgeMail } from "@/lib/commands/mail-loop";
import { onAnchor } from "@/lib/commands/writing/on-anchor";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { notFound } from "@/lib/commands/writing/refusals";
import { writeTo } from "@/lib/commands/writing/write-to";
import { type BoltForReturn, missingForReturn } from "@/lib/domain/condition/missing-for-return";
import { standsSince } from "@/lib/domain/condition/stands-since";
import { lasts } from "@/lib/domain/finding/open-reports";
import type { Condition } from "@/lib/domain/vocabulary";
import { backInServiceMail } from "@/lib/mail/templates/register";
import type { ReturnToServiceInput } from "@/lib/schemas/report";
import { AppError } from "@/lib/shared/errors";

/**
 * Puts an anchor that an event took out of use back, when every bolt that carried the event was checked by hand
 * since, each with a photo. @throws AppError `refused_by_rule` that names all that is missing.
 */
export async function returnToService(
  ctx: CommandContext,
  { anchorId, reason }: ReturnToServiceInput,
): Promise<{ condition: Condition }> {
  const done = await onAnchor(ctx, anchorId, "service.return", async ({ tx, anchor, person }) => {
    const since = anchor.outOfUseSince;
    if (since === null) {
      throw new AppError("refused_by_rule", "This anchor was not taken out of use by an event.");
    }
    const [rows] = rowsByAnchor(await loadEvidenceRows(tx, [anchorId]));
    if (!rows) throw notFound();
    const problems = await missingFor(tx, rows, { since, now: ctx.now, userId: person.userId });
    if (problems.length > 0) {
      throw new AppError("refused_by_rule", `Not yet: ${problems.map((one) => one.message).join(" ")}`, {
        problems,
      });
    }
    await setOutOfUseSince(tx, anchorId, null);
    const [judged] = await reevaluate(tx, ctx, [anchorId]);
    const condition = judged?.after.condition ?? "out_of_use";
    if (condition === "out_of_use" || condition === "removed") {
      throw new AppError(
        "refused_by_rule",
        "Too few bolts that may be used are left for what it is used for.",
      );
    }
    await appendEvents(tx, ctx, [
      {
        areaId: anchor.areaId,
        anchorId,
        subjectType: "anchor",
        subjectId: anchorId,
        kind: "anchor.returned",
        summary: condition === "in_service" ? "Put back in service" : "Put back: check first",
        before: { condition: anchor.condition, outOfUseSince: since.toISOString() },
        after: { condition },
        reason,
      },
    ]);
    const about = {
      anchorLabel: anchor.label,
      siteName: anchor.siteName,
      sheetPath: `/anchors/${anchor.code}`,
    };
    const mail = backInServiceMail({ ...about, by: person.name, reason });
    const cause = { key: `returned:${anchorId}:${since.getTime()}`, areaId: anchor.areaId, now: ctx.now };
    await writeTo(tx, await listRecipients(tx, anchorId), mail, cause);
    return { condition };
  });
  nudgeMail();
  return done;
}

async function missingFor(tx: Tx, rows: RowsOfAnchor, at: { since: Date; now: Date; userId: string }) {
  const found = conditionOf({ ...rows, bolts: rows.all }, at.now);
  const checks = rows.bolts.map((entry) => handCheckOf(entry.bolt.id, rows.reports.all)?.report ?? null);
  const withPhoto = await listReportsWithPhoto(
    tx,
    checks.filter((check) => check !== null).map((check) => check.id),
  );
  const bolts = rows.bolts.map(({ bolt }, index): BoltForReturn => {
    const check = checks[index] ?? null;
    const stands = standsSince(bolt);
    return {
      placementNumber: rows.placements.find((one) => one.id === bolt.placementId)?.number ?? 0,
      outOfUse: found.bolts.some((one) => one.boltId === bolt.id && one.condition === "out_of_use"),
      newerThanEvent: stands !== null && stands > at.since.toISOString(),
      check:
        check === null || check.observedAt <= at.since
          ? null
          : { byUserId: check.createdBy, hasPhoto: withPhoto.has(check.id) },
    };
  });
  return missingForReturn(bolts, {
    secondPerson: rows.policy.secondPersonForReturn,
    returnedBy: at.userId,
    anchorReportsOpen: openFacts(rows.reports.ofAnchor).filter((report) => report.confirmed && lasts(report))
      .length,
  });
}
