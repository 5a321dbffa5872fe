import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { anchorEval, bolts, closures } from "@/db/schema";
import { reevaluateDue } from "@/lib/commands/evaluation/reevaluate-all";
import { logInstall } from "@/lib/commands/log-install";
import { moveAnchor } from "@/lib/commands/move-anchor";
import { logInstallInput } from "@/lib/schemas/bolt";
import { accountDatabase } from "@/tests/support/account-database";
import { installOf } from "@/tests/support/inputs";
import { addArea, addCast, contextOf, later } from "@/tests/support/people";
import { addRegister } from "@/tests/support/register";

const db = accountDatabase("command_time");
const HOUR = 60;

async function scene() {
  const areaId = await addArea(db());
  const cast = await addCast(db(), areaId);
  return { cast, r: await addRegister(db(), { areaId, ...cast }) };
}

describe("what time alone changes", () => {
  it("is judged again: a bolt comes into service when its glue has cured", async () => {
    const { cast, r } = await scene();
    const input = logInstallInput.parse(installOf(r));
    await logInstall(contextOf(db(), cast.bolter), input);
    const condition = async () =>
      (await db().select().from(bolts).where(eq(bolts.id, input.id)))[0]?.condition;
    await reevaluateDue(db(), later(21 * HOUR));
    expect(await condition()).toBe("out_of_use");
    await reevaluateDue(db(), later(22 * HOUR));
    expect(await condition()).toBe("in_service");
  });

  it("is judged again once a day, and then there is nothing left to do", async () => {
    const { r } = await scene();
    await db().update(closures).set({ startsOn: "2026-06-03" }).where(eq(closures.id, r.closureId));
    const codes = async () =>
      (await db().select().from(anchorEval).where(eq(anchorEval.anchorId, r.other.id)))[0];
    while ((await reevaluateDue(db(), later(49 * HOUR))) > 0);
    expect(await codes()).toMatchObject({
      verdict: "do_not_use",
      codes: expect.arrayContaining(["care.closure"]),
    });
    expect(await reevaluateDue(db(), later(50 * HOUR))).toBe(0);
  });
});

describe("moving an anchor", () => {
  it("keeps a distance to the sea that was measured by hand", async () => {
    const { cast, r } = await scene();
    await moveAnchor(contextOf(db(), cast.bolter), {
      id: r.anchor.id,
      version: 1,
      move: { point: { lon: -9.6, lat: 52.2 }, reason: "GPS was off" },
    });
    const stored = await db().query.anchors.findFirst({
      where: (row, { eq: is }) => is(row.id, r.anchor.id),
    });
    expect(stored).toMatchObject({ seaDistanceM: 4321, seaDistanceSource: "measured", point: { lon: -9.6 } });
  });
});
