import type { Book } from "@/db/seed/book";
import { beforeYear, onDay } from "@/db/seed/dates";
import type { Site } from "@/db/seed/ground";
import { found, installed, removed } from "@/db/seed/hardware";
import { azimuthDeg, walk } from "@/db/seed/island/frame";
import { type Places, RIM_ANCHOR_INLAND_M, STACK_SPAN_M } from "@/db/seed/island/places";
import { acrossM, lineEnd, lip, pair, row, type Wall } from "@/db/seed/patterns";
import { Random } from "@/db/seed/random";

/** One line from the rim to the stack, and everything needed to get off the stack again. */
export function enterPillarStack(book: Book, site: Site, { pillarStack }: Places): void {
  const random = new Random("pillar stack");
  const seawardDeg = pillarStack.inlandDeg + 180;
  const rim = walk(pillarStack.at, [pillarStack.inlandDeg, RIM_ANCHOR_INLAND_M]);
  const stack = acrossM(rim, seawardDeg, STACK_SPAN_M);
  rimEnd(book, site, random, rim, azimuthDeg(rim, stack));
  stackEnd(book, site, random, stack, azimuthDeg(stack, rim));
  onTheRim(book, site, random, {
    foot: walk(rim, [pillarStack.inlandDeg, 5]),
    facingDeg: seawardDeg,
    dipDeg: 20,
    groundM: 39,
  });
  offTheStack(book, site, random, {
    foot: walk(pillarStack.stackCentre, [seawardDeg + 180, 15]),
    facingDeg: seawardDeg + 180,
    dipDeg: 86,
    groundM: 4,
  });
}

function rimEnd(
  book: Book,
  site: Site,
  random: Random,
  at: { lon: number; lat: number },
  bearingDeg: number,
): void {
  const eye = () => installed(random, "eye12in4529", book.calendar.ago(860));
  book.anchor(
    site,
    lineEnd({
      label: "Stack line, rim end",
      at,
      bearingDeg,
      dipDeg: 10,
      elevationM: 39,
      masterpoint: [700, -1_700, 180],
      backupSlackM: 0.5,
      placements: [
        { at: [0, 0, 0], bolts: [eye()] },
        { at: [480, 110, 0], bolts: [eye()] },
        { at: [950, 120, 0], bolts: [eye()] },
        { at: [1_420, 10, 0], bolts: [eye()] },
        { at: [700, 1_700, 40], facts: { role: "backup" }, bolts: [eye()] },
      ],
      edge: lip(
        "Sandstone rim",
        "rounded",
        "Carpet, weighted at both ends: the rim crumbles under pegs",
        [-600, -3_100],
        [2_000, -3_000],
      ),
    }),
  );
}

function stackEnd(
  book: Book,
  site: Site,
  random: Random,
  at: { lon: number; lat: number },
  bearingDeg: number,
): void {
  const placed = book.calendar.ago(835);
  const eye = () =>
    installed(random, "eye12inTitanium", placed, {
      facts: { note: "Drilled 20 mm deeper than usual: soft rock." },
    });
  book.anchor(
    site,
    lineEnd({
      label: "Stack line, stack end",
      at,
      bearingDeg,
      dipDeg: 8,
      elevationM: 36,
      masterpoint: [450, -1_350, 150],
      backupSlackM: 0.6,
      note: "Backup is the threaded boulder: sling it before anything else.",
      placements: [
        { at: [0, 0, 0], bolts: [eye()] },
        { at: [460, 50, 0], bolts: [eye()] },
        { at: [930, -10, 0], bolts: [eye()] },
        {
          at: [300, 2_600, 350],
          facts: {
            kind: "boulder",
            role: "backup",
            sizeMm: 1_800,
            note: "A rope went once round and through the gap below; 6 m sling, padding on the east side.",
          },
          body: 0,
        },
      ],
      bodies: [
        {
          label: "Summit boulder",
          attachment: "detached",
          lengthM: 1.8,
          widthM: 1.4,
          heightM: 1.1,
          note: "Some seven tonnes, sits in a hollow; did not move when levered.",
        },
      ],
      edge: lip("Summit edge", "rounded", null, [-400, -2_300], [1_500, -2_350]),
    }),
  );
}

function offTheStack(book: Book, site: Site, random: Random, wall: Wall): void {
  const titanium = () => installed(random, "eye12inTitanium", book.calendar.ago(835));
  const rod = () => installed(random, "rod8inTitanium", book.calendar.ago(420), { by: "steward" });
  const relic = () =>
    found("studM10plated", beforeYear(2000), {
      method: "mechanical",
      magnetic: true,
      rustGrade: 4,
      note: "The nut is a ball of rust.",
    });
  book.anchor(
    site,
    pair(wall, {
      label: "Summit abseil",
      uses: ["abseil"],
      rightM: 3,
      upM: 31,
      apartMm: 320,
      bolts: [[titanium()], [titanium()]],
      more: {
        fittings: [
          { kind: "ring", metal: "ti-2", diameterMm: 14, diameterLeftMm: 13.6, replaceable: true, on: 1 },
        ],
      },
    }),
  );
  book.anchor(
    site,
    pair(wall, { label: "Landing belay", uses: ["belay"], rightM: 1, upM: 2, bolts: [[rod()], [rod()]] }),
  );
  book.anchor(
    site,
    pair(wall, {
      label: "Old landing studs",
      uses: ["abseil"],
      rightM: -4,
      upM: 3,
      bolts: [[relic()], [relic()]],
      more: { facts: { note: "Left for the historians. Use the belay to the right." } },
    }),
  );
  book.anchor(
    site,
    row(random, wall, {
      name: "Landward Groove",
      rightM: 5,
      lengthM: 24,
      bolts: Array.from({ length: 7 }, (_, index) =>
        index < 2
          ? [
              removed(
                installed(random, "studM10in4404", onDay("2013-07-20")),
                book.calendar.ago(420),
                "crevice rust under the hanger",
                "Tarrow steward",
              ),
              rod(),
            ]
          : [rod()],
      ),
    }),
  );
}

/** On the mainland side: what the crew ties into, and the point the bags go across from. */
function onTheRim(book: Book, site: Site, random: Random, wall: Wall): void {
  const eye = () => installed(random, "eye12in4529", book.calendar.ago(860));
  book.anchor(
    site,
    pair(wall, { label: "Rim safety", uses: ["belay"], rightM: -5, upM: 1, bolts: [[eye()], [eye()]] }),
  );
  book.anchor(
    site,
    pair(wall, { label: "Rim haul point", uses: ["directional"], rightM: 6, upM: 1, bolts: [[eye()]] }),
  );
}
