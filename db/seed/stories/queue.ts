import type { reboltJobs } from "@/db/schema";
import type { Book } from "@/db/seed/book";
import { BENT_ANCHOR, BENT_PLACEMENT } from "@/db/seed/sites/crown-moor";
import { reboltPriority } from "@/lib/domain/rebolt/priority";

interface Entry {
  anchor: string;
  /** Numbers of the placements; absent: all. */
  placements?: readonly number[];
  title: string;
  waitingDays: number;
  /** Opened by the open report about this anchor. */
  byReport?: boolean;
  assigned?: readonly ("bolter" | "steward")[];
  facts?: Partial<typeof reboltJobs.$inferInsert>;
}

/** The rebolt queue: found by reports, proposed by hand, given out, done, turned down. */
export function enterQueue(book: Book): void {
  const { people, calendar } = book;
  const decided = (daysAgo: number, reason: string | null = null) => ({
    decidedBy: people.steward,
    decidedAt: calendar.instantAgo(daysAgo, 19),
    decidedReason: reason,
  });
  const done = (daysAgo: number) => ({ doneAt: calendar.instantAgo(daysAgo, 17), doneBy: people.bolter });
  const entries: readonly Entry[] = [
    {
      anchor: BENT_ANCHOR,
      placements: [BENT_PLACEMENT],
      title: "Bent eye, west end of the long line",
      waitingDays: 38,
      byReport: true,
      assigned: ["bolter"],
      facts: { state: "accepted", dueOn: calendar.ahead(21), ...decided(36) },
    },
    {
      anchor: "Waist, south end",
      title: "Thin bent rods under a line beside the sea",
      waitingDays: 210,
      assigned: ["bolter", "steward"],
      facts: { state: "accepted", dueOn: calendar.ahead(60), ...decided(190) },
    },
    {
      anchor: "Drip Line",
      title: "Cracked eye, and seven more of its kind",
      waitingDays: 25,
      byReport: true,
    },
    {
      anchor: "Hollow flake belay",
      placements: [2],
      title: "Bolt in a hollow flake",
      waitingDays: 57,
      byReport: true,
    },
    { anchor: "Curlew", placements: [3], title: "Eye moves in its glue", waitingDays: 48, byReport: true },
    { anchor: "Salt Tithe", title: "Whole line of 1.4301 in the cave", waitingDays: 300 },
    {
      anchor: "Feather and Wedge, top",
      placements: [1],
      title: "Ring grooved by sandy ropes",
      waitingDays: 33,
      facts: {
        movedBy: people.steward,
        movedPoints: 5,
        movedReason: "The most used top of the quarry; rings are in the hut.",
      },
    },
    {
      anchor: "First Year's Sleeves",
      title: "Hand-drilled M8 sleeves of 1989",
      waitingDays: 900,
      facts: {
        state: "turned_down",
        ...decided(860, "Kept as history: nobody climbs it, a sign says so. The sheet says do not use."),
      },
    },
    {
      anchor: "Low Vault",
      title: "Steel rods in the cave, one cracked",
      waitingDays: 655,
      assigned: ["bolter"],
      facts: {
        state: "done",
        outcome: "new_bolt",
        holeFate: "reused",
        outcomeNote: "Eight titanium rods in the old holes, drilled clean.",
        ...decided(640),
        ...done(610),
      },
    },
  ];
  for (const entry of entries) enterEntry(book, entry);
}

function enterEntry(book: Book, entry: Entry): void {
  const anchor = book.anchorNamed(entry.anchor);
  const since = book.calendar.instantAgo(entry.waitingDays, 14);
  const id = book.ids.at(since);
  const report = entry.byReport
    ? book.reports.find(({ anchorId, state }) => anchorId === anchor.id && state === "open")
    : undefined;
  // No verdict exists yet: load and corrosion count as not known until the anchors are evaluated.
  const { total, parts } = reboltPriority({
    utilisation: null,
    worstGrade: report?.grade ?? null,
    outOfUse: report?.tookOutOfUse ?? false,
    findings: [],
    uses: anchor.uses,
    visitsPerYear: null,
    waitingSince: since.toISOString(),
    now: book.calendar.now.toISOString(),
  });
  book.reboltJobs.push({
    id,
    areaId: anchor.areaId,
    anchorId: anchor.id,
    title: entry.title,
    priority: total,
    priorityParts: [...parts],
    openedByReportId: report?.id ?? null,
    waitingSince: since,
    ...entry.facts,
    ...book.by(since),
  });
  for (const placement of anchor.placements) {
    if (entry.placements && !entry.placements.includes(placement.number)) continue;
    // A finished job is about the bolt that stood there when it was opened.
    const boltId = entry.facts?.state === "done" ? (placement.chain[0] ?? null) : placement.boltId;
    book.reboltJobPlacements.push({ jobId: id, placementId: placement.id, boltId });
  }
  for (const person of entry.assigned ?? []) {
    book.reboltJobAssignees.push({ jobId: id, userId: book.people[person], createdAt: since });
  }
}
