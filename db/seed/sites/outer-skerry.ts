import type { Book } from "@/db/seed/book";
import type { Site } from "@/db/seed/ground";
import { installed } from "@/db/seed/hardware";
import type { Places } from "@/db/seed/island/places";
import { pair, type Wall } from "@/db/seed/patterns";
import { Random } from "@/db/seed/random";

/** Two anchors that only the members of their own area know of. */
export function enterOuterSkerry(book: Book, site: Site, { skerry }: Places): void {
  const random = new Random("outer skerry");
  const wall: Wall = { foot: skerry, facingDeg: 180, dipDeg: 70, groundM: 3 };
  const placed = book.calendar.ago(480);
  const eye = () => installed(random, "eye12inTitanium", placed, { by: "steward" });
  book.anchor(
    site,
    pair(wall, { label: "Landing", uses: ["belay"], rightM: 0, upM: 2, bolts: [[eye()], [eye()]] }),
  );
  book.anchor(
    site,
    pair(wall, { label: "Counting ledge", uses: ["abseil"], rightM: 14, upM: 16, bolts: [[eye()], [eye()]] }),
  );
}
