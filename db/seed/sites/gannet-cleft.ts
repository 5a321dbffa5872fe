import type { LonLat } from "@/db/columns/point";
import type { Book } from "@/db/seed/book";
import { inMonth, onDay } from "@/db/seed/dates";
import type { Site } from "@/db/seed/ground";
import { installed, removed } from "@/db/seed/hardware";
import { enterCleftWays } from "@/db/seed/sites/gannet-cleft-ways";
import { azimuthDeg, walk } from "@/db/seed/island/frame";
import type { Places } from "@/db/seed/island/places";
import { acrossM, lineEnd, lip } from "@/db/seed/patterns";
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
  const ledge = walk(at, [inlandDeg, 66], [inlandDeg + 270, 30]);
  enterCleftWays(book, site, random, ledge, {
    foot: ends(WAIST).north,
    facingDeg: ends(WAIST).toSouthDeg,
    dipDeg: 84,
    groundM: 6,
  });
}

interface Ends {
  north: LonLat;
  south: LonLat;
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
      edge: lip(
        "Lip of the slab",
        "sharp",
        "Carpet and board, tied back to bolt 4",
        [-500, -2_900],
        [1_900, -2_780],
      ),
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
      edge: lip("Rounded nose", "rounded", "Fire hose sleeve on the line", [-300, -2_400], [1_500, -2_450]),
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
      edge: lip("Broken edge", "sharp", "Two boards, screwed to each other", [-200, -2_050], [1_350, -2_150]),
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
        { at: [760, 1_040, 30], facts: { role: "backup" }, bolts: [stud()] },
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
