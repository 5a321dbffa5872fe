import type { Db } from "@/db/client";
import { inTransaction } from "@/db/client";
import { memberships, users } from "@/db/schema";
import { Book } from "@/db/seed/book";
import { Calendar } from "@/db/seed/dates";
import { enterGround } from "@/db/seed/ground";
import { places } from "@/db/seed/island/places";
import { demoMemberships, demoUsers } from "@/db/seed/people";
import { enterCrownMoor } from "@/db/seed/sites/crown-moor";
import { enterFellgateWall } from "@/db/seed/sites/fellgate-wall";
import { enterGannetCleft } from "@/db/seed/sites/gannet-cleft";
import { enterLowdenQuarry } from "@/db/seed/sites/lowden-quarry";
import { enterOuterSkerry } from "@/db/seed/sites/outer-skerry";
import { enterPillarStack } from "@/db/seed/sites/pillar-stack";
import { enterUndercroft } from "@/db/seed/sites/undercroft";
import { enterHistory } from "@/db/seed/stories/history";
import { enterNotices } from "@/db/seed/stories/notices";
import { enterQueue } from "@/db/seed/stories/queue";
import { enterReports } from "@/db/seed/stories/reports";
import { enterSpans } from "@/db/seed/stories/spans";
import { writeBook } from "@/db/seed/write";

/**
 * Fills an empty database with the Isle of Tarrow: invented island, invented anchors, the same every time for the
 * same `now`. Verdicts are not seeded: whoever calls this evaluates every anchor afterwards.
 */
export async function seedTarrow(db: Db, now: Date): Promise<void> {
  const island = places();
  const book = new Book(new Calendar(now));
  const ground = enterGround(book, island);
  enterGannetCleft(book, ground.gannetCleft, island);
  enterUndercroft(book, ground.undercroft, island);
  enterPillarStack(book, ground.pillarStack, island);
  enterLowdenQuarry(book, ground.lowdenQuarry, island);
  enterFellgateWall(book, ground.fellgateWall, island);
  enterCrownMoor(book, ground.crownMoor, island);
  enterOuterSkerry(book, ground.outerSkerry, island);
  enterSpans(book, ground);
  enterReports(book);
  enterQueue(book);
  enterNotices(book, ground);
  enterHistory(book);

  const people = await demoUsers(book.people);
  await inTransaction(db, async (tx) => {
    await tx.insert(users).values(people);
    await writeBook(tx, book, island);
    await tx.insert(memberships).values(demoMemberships(book.people, ground));
  });
}
