import type { Book } from "@/db/seed/book";
import { WEBBINGS, type WebbingKey } from "@/db/seed/catalogue/webbings";
import type { Ground } from "@/db/seed/ground";
import { REGISTER_OPENED } from "@/db/seed/people";

interface UsualRig {
  main: readonly { webbing: WebbingKey; partOfLength: number }[];
  backup: WebbingKey;
  backupSlackPercent: number;
  standingTensionKn: number;
  walkerKg: number;
  leashM: number;
}

const SOFT: UsualRig = {
  main: [{ webbing: "nylonSoft", partOfLength: 1 }],
  backup: "blend",
  backupSlackPercent: 6,
  standingTensionKn: 2,
  walkerKg: 75,
  leashM: 1.6,
};
const USUAL: UsualRig = {
  main: [{ webbing: "polyester", partOfLength: 1 }],
  backup: "blend",
  backupSlackPercent: 5,
  standingTensionKn: 3.5,
  walkerKg: 75,
  leashM: 1.6,
};
const LONG: UsualRig = {
  main: [
    { webbing: "polyethylene", partOfLength: 0.3 },
    { webbing: "polyesterTube", partOfLength: 0.4 },
    { webbing: "polyethylene", partOfLength: 0.3 },
  ],
  backup: "polyester",
  backupSlackPercent: 4,
  standingTensionKn: 4.5,
  walkerKg: 75,
  leashM: 1.8,
};

/** The six lines of the island, with what is usually rigged on them and what happened to them. */
export function enterSpans(book: Book, ground: Ground): void {
  enterSpan(book, ground, {
    name: "Mouth",
    ends: ["Mouth, north end", "Mouth, south end"],
    nominalM: 205,
    rig: USUAL,
  });
  enterSpan(book, ground, {
    name: "Waist",
    ends: ["Waist, north end", "Waist, south end"],
    nominalM: 118,
    rig: USUAL,
  });
  enterSpan(book, ground, {
    name: "Throat",
    ends: ["Throat, north end", "Throat, south end"],
    nominalM: 62,
    rig: SOFT,
  });
  enterSpan(book, ground, {
    name: "Stack line",
    ends: ["Stack line, rim end", "Stack line, stack end"],
    nominalM: 96,
    rig: USUAL,
    note: "Rig from the rim; the stack end is reached by boat in a calm.",
  });
  enterSpan(book, ground, {
    name: "Little Moor",
    ends: ["Little Moor, west end", "Little Moor, east end"],
    nominalM: 190,
    rig: USUAL,
  });
  enterSpan(book, ground, {
    name: "Long Moor",
    ends: ["Long Moor, west end", "Long Moor, east end"],
    nominalM: 480,
    rig: LONG,
    note: "Stands across the south-west wind. Take it down when more than 15 m/s is forecast.",
  });
  enterLog(book);
  enterKits(book, ground);
}

function enterSpan(
  book: Book,
  ground: Ground,
  span: { name: string; ends: readonly [string, string]; nominalM: number; rig: UsualRig; note?: string },
): void {
  const [a, b] = span.ends.map((label) => book.anchorNamed(label));
  if (a === undefined || b === undefined) return;
  const id = book.ids.at(REGISTER_OPENED);
  book.spans.push({
    id,
    areaId: ground.tarrow,
    anchorAId: a.id,
    anchorBId: b.id,
    name: span.name,
    // The database measures it on the ellipsoid once the points are in.
    lengthM: span.nominalM,
    note: span.note ?? null,
    ...book.by(REGISTER_OPENED),
  });
  book.spanRigs.push({
    id: book.ids.at(REGISTER_OPENED),
    spanId: id,
    versionNo: 1,
    rig: asRig(span.rig, span.nominalM),
    createdAt: REGISTER_OPENED,
    createdBy: book.people.steward,
  });
}

function asRig(rig: UsualRig, spanM: number): Record<string, unknown> {
  return {
    segments: rig.main.map(({ webbing, partOfLength }) => ({
      webbing: WEBBINGS[webbing].name,
      lengthM: Math.round(spanM * partOfLength * 10) / 10,
    })),
    standingTensionKn: rig.standingTensionKn,
    backup: { webbing: WEBBINGS[rig.backup].name, slackPercent: rig.backupSlackPercent },
    walkerKg: rig.walkerKg,
    leashM: rig.leashM,
  };
}

/** The storm that bent the bolt, and ordinary days. */
function enterLog(book: Book): void {
  const entries = [
    ["Throat", "up", 402, { people: 4 }],
    ["Throat", "reading", 402, { tensionKn: 2.4, note: "One walker in the middle." }],
    ["Throat", "down", 401, {}],
    ["Mouth", "up", 310, { people: 5 }],
    ["Mouth", "reading", 310, { tensionKn: 4.6, windMps: 6 }],
    ["Mouth", "down", 308, {}],
    ["Little Moor", "up", 96, { people: 6 }],
    ["Little Moor", "reading", 95, { tensionKn: 4.1, windMps: 5 }],
    ["Little Moor", "down", 94, {}],
    ["Long Moor", "up", 41, { people: 7 }],
    ["Long Moor", "reading", 40, { tensionKn: 5.2, windMps: 7, note: "Empty line, evening." }],
    [
      "Long Moor",
      "storm",
      39,
      {
        windMps: 24,
        note: "Gusts from the south-west all night, nobody on the line, nobody could reach it.",
      },
    ],
    ["Long Moor", "down", 38, { note: "Cut loose from the east; the west end had moved." }],
  ] as const;
  for (const [name, kind, daysAgo, facts] of entries) {
    const span = book.spans.find((each) => each.name === name);
    if (span === undefined) continue;
    const at = book.calendar.instantAgo(daysAgo, kind === "reading" ? 15 : kind === "storm" ? 3 : 11);
    book.lineLog.push({ id: book.ids.at(at), spanId: span.id, kind, at, ...facts, ...book.by(at, "rigger") });
  }
}

function enterKits(book: Book, { tarrow }: Ground): void {
  const at = book.calendar.instantAgo(420);
  const piece = (webbing: WebbingKey, lengthM: number) => ({ webbing: WEBBINGS[webbing].name, lengthM });
  book.kits.push(
    {
      id: book.ids.at(at),
      areaId: tarrow,
      name: "Group set, long lines",
      segments: [
        piece("polyethylene", 150),
        piece("polyesterTube", 200),
        piece("polyethylene", 150),
        piece("polyester", 520),
      ],
      ...book.by(at),
    },
    {
      id: book.ids.at(at),
      ownerUserId: book.people.rigger,
      name: "First lines",
      segments: [piece("nylonSoft", 70), piece("blend", 75)],
      ...book.by(at, "rigger"),
    },
  );
}
