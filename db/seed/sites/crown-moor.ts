import type { TypeKey } from "@/db/seed/catalogue/bolt-types";
import type { Book } from "@/db/seed/book";
import { inMonth, onDay, type Past } from "@/db/seed/dates";
import type { Site } from "@/db/seed/ground";
import { installed, type InstallOptions, removed } from "@/db/seed/hardware";
import { azimuthDeg, walk } from "@/db/seed/island/frame";
import type { Places } from "@/db/seed/island/places";
import { acrossM, lineEnd, lip, pair, row, type Wall } from "@/db/seed/patterns";
import { Random } from "@/db/seed/random";
import type { AnchorSpec, BoltSpec, PlacementSpec } from "@/db/seed/spec";

/** Where the bolt stands that the storm bent. */
export const BENT_ANCHOR = "Long Moor, west end";
export const BENT_PLACEMENT = 3;

/** Two lines over the inland gorge, and what is needed to reach their ends. */
export function enterCrownMoor(book: Book, site: Site, { crownMoor }: Places): void {
  const random = new Random("crown moor");
  const littleWest = walk(crownMoor, [320, 260]);
  const littleEast = acrossM(littleWest, 74, 190);
  const longWest = walk(crownMoor, [205, 40]);
  const longEast = acrossM(longWest, 82, 480);
  longMoor(book, site, random, longWest, longEast);
  littleMoor(book, site, random, littleWest, littleEast);
  around(book, site, random, {
    west: { foot: walk(longWest, [262, 18]), facingDeg: 96, dipDeg: 82, groundM: 268 },
    east: { foot: walk(longEast, [82, 16]), facingDeg: 262, dipDeg: 80, groundM: 270 },
    little: { foot: walk(littleWest, [254, 14]), facingDeg: 74, dipDeg: 78, groundM: 262 },
  });
}

type End = { lon: number; lat: number };

/** 480 m, the windy one. West: three thin rods from before anybody asked when they bend. East: forged eyes. */
function longMoor(book: Book, site: Site, random: Random, west: End, east: End): void {
  const rod = (): BoltSpec =>
    installed(random, "rod8in4401", onDay("2013-08-03"), {
      by: { remembered: "big line crew" },
      glue: "slowEpoxy",
    });
  const eye = (): BoltSpec => installed(random, "eye12in4462", book.calendar.ago(900));
  book.anchor(
    site,
    lineEnd({
      label: BENT_ANCHOR,
      at: west,
      bearingDeg: azimuthDeg(west, east),
      dipDeg: 12,
      elevationM: 331,
      masterpoint: [520, -1_480, 150],
      backupSlackM: 0.8,
      note: "Tied legs, cut for a pull straight along the line: wind from the south puts nearly all of it on bolt 3.",
      placements: [
        { at: [0, 0, 0], bolts: [rod()] },
        { at: [540, 110, 0], bolts: [rod()] },
        { at: [1_070, 30, 0], bolts: [rod()] },
        { at: [520, 1_900, 60], facts: { role: "backup" }, bolts: [rod()] },
      ],
      edge: lip(
        "Peat-covered lip",
        "rounded",
        "Rubber mat on a cord to the sheepfold",
        [-500, -2_500],
        [1_700, -2_450],
      ),
    }),
  );
  const placements: PlacementSpec[] = [
    { at: [0, 0, 0], bolts: [eye()] },
    { at: [500, 120, 0], bolts: [eye()] },
    { at: [1_000, 130, 0], bolts: [eye()] },
    { at: [1_490, 10, 0], bolts: [eye()] },
    { at: [750, 1_800, 30], facts: { role: "backup" }, bolts: [eye()] },
  ];
  book.anchor(
    site,
    lineEnd({
      label: "Long Moor, east end",
      at: east,
      bearingDeg: azimuthDeg(east, west),
      dipDeg: 15,
      elevationM: 338,
      masterpoint: [745, -1_900, 190],
      backupSlackM: 0.8,
      placements,
      edge: lip(
        "Clean-cut edge",
        "sharp",
        "Angle iron lined with carpet, tied back",
        [-300, -2_800],
        [1_900, -2_820],
      ),
    }),
  );
}

/** 190 m: the line people come back for. */
function littleMoor(book: Book, site: Site, random: Random, west: End, east: End): void {
  const since = book.calendar.ago(1_190);
  const forged = (): BoltSpec => installed(random, "eye12in4404", since);
  const renewed = (): readonly BoltSpec[] => [
    removed(
      installed(random, "studM10in4401", inMonth("2008-05"), { by: { remembered: "big line crew" } }),
      book.calendar.ago(1_190),
      "too little margin for a line; the hole was drilled over",
    ),
    installed(random, "eye12in4462", book.calendar.ago(1_190)),
  ];
  book.anchor(
    site,
    lineEnd({
      label: "Little Moor, west end",
      at: west,
      bearingDeg: azimuthDeg(west, east),
      dipDeg: 17,
      elevationM: 322,
      masterpoint: [550, -1_400, 170],
      backupSlackM: 0.5,
      placements: [
        { at: [0, 0, 0], facts: { deadHoles: [{ xMm: 120, yMm: 35 }] }, bolts: renewed() },
        { at: [540, 80, 0], bolts: renewed() },
        { at: [1_090, -20, 0], bolts: renewed() },
        { at: [540, 1_300, 20], facts: { role: "backup" }, bolts: [installed(random, "eye12in4462", since)] },
      ],
    }),
  );
  book.anchor(
    site,
    lineEnd({
      label: "Little Moor, east end",
      at: east,
      bearingDeg: azimuthDeg(east, west),
      dipDeg: 19,
      elevationM: 325,
      masterpoint: [500, -1_350, 160],
      backupSlackM: 0.5,
      placements: [
        { at: [0, 0, 0], bolts: [forged()] },
        { at: [500, 70, 0], bolts: [forged()] },
        { at: [990, 0, 0], bolts: [forged()] },
        { at: [480, 1_250, 20], facts: { role: "backup" }, bolts: [forged()] },
        {
          at: [2_300, 2_600, 100],
          facts: { kind: "boulder", role: "backup", sizeMm: 2_400, note: "Erratic, half sunk in the moor." },
          body: 0,
        },
      ],
      bodies: [
        {
          label: "Erratic",
          attachment: "attached",
          lengthM: 2.4,
          widthM: 1.9,
          heightM: 1.3,
          note: "Sunk a metre deep.",
        },
      ],
    }),
  );
}

interface Walls {
  west: Wall;
  east: Wall;
  little: Wall;
}

/** The gorge walls under the rims: two climbs, ways up and down, and the tag line's posts. */
function around(book: Book, site: Site, random: Random, { west, east, little }: Walls): void {
  const two = (type: TypeKey, when: Past, options: InstallOptions = {}): readonly (readonly BoltSpec[])[] => [
    [installed(random, type, when, options)],
    [installed(random, type, when, options)],
  ];
  const at = (
    label: string,
    uses: AnchorSpec["uses"],
    where: readonly [wall: Wall, rightM: number, upM: number],
    bolts: readonly (readonly BoltSpec[])[],
  ) => {
    const [wall, rightM, upM] = where;
    return book.anchor(site, pair(wall, { label, uses, rightM, upM, bolts }));
  };
  const single = (type: TypeKey, when: Past): readonly (readonly BoltSpec[])[] => [
    [installed(random, type, when)],
  ];
  book.anchor(
    site,
    row(random, west, {
      name: "Keeper's Groove",
      rightM: 30,
      lengthM: 24,
      bolts: Array.from({ length: 8 }, (): readonly BoltSpec[] => [
        installed(random, "studM10in4401", onDay("2015-07-18")),
      ]),
    }),
  );
  book.anchor(
    site,
    row(random, west, {
      name: "Cotton Grass",
      rightM: 38,
      lengthM: 20,
      bolts: Array.from({ length: 7 }, (): readonly BoltSpec[] => [
        installed(random, "eye10in4404", book.calendar.ago(690)),
      ]),
    }),
  );
  at("Keeper's Groove, top", ["lower_off"], [west, 30.5, 24], two("studM12in4404", onDay("2015-07-18")));
  at("Cotton Grass, top", ["lower_off"], [west, 38.5, 20], two("eye12in4404", book.calendar.ago(690)));
  at("West rim abseil", ["abseil"], [west, 12, 58], two("eye12in4404", book.calendar.ago(900)));
  at("Halfway ledge", ["abseil", "belay"], [west, 13, 29], two("eye12in4404", book.calendar.ago(900)));
  at("West rim safety", ["belay"], [west, -6, 62], two("eye12in4462", book.calendar.ago(900)));
  at("East rim safety", ["belay"], [east, -6, 69], two("eye12in4462", book.calendar.ago(900)));
  at("East rim abseil", ["abseil"], [east, 6, 66], two("studM12in4404", onDay("2016-08-20")));
  at("Little Moor safety", ["belay"], [little, -5, 52], two("studM12in4404", onDay("2018-07-14")));
  at("Little Moor abseil", ["abseil"], [little, 9, 49], two("eye12in4404", book.calendar.ago(1_190)));
  at("Tag line post, west", ["directional"], [west, -4, 63], single("eye12in4404", book.calendar.ago(900)));
  at("Tag line post, east", ["directional"], [east, -4, 68], single("eye12in4404", book.calendar.ago(900)));
  at("Sheepfold stream abseil", ["abseil"], [west, 60, 31], single("studM10in4404", onDay("2015-07-18")));
  book.anchor(site, {
    label: "Two rowans",
    uses: ["abseil"],
    at: walk(west.foot, [west.facingDeg + 180, 30]),
    facts: { elevationM: 327 },
    placements: [
      { at: [0, 0, 0], facts: { kind: "tree", sizeMm: 180, note: "Living, leans out over the gorge." } },
      { at: [900, 200, 0], facts: { kind: "tree", role: "backup", sizeMm: 140, note: "The thinner one." } },
    ],
  });
}
