import type { reports } from "@/db/schema";
import type { Book } from "@/db/seed/book";
import { offset } from "@/db/seed/island/frame";
import { personName } from "@/db/seed/people";
import type { Entered } from "@/db/seed/spec";
import { ROUTINE_CHECKS } from "@/db/seed/stories/checks";
import { ANSWERED_SIGHTINGS } from "@/db/seed/stories/answered-sightings";
import { OPEN_SIGHTINGS } from "@/db/seed/stories/open-sightings";
import type { Sighting } from "@/db/seed/stories/sighting";

type ReportRow = typeof reports.$inferInsert;

/** Every check and every sighting; what took a bolt out of use has done so. */
export function enterReports(book: Book): void {
  for (const [label, by, daysAgo, note] of ROUTINE_CHECKS) {
    const observedAt = book.calendar.instantAgo(daysAgo);
    enterReport(book, book.anchorNamed(label), {
      by,
      kind: "routine_check",
      depth: "handled",
      observedAt,
      grade: 0,
      foundSound: true,
      note,
      state: "handled",
      handledAt: observedAt,
      handledBy: book.people[by],
      handledHow: "A check that found nothing needs no answer.",
    });
  }
  for (const sighting of [...ANSWERED_SIGHTINGS, ...OPEN_SIGHTINGS]) enterSighting(book, sighting);
}

function enterSighting(book: Book, sighting: Sighting): void {
  const anchor = book.anchorNamed(sighting.anchor);
  const subject = subjectOf(book, anchor, sighting);
  const observedAt = book.calendar.instantAgo(sighting.daysAgo, 10);
  enterReport(book, anchor, {
    by: sighting.by,
    ...subject,
    kind: sighting.kind,
    depth: sighting.depth,
    observedAt,
    measured: { ...sighting.measured },
    grade: sighting.grade ?? null,
    note: sighting.note,
    tookOutOfUse: sighting.tookOutOfUse ?? false,
    ...answerOf(book, sighting),
  });
  if (sighting.tookOutOfUse && sighting.answered === undefined) {
    takeOut(book, anchor.id, subject.boltId ?? null, observedAt);
  }
}

/** What it is about: a bolt, a fitting, a line, or a point beside the anchor it was seen from. */
function subjectOf(book: Book, anchor: Entered, sighting: Sighting): Partial<ReportRow> {
  if (sighting.nearby) {
    const from = book.anchors.find(({ id }) => id === anchor.id)?.point;
    return { anchorId: null, point: from && offset(from, sighting.nearby) };
  }
  if (sighting.fitting) return { fittingId: anchor.fittingIds[0] };
  if (sighting.span) return { spanId: book.spans.find(({ name }) => name === sighting.span)?.id };
  const placement = anchor.placements.find(({ number }) => number === sighting.placement);
  return {
    placementId: placement?.id,
    boltId: sighting.formerBolt ? placement?.chain.at(-2) : placement?.boltId,
  };
}

function answerOf(book: Book, { answered }: Sighting): Partial<ReportRow> {
  if (answered === undefined) return { state: "open" };
  const [daysAgo, how] = answered;
  return {
    state: "handled",
    handledAt: book.calendar.instantAgo(daysAgo, 18),
    handledBy: book.people.steward,
    handledHow: how,
  };
}

function enterReport(
  book: Book,
  anchor: Entered,
  report: Omit<ReportRow, "id"> & { by: Sighting["by"] },
): void {
  const { by, ...facts } = report;
  const receivedAt = new Date(report.observedAt.getTime() + 4 * 3_600_000);
  const id = book.ids.at(receivedAt);
  book.reports.push({
    id,
    areaId: anchor.areaId,
    siteId: anchor.siteId,
    anchorId: anchor.id,
    receivedAt,
    reporterName: personName(by),
    ...facts,
    ...book.by(receivedAt, by),
  });
}

/** As filing the report does: the bolt and its whole anchor, from the moment it was seen. */
function takeOut(book: Book, anchorId: string, boltId: string | null, since: Date): void {
  const out = { condition: "out_of_use", derivedCondition: "out_of_use", outOfUseSince: since } as const;
  for (const anchor of book.anchors) if (anchor.id === anchorId) Object.assign(anchor, out);
  for (const bolt of book.bolts) if (bolt.id === boltId) Object.assign(bolt, out);
}
