import type { TypeKey } from "@/db/seed/catalogue/bolt-types";
import type { Book } from "@/db/seed/book";
import { beforeYear, inMonth, inYear, onDay, type Past } from "@/db/seed/dates";
import type { Site } from "@/db/seed/ground";
import { found, installed, type InstallOptions, removed } from "@/db/seed/hardware";
import type { Places } from "@/db/seed/island/places";
import { pair, row, type Wall } from "@/db/seed/patterns";
import { Random } from "@/db/seed/random";
import type { AnchorSpec, BoltSpec } from "@/db/seed/spec";

const CLUB = { remembered: "quarry club" };

/** Thirty-five years of one crag: hand-drilled sleeves, plated studs, then stainless of every kind. */
export function enterLowdenQuarry(book: Book, site: Site, { lowdenQuarry }: Places): void {
  const random = new Random("lowden quarry");
  const wall: Wall = { foot: lowdenQuarry, facingDeg: 205, dipDeg: 88, groundM: 64 };
  enterLines(book, site, random, wall);
  enterTops(book, site, random, wall);
  enterTramway(book, site, random, wall);
  enterRelics(book, site, random, wall);
}

function enterLines(book: Book, site: Site, random: Random, wall: Wall): void {
  const many = (count: number, type: TypeKey, when: Past, options: InstallOptions = {}) =>
    Array.from({ length: count }, (): readonly BoltSpec[] => [installed(random, type, when, options)]);
  const renewed = (count: number, kept: number, type: TypeKey, when: Past, why: string) =>
    Array.from({ length: count }, (_, index): readonly BoltSpec[] => {
      const old = installed(random, "studM10plated", inYear(1994 + (index % 2)), {
        by: CLUB,
        facts: { rustGrade: index < kept ? 2 : 3, batch: null, torqueNm: null },
      });
      return index < kept
        ? [old]
        : [removed(old, when, why, "quarry work day"), installed(random, type, when)];
    });
  const lines: { name: string; lengthM: number; bolts: readonly (readonly BoltSpec[])[] }[] = [
    { name: "Kiln Corner", lengthM: 18, bolts: many(7, "studM10in4301", onDay("2007-06-10"), { by: CLUB }) },
    { name: "Plumb Bob", lengthM: 22, bolts: many(8, "studM10in4401", inMonth("2012-04"), { by: CLUB }) },
    {
      name: "Tally Stick",
      lengthM: 20,
      bolts: renewed(8, 0, "studM10in4404", onDay("2018-05-12"), "plated, loose in the hole"),
    },
    {
      name: "Feather and Wedge",
      lengthM: 21,
      bolts: renewed(8, 2, "eye10in4404", book.calendar.ago(930), "plated, rust under the hanger"),
    },
    { name: "Overburden", lengthM: 25, bolts: many(9, "eye10in4404", book.calendar.ago(1_020)) },
    { name: "Black Powder", lengthM: 17, bolts: many(7, "sleeve12in4404", onDay("2015-09-26")) },
    { name: "Half-Inch Chisel", lengthM: 19, bolts: many(8, "screw10in4401", book.calendar.ago(700)) },
    {
      name: "Lime Burner",
      lengthM: 23,
      bolts: many(8, "rod8in4401", onDay("2010-08-14"), { by: CLUB, glue: "vinylester" }),
    },
    { name: "Spoil Heap", lengthM: 16, bolts: many(7, "studM12in4404", book.calendar.ago(1_500)) },
  ];
  lines.forEach((line, index) => book.anchor(site, row(random, wall, { ...line, rightM: index * 8 })));
}

function enterTops(book: Book, site: Site, random: Random, wall: Wall): void {
  const ring = (leftMm: number, on: number, when: Past): NonNullable<AnchorSpec["fittings"]>[number] => ({
    kind: "ring",
    metal: "1.4404",
    diameterMm: 12,
    diameterLeftMm: leftMm,
    installedOn: when.on,
    replaceable: true,
    on,
  });
  const top = (
    label: string,
    index: number,
    upM: number,
    type: TypeKey,
    when: Past,
    leftMm: number,
    note: string | null = null,
  ) =>
    book.anchor(
      site,
      pair(wall, {
        label: `${label}, top`,
        uses: ["lower_off"],
        rightM: index * 8 + 0.6,
        upM,
        bolts: [[installed(random, type, when)], [installed(random, type, when)]],
        more: {
          fittings: [ring(leftMm, 1, when), ring(Math.min(12, leftMm + 1.1), 2, when)],
          facts: { note },
        },
      }),
    );
  top("Kiln Corner", 0, 18, "studM10in4301", onDay("2007-06-10"), 11.2);
  top("Plumb Bob", 1, 22, "studM12in4404", onDay("2016-07-02"), 11.4);
  top("Tally Stick", 2, 20, "studM12in4404", onDay("2018-05-12"), 11.5);
  // The gully above drains sand on to every rope that is pulled here.
  top(
    "Feather and Wedge",
    3,
    21,
    "eye12in4404",
    book.calendar.ago(930),
    8.9,
    "Ropes come down sandy here: the ring grooves fast.",
  );
  top("Overburden", 4, 25, "eye12in4404", book.calendar.ago(1_020), 11.6);
  top("Black Powder", 5, 17, "gluedM12in4404", onDay("2015-09-26"), 11.1);
  top("Half-Inch Chisel", 6, 19, "eye10in4404", book.calendar.ago(700), 11.8);
  top("Lime Burner", 7, 23, "rod10in4404", onDay("2019-04-13"), 11.3);
  top("Spoil Heap", 8, 16, "studM12in4404", book.calendar.ago(1_500), 11.0);
}

/** Along the old tramway above the wall: abseils for the school groups, access for the rope crew, belays. */
function enterTramway(book: Book, site: Site, random: Random, wall: Wall): void {
  const at = (
    label: string,
    uses: AnchorSpec["uses"],
    rightM: number,
    bolts: readonly (readonly BoltSpec[])[],
    more?: Partial<AnchorSpec>,
  ) => book.anchor(site, pair(wall, { label, uses, rightM, upM: 26, apartMm: 300, bolts, more }));
  const two = (type: TypeKey, when: Past, options?: InstallOptions): readonly (readonly BoltSpec[])[] => [
    [installed(random, type, when, options)],
    [installed(random, type, when, options)],
  ];
  at("Tramway abseil, west", ["abseil", "belay"], 4, two("eye12in4404", onDay("2017-10-07")));
  at("Tramway abseil, middle", ["abseil"], 30, two("gluedM12in4404", book.calendar.ago(1_180)));
  at("Tramway abseil, east", ["abseil"], 58, two("studM12in4404", onDay("2016-10-15")));
  at("School belay one", ["belay"], 12, two("eye12in4404", book.calendar.ago(380)));
  at("School belay two", ["belay"], 14, two("eye12in4404", book.calendar.ago(380)));
  at("School belay three", ["belay"], 16, two("studM12in4462", book.calendar.ago(1_620)));
  at("Crane plinth, rope access", ["rope_access"], 40, [
    ...two("gluedM16in4462", book.calendar.ago(150), { by: "steward" }),
    [installed(random, "gluedM16in4462", book.calendar.ago(150), { by: "steward" })],
  ]);
  at(
    "Winch house, rope access",
    ["rope_access"],
    46,
    two("eye12in4462", book.calendar.ago(330), { by: "steward" }),
  );
  at("Kiln top belay", ["belay"], -8, two("eye12in4404", book.calendar.ago(610)));
  at("Winch house redirect", ["directional"], 44, [
    [installed(random, "eye12in4404", book.calendar.ago(330))],
  ]);
  at(
    "Hollow flake belay",
    ["belay"],
    66,
    [
      [installed(random, "studM10in4404", onDay("2013-05-04"), { by: CLUB })],
      [installed(random, "studM10in4404", onDay("2013-05-04"), { by: CLUB })],
    ],
    {
      facts: { note: "The right-hand bolt sits in a flake that sounds like a drum." },
      bodies: [
        {
          label: "Drum flake",
          attachment: "hollow",
          lengthM: 1.6,
          widthM: 0.9,
          heightM: 0.25,
          note: "Tapped: hollow all along the right side.",
        },
      ],
    },
  );
  book.anchor(site, {
    label: "Ash at the tramway end",
    uses: ["abseil"],
    at: { ...wall.foot, lat: wall.foot.lat + 0.0003 },
    facts: { elevationM: 91 },
    placements: [
      { facts: { kind: "tree", sizeMm: 420, note: "Living ash, roots in a crack; sling it low." } },
    ],
  });
}

/** What is left of the first years. Nobody removed it, so it is on record. */
function enterRelics(book: Book, site: Site, random: Random, wall: Wall): void {
  const sleeve = (): BoltSpec =>
    found("sleeveM8plated", onDay("1989-08-19"), {
      method: "mechanical",
      embedmentMm: 27,
      magnetic: true,
      rustGrade: 3,
      installedBy: "two of the founders, by hand",
      note: "M8 self-drilled sleeve, hammered in by hand. Nineteen minutes a hole, they say.",
    });
  const plated = (): BoltSpec =>
    found("studM10plated", inYear(1993), {
      method: "mechanical",
      embedmentMm: 52,
      magnetic: true,
      rustGrade: 2,
    });
  book.anchor(
    site,
    row(random, wall, {
      name: "First Year's Sleeves",
      rightM: 74,
      lengthM: 14,
      bolts: [[sleeve()], [sleeve()], [sleeve()], [sleeve()]],
    }),
  );
  book.anchor(
    site,
    pair(wall, {
      label: "Tinsmith, top",
      uses: ["lower_off"],
      rightM: 80,
      upM: 13,
      bolts: [[plated()], [plated()]],
    }),
  );
  book.anchor(
    site,
    pair(wall, {
      label: "Old crane belay",
      uses: ["belay"],
      rightM: 38,
      upM: 25,
      bolts: [
        [
          {
            type: null,
            form: "glued_stud_hanger",
            when: null,
            facts: { magnetic: false, note: "Stud without a mark." },
          },
        ],
        [
          {
            type: "studM10plated",
            when: beforeYear(2000),
            facts: {
              hangerMetal: "1.4301",
              method: "mechanical",
              magnetic: true,
              rustGrade: 2,
              note: "Stainless plate on a plated stud.",
            },
          },
        ],
      ],
    }),
  );
}
