import type { TypeKey } from "@/db/seed/catalogue/bolt-types";
import type { Book } from "@/db/seed/book";
import { beforeYear, inMonth, inYear, onDay, type Past } from "@/db/seed/dates";
import type { Site } from "@/db/seed/ground";
import { found, installed, type InstallOptions, removed } from "@/db/seed/hardware";
import type { Places } from "@/db/seed/island/places";
import { pair, row, type Wall } from "@/db/seed/patterns";
import { Random } from "@/db/seed/random";
import type { BoltSpec } from "@/db/seed/spec";

const LOCALS = { remembered: "Fellgate locals" };
/** The glue that a warning is out about; some cartridges were written down, some were not. */
export const WARNED_GLUE = "polyester";
export const WARNED_BATCH = "PE-1806";
export const WARNED_DAY = "2018-06-23";
const COLD_GLUE_NOTE =
  "Rock at 4 °C, the glue's table starts at 5 °C. Left for a week, then pulled to 8 kN along the axis: held.";

/** Granite in the rain: single pitches on the slabs, two-pitch lines on the right. */
export function enterFellgateWall(book: Book, site: Site, { fellgateWall }: Places): void {
  const random = new Random("fellgate wall");
  const wall: Wall = { foot: fellgateWall, facingDeg: 248, dipDeg: 78, groundM: 212 };
  enterLines(book, site, random, wall);
  enterTops(book, site, random, wall);
  enterLedges(book, site, random, wall);
}

function enterLines(book: Book, site: Site, random: Random, wall: Wall): void {
  const many = (count: number, type: TypeKey, when: Past, options: InstallOptions = {}) =>
    Array.from({ length: count }, (): readonly BoltSpec[] => [installed(random, type, when, options)]);
  const warned = Array.from({ length: 7 }, (_, index): readonly BoltSpec[] => [
    installed(random, "eye10in4404", onDay(WARNED_DAY), {
      glue: WARNED_GLUE,
      facts: { adhesiveBatch: index < 5 ? WARNED_BATCH : null },
    }),
  ]);
  const patched = Array.from({ length: 8 }, (_, index): readonly BoltSpec[] => {
    const old = installed(random, "studM10in4301", inMonth("2001-05"), {
      by: LOCALS,
      facts: { batch: null },
    });
    if (index % 3 !== 0) return [old];
    return [
      removed(old, book.calendar.ago(1_130), "turned in its hole when torqued"),
      installed(random, "studM12in4404", book.calendar.ago(1_130)),
    ];
  });
  const lines = [
    { name: "Grey Wether", lengthM: 20, bolts: many(7, "studM10in4301", inYear(2003), { by: LOCALS }) },
    { name: "Sheepfold Slab", lengthM: 24, bolts: patched },
    { name: "Curlew", lengthM: 22, bolts: warned },
    { name: "Heather Seam", lengthM: 23, bolts: many(8, "studM10in4404", onDay("2016-05-28")) },
    { name: "Cattle Grid", lengthM: 18, bolts: many(7, "studM12in4404", book.calendar.ago(1_240)) },
    { name: "Long Mizzle", lengthM: 25, bolts: many(9, "eye12in4404", book.calendar.ago(560)) },
    { name: "Quartz Ladder", lengthM: 21, bolts: many(7, "eye10in4404", book.calendar.ago(980)) },
    {
      name: "Peat Smoke",
      lengthM: 19,
      bolts: many(7, "rod8in4301", inMonth("2006-09"), { by: LOCALS, glue: "vinylesterCapsule" }),
    },
  ] as const;
  lines.forEach((line, index) => book.anchor(site, row(random, wall, { ...line, rightM: index * 9 })));
}

function enterTops(book: Book, site: Site, random: Random, wall: Wall): void {
  const top = (
    label: string,
    index: number,
    upM: number,
    type: TypeKey,
    when: Past,
    options: InstallOptions = {},
  ) =>
    book.anchor(
      site,
      pair(wall, {
        label: `${label}, top`,
        uses: ["lower_off"],
        rightM: index * 9 + 0.5,
        upM,
        bolts: [[installed(random, type, when, options)], [installed(random, type, when, options)]],
        more: {
          fittings: [
            {
              kind: "chain",
              metal: "1.4404",
              diameterMm: 10,
              diameterLeftMm: 9.6,
              installedOn: when.on,
              replaceable: true,
              on: 1,
            },
            {
              kind: "ring",
              metal: "1.4404",
              diameterMm: 12,
              diameterLeftMm: 11.4,
              installedOn: when.on,
              replaceable: true,
            },
          ],
        },
      }),
    );
  top("Grey Wether", 0, 20, "studM10in4401", onDay("2011-10-08"), { by: LOCALS });
  top("Sheepfold Slab", 1, 24, "studM12in4404", book.calendar.ago(1_130));
  top("Curlew", 2, 22, "eye12in4404", onDay(WARNED_DAY), {
    glue: WARNED_GLUE,
    facts: { adhesiveBatch: WARNED_BATCH },
  });
  top("Heather Seam", 3, 23, "studM12in4404", onDay("2016-05-28"));
  top("Cattle Grid", 4, 18, "studM12in4404", book.calendar.ago(1_240));
  top("Long Mizzle", 5, 25, "eye12in4404", book.calendar.ago(560));
  top("Quartz Ladder", 6, 21, "eye12in4404", book.calendar.ago(980));
  top("Peat Smoke", 7, 19, "studM10in4401", onDay("2012-09-15"), { by: LOCALS });
}

/** Stances of the long lines on the right, the abseil piste, and two things nobody knows much about. */
function enterLedges(book: Book, site: Site, random: Random, wall: Wall): void {
  const two = (type: TypeKey, when: Past, options: InstallOptions = {}): readonly (readonly BoltSpec[])[] => [
    [installed(random, type, when, options)],
    [installed(random, type, when, options)],
  ];
  const stance = (
    label: string,
    rightM: number,
    upM: number,
    bolts: readonly (readonly BoltSpec[])[],
    note: string | null = null,
  ) =>
    book.anchor(
      site,
      pair(wall, {
        label,
        uses: ["belay", "abseil"],
        rightM,
        upM,
        apartMm: 350,
        bolts,
        more: { facts: { note } },
      }),
    );
  stance("Rowan stance", 78, 24, two("studM12in4404", onDay("2017-06-03")));
  stance("Raven stance", 79, 47, two("studM12in4404", onDay("2017-06-03")));
  stance("Crystal stance", 86, 26, two("eye12in4404", book.calendar.ago(720)));
  stance("Eyrie", 87, 51, two("eye12in4404", book.calendar.ago(720)));
  stance("Wether stance", 4, 22, two("eye12in4404", book.calendar.ago(470)));
  stance("Saddle stance", 93, 22, two("studM12in4462", book.calendar.ago(1_430)));
  stance("Cold stance", 95, 45, [
    [
      installed(random, "eye12in4404", onDay("2019-11-30"), {
        glue: "slowEpoxy",
        facts: {
          glueTempC: 4,
          rockTempC: 4,
          usableFrom: new Date("2019-12-07T12:00:00Z"),
          note: COLD_GLUE_NOTE,
        },
      }),
    ],
    [
      installed(random, "eye12in4404", onDay("2019-11-30"), {
        glue: "slowEpoxy",
        facts: {
          glueTempC: 4,
          rockTempC: 4,
          usableFrom: new Date("2019-12-07T12:00:00Z"),
          note: COLD_GLUE_NOTE,
        },
      }),
    ],
  ]);
  stance(
    "Gully stance",
    100,
    28,
    two("studM10in4301", inMonth("1999-07"), { by: LOCALS, facts: { embedmentMm: null, batch: null } }),
  );
  stance("Top block", 101, 55, [
    [found(null, null, { magnetic: true, rustGrade: 1, note: "Stud with a round hanger, no mark." })],
    [
      found("studM12galvanised", beforeYear(1998), {
        method: "mechanical",
        embedmentMm: 66,
        magnetic: true,
        rustGrade: 2,
      }),
    ],
  ]);
  const abseil = (label: string, upM: number, type: TypeKey, when: Past) =>
    book.anchor(site, pair(wall, { label, uses: ["abseil"], rightM: 108, upM, bolts: two(type, when) }));
  abseil("Dry gully abseil", 30, "gluedM12in4404", onDay("2018-09-22"));
  abseil("Abseil piste, upper", 58, "eye12in4404", book.calendar.ago(1_300));
  abseil("Abseil piste, middle", 38, "eye12in4404", book.calendar.ago(1_300));
  abseil("Abseil piste, lower", 18, "studM12in4404", onDay("2014-10-11"));
  book.anchor(
    site,
    pair(wall, {
      label: "Traverse directional",
      uses: ["directional"],
      rightM: 90,
      upM: 33,
      bolts: [[installed(random, "studM12in4404", book.calendar.ago(1_100))]],
    }),
  );
}
