import type { Book } from "@/db/seed/book";
import type { Ground } from "@/db/seed/ground";
import { WARNED_BATCH, WARNED_DAY, WARNED_GLUE } from "@/db/seed/sites/fellgate-wall";

/** Closures, warnings, decisions, pulls, and who wants to hear about what. */
export function enterNotices(book: Book, ground: Ground): void {
  enterClosure(book, ground);
  enterWarning(book, ground);
  decideAgainst(book, "Old landing studs", "Rusted to one lump; kept on record, not in use.");
  enterPulls(book);
  enterWatches(book, ground);
}

function enterClosure(book: Book, { tarrow, pillarStack }: Ground): void {
  const at = new Date("2017-02-11T10:00:00Z");
  book.closures.push({
    id: book.ids.at(at),
    areaId: tarrow,
    siteId: pillarStack.id,
    reason: "Seabirds nest on the stack and its rim: no climbing, no line, no boat landing.",
    startsOn: "2017-03-01",
    endsOn: "2017-08-15",
    yearly: true,
    source: "Agreed with the bird wardens, minutes of the yearly meeting",
    ...book.by(at),
  });
}

function enterWarning(book: Book, { tarrow }: Ground): void {
  const at = book.calendar.instantAgo(260, 18);
  book.batchWarnings.push({
    id: book.ids.at(at),
    areaId: tarrow,
    title: `Grey polyester glue, batch ${WARNED_BATCH}`,
    body: "Cartridges of this batch stayed soft in three test holes. Load each eye sideways by hand and look for play; report what you find, also when nothing moves.",
    says: "inspect",
    adhesiveId: book.adhesiveId(WARNED_GLUE),
    batchPattern: `${WARNED_BATCH}*`,
    installedFrom: `${WARNED_DAY.slice(0, 4)}-01-01`,
    installedTo: `${Number(WARNED_DAY.slice(0, 4)) + 1}-12-31`,
    source: "The group's own test holes; the maker was told",
    publishedAt: at,
    ...book.by(at),
  });
}

/** A steward's decision on a whole anchor, kept beside what the evidence says. */
function decideAgainst(book: Book, label: string, reason: string): void {
  const entered = book.anchorNamed(label);
  const at = book.calendar.instantAgo(820, 18);
  for (const anchor of book.anchors) {
    if (anchor.id !== entered.id) continue;
    Object.assign(anchor, {
      condition: "out_of_use",
      decidedCondition: "out_of_use",
      decidedReason: reason,
      decidedBy: book.people.steward,
      decidedAt: at,
    });
  }
}

function enterPulls(book: Book): void {
  const pulls = [
    [
      "Cold stance",
      1,
      "axial",
      8,
      15,
      0,
      "held",
      "2019-12-07",
      "Proof after the cold night; the gauge did not fall.",
    ],
    ["Cold stance", 2, "axial", 8, 15, 0.1, "held", "2019-12-07", "As the other one."],
    ["Plumb Bob", 8, "axial", 6, 15, 0, "held", "2022-05-07", "Top bolt, on the work day."],
    ["Kiln Corner", 7, "axial", 6, 15, 0, "held", "2022-05-07", null],
    ["Stack line, stack end", 2, "axial", 6, 15, 0.2, "held", null, "Soft rock: pulled to see."],
    ["Crane plinth, rope access", 1, "axial", 6, 15, 0, "held", null, "At the half-yearly check."],
  ] as const;
  for (const [label, number, direction, loadKn, holdS, movementMm, mode, day, note] of pulls) {
    const placement = book.anchorNamed(label).placements.find((each) => each.number === number);
    if (!placement?.boltId) continue;
    const testedOn = day ?? book.calendar.ago(label.startsWith("Crane") ? 20 : 820).on;
    const at = new Date(`${testedOn}T16:00:00Z`);
    book.pullTests.push({
      id: book.ids.at(at),
      boltId: placement.boltId,
      direction,
      loadKn,
      holdS,
      movementMm,
      mode,
      testedOn,
      testedBy: "Tarrow bolter",
      note,
      ...book.by(at, "bolter"),
    });
  }
}

function enterWatches(book: Book, ground: Ground): void {
  const at = book.calendar.instantAgo(300);
  const watch = (userId: string, of: { anchorId: string } | { siteId: string }) =>
    book.watches.push({ id: book.ids.at(at), userId, ...of, createdAt: at });
  for (const label of ["Long Moor, west end", "Little Moor, west end", "Waist, south end"]) {
    watch(book.people.rigger, { anchorId: book.anchorNamed(label).id });
  }
  const { gannetCleft, undercroft, pillarStack, lowdenQuarry, fellgateWall, crownMoor } = ground;
  for (const site of [gannetCleft, undercroft, pillarStack, lowdenQuarry, fellgateWall, crownMoor]) {
    watch(book.people.steward, { siteId: site.id });
  }
}
