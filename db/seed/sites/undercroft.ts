import type { Book } from "@/db/seed/book";
import { inMonth, inYear, onDay, type Past } from "@/db/seed/dates";
import type { Site } from "@/db/seed/ground";
import { found, installed, removed } from "@/db/seed/hardware";
import type { Places } from "@/db/seed/island/places";
import { pair, row, type Wall } from "@/db/seed/patterns";
import { Random } from "@/db/seed/random";
import type { AnchorSpec, BoltSpec } from "@/db/seed/spec";
import type { TypeKey } from "@/db/seed/catalogue/bolt-types";

/** Measured by hand with a tape from the high-water mark; the map's coast says about the same. */
const TAPED: AnchorSpec["facts"] = {
  seaDistanceM: 90,
  seaDistanceSource: "measured",
  seaDistanceErrorM: 5,
  seaDistanceNote: "Taped from the high-water mark along the cave floor.",
};

/** Steel of four decades in a cave that salt reaches and rain does not; the titanium came later. */
export function enterUndercroft(book: Book, site: Site, { undercroft }: Places): void {
  const random = new Random("undercroft");
  const wall: Wall = { foot: undercroft, facingDeg: undercroft.inlandDeg + 180, dipDeg: 118, groundM: 5 };
  const many = (count: number, chain: () => readonly BoltSpec[]) => Array.from({ length: count }, chain);
  const steel = (type: TypeKey, when: Past) => () => [
    installed(random, type, when, { by: { remembered: "cave regulars" }, glue: "vinylester" }),
  ];
  const renewed = book.calendar.ago(610);
  const titanium = () => installed(random, "rod8inTitanium", renewed);
  const renewedFrom = (type: TypeKey, when: Past, why: string) => () => [
    removed(
      installed(random, type, when, { by: { remembered: "cave regulars" }, glue: "vinylester" }),
      renewed,
      why,
    ),
    titanium(),
  ];
  const lines = [
    { name: "Drip Line", lengthM: 19, bolts: many(8, steel("rod8in4401", inMonth("2008-10"))) },
    { name: "Salt Tithe", lengthM: 16, bolts: many(7, steel("studM10in4301", inYear(2004))) },
    {
      name: "Low Vault",
      lengthM: 18,
      bolts: many(
        8,
        renewedFrom(
          "rod8in4401",
          inMonth("2008-11"),
          "cracked eye on the neighbour; all of the line changed",
        ),
      ),
    },
    { name: "Clerestory", lengthM: 22, bolts: many(8, () => [titanium()]) },
  ] as const;
  lines.forEach((line, index) => {
    const rightM = -18 + index * 9;
    const sheet = row(random, wall, { ...line, rightM });
    book.anchor(site, { ...sheet, facts: { ...sheet.facts, ...TAPED } });
  });
  const lowerOff = (label: string, rightM: number, upM: number, make: () => BoltSpec) =>
    book.anchor(
      site,
      pair(wall, {
        label,
        uses: ["lower_off"],
        rightM,
        upM,
        bolts: [[make()], [make()]],
        more: { facts: TAPED },
      }),
    );
  lowerOff("Drip Line, top", -18, 19, () =>
    installed(random, "rod8in4401", inMonth("2008-10"), {
      by: { remembered: "cave regulars" },
      glue: "vinylester",
    }),
  );
  lowerOff("Salt Tithe, top", -9, 16, () =>
    found("studM10in4301", inYear(2004), { method: "mechanical", rustGrade: 2, embedmentMm: 60 }),
  );
  lowerOff("Low Vault, top", 0, 18, titanium);
  lowerOff("Clerestory, top", 9, 22, titanium);
  book.anchor(
    site,
    pair(wall, {
      label: "Cave mouth belay",
      uses: ["belay"],
      rightM: -24,
      upM: 2,
      bolts: [
        [installed(random, "eye10in4547", book.calendar.ago(1_400), { by: "steward" })],
        [installed(random, "eye10in4547", book.calendar.ago(1_400), { by: "steward" })],
      ],
      more: { facts: TAPED },
    }),
  );
  book.anchor(
    site,
    pair(wall, {
      label: "Tide ledge abseil",
      uses: ["abseil"],
      rightM: 16,
      upM: 24,
      bolts: [
        [installed(random, "studM12in4462", onDay("2018-09-01"), { facts: { rustGrade: 1 } })],
        [installed(random, "studM12in4462", onDay("2018-09-01"))],
      ],
      more: { facts: TAPED },
    }),
  );
  book.anchor(
    site,
    pair(wall, {
      label: "Low water handline",
      uses: ["abseil"],
      rightM: -28,
      upM: 3,
      bolts: [[titanium()], [titanium()]],
      more: { facts: TAPED },
    }),
  );
}
