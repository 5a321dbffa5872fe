import type { Book } from "@/db/seed/book";
import { personName, REGISTER_OPENED } from "@/db/seed/people";
import type { DemoPerson } from "@/db/seed/people";
import type { Entered } from "@/db/seed/spec";

interface Happening {
  at: Date;
  by: DemoPerson;
  anchor: Entered;
  subjectType: string;
  subjectId: string;
  kind: string;
  summary: string;
}

/** The audit trail of every anchor, told from its rows: entered, drilled, replaced, reported, answered. */
export function enterHistory(book: Book): void {
  const happenings = book.entered.flatMap((anchor) => [
    ...entered(book, anchor),
    ...drilled(book, anchor),
    ...reported(book, anchor),
  ]);
  for (const { anchor, at, by, ...event } of happenings.toSorted((a, b) => a.at.getTime() - b.at.getTime())) {
    book.events.push({
      id: book.ids.at(at),
      at,
      actorUserId: book.people[by],
      actorName: personName(by),
      areaId: anchor.areaId,
      anchorId: anchor.id,
      ...event,
    });
  }
}

function entered(book: Book, anchor: Entered): Happening[] {
  const at = book.anchors.find(({ id }) => id === anchor.id)?.createdAt;
  if (!at) return [];
  const count = anchor.placements.length;
  const places = `${count} ${count === 1 ? "placement" : "placements"}`;
  const summary = at > REGISTER_OPENED ? `Anchor entered, ${places}` : `Taken into the register, ${places}`;
  return [
    {
      at,
      by: "steward",
      anchor,
      subjectType: "anchor",
      subjectId: anchor.id,
      kind: "anchor.created",
      summary,
    },
  ];
}

/** Bolts of one kind placed on one day make one line; each replacement says so. */
function drilled(book: Book, anchor: Entered): Happening[] {
  const lines = new Map<string, Happening & { numbers: number[]; what: string; verb: string }>();
  for (const placement of anchor.placements) {
    for (const boltId of placement.chain) {
      const bolt = book.bolts.find(({ id }) => id === boltId);
      if (!bolt?.createdAt || bolt.createdAt <= REGISTER_OPENED) continue;
      const verb = bolt.replacesBoltId ? "replaced" : "installed";
      const what =
        book.boltTypes.find(({ id }) => id === bolt.boltTypeId)?.name ?? "bolt of a type not known";
      const key = `${bolt.createdAt.toISOString()} ${verb} ${what}`;
      const line = lines.get(key);
      if (line) line.numbers.push(placement.number);
      else {
        const by = bolt.createdBy === book.people.bolter ? "bolter" : "steward";
        lines.set(key, {
          at: bolt.createdAt,
          by,
          anchor,
          subjectType: "bolt",
          subjectId: boltId,
          kind: `bolt.${verb}`,
          summary: "",
          numbers: [placement.number],
          what,
          verb,
        });
      }
    }
  }
  return [...lines.values()].map(({ numbers, what, verb, ...line }) => ({
    ...line,
    summary: `${verb === "replaced" ? "Replaced" : "Installed"} ${numbered(numbers)}: ${what}`,
  }));
}

function reported(book: Book, anchor: Entered): Happening[] {
  return book.reports
    .filter(({ anchorId }) => anchorId === anchor.id)
    .flatMap((report) => {
      const subject = { anchor, subjectType: "report", subjectId: report.id };
      const number = anchor.placements.find(({ id }) => id === report.placementId)?.number;
      const where = number === undefined ? "" : `, bolt ${number}`;
      const filed: Happening = {
        ...subject,
        at: report.receivedAt ?? report.observedAt,
        by: personOf(book, report.createdBy ?? null),
        kind: "report.filed",
        summary: `Report: ${report.kind.replaceAll("_", " ")}${where}${report.tookOutOfUse ? "; out of use at once" : ""}`,
      };
      if (report.kind === "routine_check" || !report.handledAt) return [filed];
      return [
        filed,
        {
          ...subject,
          at: report.handledAt,
          by: "steward",
          kind: "report.handled",
          summary: `Answered: ${report.handledHow ?? ""}`,
        },
      ];
    });
}

function personOf(book: Book, userId: string | null): DemoPerson {
  if (userId === book.people.rigger) return "rigger";
  if (userId === book.people.bolter) return "bolter";
  return userId === book.people.visitor ? "visitor" : "steward";
}

/** `[3]` → `bolt 3`; `[1, 2, 3]` → `bolts 1 to 3`; `[1, 4]` → `bolts 1, 4`. */
function numbered(numbers: readonly number[]): string {
  const [first, last] = [numbers[0] ?? 0, numbers.at(-1) ?? 0];
  if (numbers.length === 1) return `bolt ${first}`;
  if (numbers.length === 2) return `bolts ${first} and ${last}`;
  const unbroken = last - first === numbers.length - 1;
  return unbroken ? `bolts ${first} to ${last}` : `bolts ${numbers.join(", ")}`;
}
