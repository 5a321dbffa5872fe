import type { LonLat } from "@/db/columns/point";
import type { Book } from "@/db/seed/book";
import { onDay } from "@/db/seed/dates";
import type { Site } from "@/db/seed/ground";
import { installed } from "@/db/seed/hardware";
import { walk } from "@/db/seed/island/frame";
import { pair, type Wall } from "@/db/seed/patterns";
import type { Random } from "@/db/seed/random";
import type { BoltSpec } from "@/db/seed/spec";

/** Abseils, belays at the edge and the directionals that keep ropes off the nose. */
export function enterCleftWays(book: Book, site: Site, random: Random, ledge: LonLat, wall: Wall): void {
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
  book.anchor(
    site,
    pair(
      { ...wall, foot: ledge, groundM: 3 },
      {
        label: "Surf ledge handline",
        uses: ["abseil"],
        rightM: 0,
        upM: 6,
        bolts: two(() => installed(random, "rod8inTitanium", near)),
      },
    ),
  );
  book.anchor(
    site,
    pair(
      { ...wall, foot: ledge, groundM: 3 },
      { label: "Wet groove belay", uses: ["belay"], rightM: 6, upM: 15, bolts: two(titanium) },
    ),
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
