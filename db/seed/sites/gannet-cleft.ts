import type { Book } from "@/db/seed/book";
import { inMonth, onDay } from "@/db/seed/dates";
import type { Site } from "@/db/seed/ground";
import { installed, removed } from "@/db/seed/hardware";
import { azimuthDeg, walk } from "@/db/seed/island/frame";
import type { Places } from "@/db/seed/island/places";
import { acrossM, lineEnd, pair, type Wall } from "@/db/seed/patterns";
import { Random } from "@/db/seed/random";
import type { BoltSpec } from "@/db/seed/spec";

/** Where the three lines cross: this far from the shore at the mouth, their lengths on the ground. */
const MOUTH = { inlandM: 92, lengthM: 205 };
const WAIST = { inlandM: 158, lengthM: 118 };
const THROAT = { inlandM: 218, lengthM: 62 };

/** Six line ends, the ways down to the ledges, and what riggers stand on while they work at the edge. */
export function enterGannetCleft(book: Book, site: Site, { gannetCleft }: Places): void {
  const random = new Random("gannet cleft");
  const { at, inlandDeg } = gannetCleft;
  const ends = ({ inlandM, lengthM }: typeof MOUTH) => {
    const northDeg = inlandDeg + 270;
    const north = walk(at, [inlandDeg, inlandM], [northDeg, lengthM / 2]);
    const south = acrossM(north, northDeg + 180, lengthM);
    return { north, south, toSouthDeg: azimuthDeg(north, south), toNorthDeg: azimuthDeg(south, north) };
  };
  mouth(book, site, random, ends(MOUTH));
  waist(book, site, random, ends(WAIST));
  throat(book, site, random, ends(THROAT));
  wayDown(book, site, random, {
    foot: ends(WAIST).north,
    facingDeg: ends(WAIST).toSouthDeg,
    dipDeg: 84,
    groundM: 6,
  });
}

interface Ends {
  north: { lon: number; lat: number };
  south: { lon: number; lat: number };
  toSouthDeg: number;
  toNorthDeg: number;
}

/** The longest of the three, redone in titanium after the studs had stood in the salt for thirteen years. */
function mouth(book: Book, site: Site, random: Random, { north, south, toSouthDeg, toNorthDeg }: Ends): void {
  const renewed = book.calendar.ago(1_270);
  const old = () =>
    removed(
      installed(random, "studM12in4404", onDay("2009-09-12"), {
        by: { remembered: "first riggers of the cleft" },
      }),
      renewed,
      "tea-stained and too near the surf for this grade; replaced by titanium",
    );
  const eye = () => installed(random, "eye12inTitanium", renewed);
  book.anchor(
    site,
    lineEnd({
      label: "Mouth, north end",
      at: north,
      bearingDeg: toSouthDeg,
      dipDeg: 14,
      elevationM: 47,
      masterpoint: [640, -1_650, 190],
      backupSlackM: 0.4,
      note: "Three tied legs; both backups on one sling to the ring.",
      placements: [
        { at: [0, 0, 0], bolts: [old(), eye()] },
        { at: [610, 140, -20], bolts: [old(), eye()] },
        { at: [1_260, 40, 15], bolts: [old(), eye()] },
        { at: [330, 1_480, 60], facts: { role: "backup" }, bolts: [eye()] },
        { at: [980, 1_560, 85], facts: { role: "backup" }, bolts: [eye()] },
      ],
      more: {
        edges: [
          {
            label: "Lip of the slab",
            sharpness: "sharp",
            paddingNeeded: true,
            secured: "Carpet and board, tied back to bolt 4",
            x1Mm: -500,
            y1Mm: -2_900,
            x2Mm: 1_900,
            y2Mm: -2_780,
          },
        ],
      },
    }),
  );
  book.anchor(
    site,
    lineEnd({
      label: "Mouth, south end",
      at: south,
      bearingDeg: toNorthDeg,
      dipDeg: 22,
      elevationM: 45,
      masterpoint: [480, -1_500, 160],
      backupSlackM: 0.5,
      placements: [
        { at: [0, 0, 0], bolts: [old(), eye()] },
        { at: [520, 90, 10], bolts: [old(), eye()] },
        { at: [1_010, -60, 0], facts: { deadHoles: [{ xMm: 1_190, yMm: -40 }] }, bolts: [old(), eye()] },
        { at: [500, 1_350, 40], facts: { role: "backup" }, bolts: [eye()] },
        {
          at: [1_700, 2_900, 300],
          facts: {
            kind: "thread",
            role: "backup",
            sizeMm: 340,
            note: "Natural thread behind the chockstone; 4 m sling.",
          },
        },
      ],
      more: {
        edges: [
          {
            label: "Rounded nose",
            sharpness: "rounded",
            paddingNeeded: true,
            secured: "Fire hose sleeve on the line",
            x1Mm: -300,
            y1Mm: -2_400,
            x2Mm: 1_500,
            y2Mm: -2_450,
          },
        ],
      },
    }),
  );
}

/** One good end, and one with thin bent rods that were glued for climbers. */
function waist(book: Book, site: Site, random: Random, { north, south, toSouthDeg, toNorthDeg }: Ends): void {
  const since = book.calendar.ago(1_010);
  const eye = () => installed(random, "eye12in4462", since, { by: "steward" });
  const rod = (): BoltSpec =>
    installed(random, "rod8in4401", inMonth("2011-06"), {
      by: { remembered: "visiting team, as told" },
      glue: "vinylester",
      facts: { adhesiveBatch: null, adhesiveExpiresOn: null },
    });
  book.anchor(
    site,
    lineEnd({
      label: "Waist, north end",
      at: north,
      bearingDeg: toSouthDeg,
      dipDeg: 18,
      elevationM: 52,
      masterpoint: [560, -1_420, 170],
      backupSlackM: 0.35,
      placements: [
        { at: [0, 0, 0], bolts: [eye()] },
        { at: [560, 60, 0], bolts: [eye()] },
        { at: [1_120, -20, 0], bolts: [eye()] },
        { at: [560, 1_250, 30], facts: { role: "backup" }, bolts: [eye()] },
      ],
      more: {
        edges: [
          {
            label: "Broken edge",
            sharpness: "sharp",
            paddingNeeded: true,
            secured: "Two boards, screwed to each other",
            x1Mm: -200,
            y1Mm: -2_050,
            x2Mm: 1_350,
            y2Mm: -2_150,
          },
        ],
      },
    }),
  );
  book.anchor(
    site,
    lineEnd({
      label: "Waist, south end",
      at: south,
      bearingDeg: toNorthDeg,
      dipDeg: 20,
      elevationM: 50,
      masterpoint: [420, -1_300, 140],
      backupSlackM: 0.4,
      note: "Thin rods, glued for climbers: no line from here until they are replaced.",
      placements: [
        { at: [0, 0, 0], bolts: [rod()] },
        { at: [430, 70, 0], bolts: [rod()] },
        { at: [860, 20, 0], bolts: [rod()] },
        { at: [430, 1_100, 30], facts: { role: "backup" }, bolts: [rod()] },
      ],
    }),
  );
}

/** The short one for first lines: studs on one side, thick bent rods on the other. */
function throat(
  book: Book,
  site: Site,
  random: Random,
  { north, south, toSouthDeg, toNorthDeg }: Ends,
): void {
  const stud = () => installed(random, "studM12in4404", onDay("2014-05-17"));
  const rod = () => installed(random, "rod12in4462", book.calendar.ago(520), { glue: "fastEpoxy" });
  book.anchor(
    site,
    lineEnd({
      label: "Throat, north end",
      at: north,
      bearingDeg: toSouthDeg,
      dipDeg: 12,
      elevationM: 58,
      masterpoint: [350, -1_100, 150],
      backupSlackM: 0.3,
      placements: [
        { at: [0, 0, 0], bolts: [stud()] },
        { at: [350, 40, 0], bolts: [stud()] },
        { at: [700, -10, 0], bolts: [stud()] },
        {
          at: [350, 980, 25],
          facts: { role: "backup", deadHoles: [{ xMm: 470, yMm: 990 }] },
          bolts: [stud()],
        },
      ],
    }),
  );
  book.anchor(
    site,
    lineEnd({
      label: "Throat, south end",
      at: south,
      bearingDeg: toNorthDeg,
      dipDeg: 16,
      elevationM: 57,
      masterpoint: [380, -1_200, 150],
      backupSlackM: 0.3,
      placements: [
        { at: [0, 0, 0], bolts: [rod()] },
        { at: [390, 60, 0], bolts: [rod()] },
        { at: [780, 10, 0], bolts: [rod()] },
        { at: [400, 1_080, 30], facts: { role: "backup" }, bolts: [rod()] },
      ],
    }),
  );
}

/** Abseils, belays at the edge and the directionals that keep ropes off the nose. */
function wayDown(book: Book, site: Site, random: Random, wall: Wall): void {
  const near = book.calendar.ago(800);
  const two = (make: () => BoltSpec) => [[make()], [make()]];
  const steel = () => installed(random, "eye12in4404", onDay("2017-08-26"));
  const titanium = () => installed(random, "eye10inTitanium", near);
  book.anchor(
    site,
    pair(wall, {
      label: "Abseil to the kelp ledge",
      uses: ["abseil"],
      rightM: -14,
      upM: 42,
      bolts: two(titanium),
      more: {
        fittings: [
          {
            kind: "ring",
            metal: "ti-2",
            diameterMm: 12,
            diameterLeftMm: 11.8,
            installedOn: near.on,
            replaceable: true,
            on: 1,
          },
          {
            kind: "ring",
            metal: "ti-2",
            diameterMm: 12,
            diameterLeftMm: 11.8,
            installedOn: near.on,
            replaceable: true,
            on: 2,
          },
        ],
      },
    }),
  );
  book.anchor(
    site,
    pair(wall, { label: "Kelp ledge belay", uses: ["belay"], rightM: -13, upM: 12, bolts: two(titanium) }),
  );
  book.anchor(
    site,
    pair(wall, { label: "North rim safety", uses: ["belay"], rightM: 9, upM: 45, bolts: two(steel) }),
  );
  book.anchor(
    site,
    pair(wall, {
      label: "South rim safety",
      uses: ["belay"],
      rightM: 24,
      upM: 44,
      bolts: two(() => installed(random, "gluedM10in4529", book.calendar.ago(640))),
    }),
  );
  book.anchor(
    site,
    pair(wall, {
      label: "Nose directional",
      uses: ["directional"],
      rightM: 16,
      upM: 41,
      bolts: [[titanium()]],
    }),
  );
  book.anchor(site, {
    label: "Rim blocks, tag line",
    uses: ["directional"],
    at: walk(wall.foot, [wall.facingDeg + 180, 12]),
    facts: { elevationM: 49, note: "For the tag line only; nobody ties in here." },
    placements: [
      { facts: { kind: "boulder", sizeMm: 1_900, note: "Sits on turf; look under it before use." } },
      { facts: { kind: "removable", note: "Crack for two cams, 40 to 65 mm." } },
    ],
  });
}
