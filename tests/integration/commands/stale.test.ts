import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { anchors } from "@/db/schema";
import { updateAnchor } from "@/lib/commands/update-anchor";
import { accountDatabase } from "@/tests/support/account-database";
import { addArea, addCast, addPerson, contextOf } from "@/tests/support/people";
import { addRegister } from "@/tests/support/register";

const db = accountDatabase("command_stale");

describe("two stewards who save the same record", () => {
  it("at once: one is stored, the other is told what is stored now", async () => {
    const areaId = await addArea(db());
    const cast = await addCast(db(), areaId);
    const second = await addPerson(db(), { roles: { [areaId]: "steward" } });
    const { anchor } = await addRegister(db(), { areaId, ...cast });
    const save = (actor: typeof second, label: string) =>
      updateAnchor(contextOf(db(), actor), { id: anchor.id, version: 1, change: { label } });

    const results = await Promise.allSettled([save(cast.steward, "North"), save(second, "South")]);
    expect(results.map((result) => result.status).toSorted()).toEqual(["fulfilled", "rejected"]);
    const [stored] = await db().select().from(anchors).where(eq(anchors.id, anchor.id));
    const refused = results.find((result) => result.status === "rejected");
    expect(refused?.reason).toMatchObject({
      code: "stale_version",
      current: { label: stored?.label, version: 2 },
    });
    expect(stored?.version).toBe(2);
  });
});
