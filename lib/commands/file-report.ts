import "server-only";
import { inTransaction, type Tx } from "@/db/client";
import { type LockedAnchor, lockAnchor, updateFittingRow } from "@/db/repositories/anchors";
import { setRustGrade } from "@/db/repositories/bolts";
import { appendEvents } from "@/db/repositories/events";
import { listRecipients, listStewards } from "@/db/repositories/recipients";
import { findReport, insertReport } from "@/db/repositories/reports";
import type { CommandContext } from "@/lib/commands/context";
import { digestOf } from "@/lib/commands/digest";
import { nudgeMail } from "@/lib/commands/mail-loop";
import { type AboutColumns, aboutAnchor, aboutPlace } from "@/lib/commands/reporting/report-target";
import { takeOutOfUse } from "@/lib/commands/reporting/take-out-of-use";
import { authorize } from "@/lib/commands/writing/authorize";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { idTaken, invalid, isReplay, notFound } from "@/lib/commands/writing/refusals";
import { by, createdBy } from "@/lib/commands/writing/stamp";
import { writeTo } from "@/lib/commands/writing/write-to";
import { REPORT_KIND_LABELS } from "@/lib/domain/labels";
import { draftReport, type ReportDraft } from "@/lib/domain/report/draft-report";
import { reportFiledMail } from "@/lib/mail/templates/register";
import { audience } from "@/lib/policy/audience";
import { roleIn } from "@/lib/policy/can";
import type { FileReportInput } from "@/lib/schemas/report";
import type { Person } from "@/lib/shared/actor";

export interface FiledReport {
  id: string;
  tookOutOfUse: boolean;
  confirmed: boolean;
  replayed: boolean;
}

/**
 * Files what somebody saw. A permanent bend, moving glue, cracked metal or a new, moving or hollow crack takes
 * the bolt and its anchor out of use in this same transaction. Sent twice it is one report.
 */
export async function fileReport(ctx: CommandContext, input: FileReportInput): Promise<FiledReport> {
  const filed = await inTransaction(ctx.db, (tx) => fileIn(tx, ctx, input));
  nudgeMail();
  return filed;
}

async function fileIn(tx: Tx, ctx: CommandContext, input: FileReportInput): Promise<FiledReport> {
  const who = audience(ctx.actor);
  const anchor = input.anchorId ? await lockAnchor(tx, who, input.anchorId) : null;
  if (input.anchorId && !anchor) throw notFound();
  const person = reporter(ctx, anchor, input);
  const digest = digestOf(input);
  const stored = await findReport(tx, input.id);
  if (stored && isReplay(stored, digest)) return answer(stored, true);

  const about = anchor ? await aboutAnchor(tx, anchor, input) : await aboutPlace(tx, who, input);
  const observedAt = input.observedAt.toISOString();
  const drafted = draftReport({ ...input, observedAt }, about.target, ctx.now.toISOString());
  if (!drafted.ok) throw invalid(drafted.problems);
  const { draft } = drafted;

  const { target: _target, placementNumber, ...columns } = about;
  const confirmed = person !== null;
  const row = {
    ...columns,
    id: input.id,
    point: input.point ?? null,
    kind: draft.kind,
    depth: draft.depth,
    observedAt: input.observedAt,
    receivedAt: ctx.now,
    measured: { ...draft.measured },
    grade: draft.grade,
    foundSound: draft.foundSound,
    note: input.note,
    confirmed,
    tookOutOfUse: draft.outOfUseAtOnce && confirmed && anchor !== null,
    reporterName: person?.name ?? input.reporterName ?? null,
    digest,
    ...createdBy(person, ctx.now),
  };
  if (!(await insertReport(tx, row))) throw idTaken();
  if (person) await keepLastSeen(tx, ctx, person, about, draft);
  await appendEvents(tx, ctx, [
    {
      areaId: about.areaId,
      anchorId: about.anchorId,
      subjectType: "report",
      subjectId: input.id,
      kind: "report.filed",
      summary: `${REPORT_KIND_LABELS[draft.kind]}${placementNumber === null ? "" : ` at placement ${placementNumber}`}`,
      after: { kind: draft.kind, depth: draft.depth, grade: draft.grade, measured: draft.measured },
    },
  ]);
  if (anchor && row.tookOutOfUse)
    await takeOutOfUse(tx, ctx, { report: row, anchor, placementNumber, person });
  else if (!draft.foundSound) await tellOfReport(tx, ctx, row, anchor);
  if (anchor) await reevaluate(tx, ctx, [anchor.id]);
  return answer(row, false);
}

/** Signed in, or on the spot with the code of the anchor's tag: then nobody has confirmed it yet. */
function reporter(ctx: CommandContext, anchor: LockedAnchor | null, input: FileReportInput): Person | null {
  const byTag = anchor !== null && input.tagCode?.toUpperCase() === anchor.code.toUpperCase();
  if (ctx.actor.kind === "visitor" && byTag) return null;
  return authorize(ctx.actor, "report.file", { areaId: anchor?.areaId ?? null });
}

function answer(
  row: { id: string; tookOutOfUse: boolean; confirmed: boolean },
  replayed: boolean,
): FiledReport {
  return { id: row.id, tookOutOfUse: row.tookOutOfUse, confirmed: row.confirmed, replayed };
}

/** What a member measured last is kept on the part itself: rust on the bolt, the diameter left of a fitting. */
async function keepLastSeen(
  tx: Tx,
  ctx: CommandContext,
  person: Person,
  about: AboutColumns,
  draft: ReportDraft,
): Promise<void> {
  if (about.areaId === null || roleIn(person, about.areaId) === null) return;
  const { rustGrade, diameterLeftMm } = draft.measured;
  if (about.boltId && typeof rustGrade === "number") await setRustGrade(tx, about.boltId, rustGrade);
  if (about.fittingId && typeof diameterLeftMm === "number") {
    await updateFittingRow(tx, about.fittingId, { diameterLeftMm }, by(person, ctx.now));
  }
}

async function tellOfReport(
  tx: Tx,
  ctx: CommandContext,
  report: { id: string; kind: FileReportInput["kind"]; areaId: string | null; reporterName: string | null },
  anchor: LockedAnchor | null,
): Promise<void> {
  if (report.areaId === null) return;
  const recipients = anchor ? await listRecipients(tx, anchor.id) : await listStewards(tx, report.areaId);
  const mail = reportFiledMail({
    kindLabel: REPORT_KIND_LABELS[report.kind],
    anchorLabel: anchor?.label ?? null,
    siteName: anchor?.siteName ?? null,
    by: report.reporterName ?? "Somebody without an account",
    reportPath: `/reports/${report.id}`,
  });
  await writeTo(tx, recipients, mail, { key: `report:${report.id}`, areaId: report.areaId, now: ctx.now });
}
