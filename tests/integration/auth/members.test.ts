import { and, eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { inTransaction } from "@/db/client";
import { lockArea, updateRole } from "@/db/repositories/memberships";
import { rolesOf } from "@/db/repositories/people";
import { events } from "@/db/schema";
import { loadPerson } from "@/lib/auth/get-actor";
import { changeRole } from "@/lib/commands/account/change-role";
import { removeMember } from "@/lib/commands/account/remove-member";
import { can } from "@/lib/policy/can";
import { VISITOR } from "@/lib/shared/actor";
import { accountDatabase } from "@/tests/support/account-database";
import { mailsTo } from "@/tests/support/outbox";
import { addArea, addCast, addPerson, contextOf, NOON } from "@/tests/support/people";

const db = accountDatabase("auth_members");

/** An area with everybody in it, and one more rigger to act on. */
async function scene() {
  const areaId = await addArea(db());
  const cast = await addCast(db(), areaId);
  const member = await addPerson(db(), { roles: { [areaId]: "rigger" } });
  return { areaId, cast, member };
}

describe("changing a role", () => {
  it("counts from the member's next request on, is told to them and written down", async () => {
    const { areaId, cast, member } = await scene();
    expect(can(member, "bolt.install", { areaId })).toBe(false);
    await changeRole(contextOf(db(), cast.steward), {
      areaId,
      userId: member.userId,
      role: "bolter",
      version: 1,
    });
    const next = (await loadPerson(db(), member.userId, { epoch: 1 })) ?? VISITOR;
    expect(can(next, "bolt.install", { areaId })).toBe(true);
    expect((await mailsTo(db(), member.email)).map((mail) => mail.kind)).toEqual(["role_changed"]);
    const trail = await db()
      .select()
      .from(events)
      .where(and(eq(events.areaId, areaId), eq(events.subjectId, member.userId)));
    expect(trail).toMatchObject([
      { kind: "role.changed", before: { role: "rigger" }, after: { role: "bolter" } },
    ]);
  });

  it("is refused to everybody but stewards and administrators, and then changes nothing", async () => {
    const { areaId, cast, member } = await scene();
    const input = { areaId, userId: member.userId, role: "steward", version: 1 } as const;
    for (const actor of [cast.outsider, cast.rigger, cast.bolter]) {
      await expect(changeRole(contextOf(db(), actor), input)).rejects.toMatchObject({ code: "forbidden" });
    }
    await expect(changeRole(contextOf(db()), input)).rejects.toMatchObject({ code: "not_signed_in" });
    await expect(
      changeRole(contextOf(db(), member), { ...input, userId: member.userId }),
    ).rejects.toMatchObject({ code: "forbidden" });
    expect(await rolesOf(db(), member.userId)).toEqual({ [areaId]: "rigger" });
    await changeRole(contextOf(db(), cast.admin), input);
    expect(await rolesOf(db(), member.userId)).toEqual({ [areaId]: "steward" });
  });

  it("tells the second of two stewards who save the same member", async () => {
    const { areaId, cast, member } = await scene();
    const input = { areaId, userId: member.userId, version: 1 };
    await changeRole(contextOf(db(), cast.steward), { ...input, role: "bolter" });
    await expect(
      changeRole(contextOf(db(), cast.steward), { ...input, role: "steward" }),
    ).rejects.toMatchObject({ code: "stale_version", current: { role: "bolter", version: 2 } });
    expect(await rolesOf(db(), member.userId)).toEqual({ [areaId]: "bolter" });
  });

  it("does not leave an area without a steward, even when two step down at once", async () => {
    const areaId = await addArea(db());
    const [one, two] = [
      await addPerson(db(), { roles: { [areaId]: "steward" } }),
      await addPerson(db(), { roles: { [areaId]: "steward" } }),
    ];
    // The first is in the middle of stepping down while the second starts to.
    let second: Promise<unknown> = Promise.resolve();
    await inTransaction(db(), async (tx) => {
      await lockArea(tx, areaId);
      second = changeRole(contextOf(db(), two), {
        areaId,
        userId: two.userId,
        role: "rigger",
        version: 1,
      }).catch((error: unknown) => error);
      await new Promise((resolve) => setTimeout(resolve, 500));
      await updateRole(tx, { areaId, userId: one.userId, role: "rigger", version: 1, by: one.userId }, NOON);
    });
    expect(await second).toMatchObject({ code: "refused_by_rule" });
    expect(await rolesOf(db(), two.userId)).toEqual({ [areaId]: "steward" });
  });
});

describe("removing a member", () => {
  it("ends the membership at once and keeps the account", async () => {
    const { areaId, cast, member } = await scene();
    await removeMember(contextOf(db(), cast.steward), { areaId, userId: member.userId });
    expect(await loadPerson(db(), member.userId, { epoch: 1 })).toMatchObject({ roles: {} });
    expect((await mailsTo(db(), member.email)).map((mail) => mail.kind)).toEqual(["membership_ended"]);
  });

  it("is refused to everybody but stewards and administrators", async () => {
    const { areaId, cast, member } = await scene();
    const input = { areaId, userId: member.userId };
    for (const actor of [cast.outsider, cast.rigger, cast.bolter, member]) {
      await expect(removeMember(contextOf(db(), actor), input)).rejects.toMatchObject({ code: "forbidden" });
    }
    await expect(removeMember(contextOf(db()), input)).rejects.toMatchObject({ code: "not_signed_in" });
    expect(await rolesOf(db(), member.userId)).toEqual({ [areaId]: "rigger" });
    await removeMember(contextOf(db(), cast.admin), input);
    expect(await rolesOf(db(), member.userId)).toEqual({});
  });

  it("is refused for the last steward, and for somebody who is no member", async () => {
    const { areaId, cast } = await scene();
    await expect(
      removeMember(contextOf(db(), cast.admin), { areaId, userId: cast.steward.userId }),
    ).rejects.toMatchObject({ code: "refused_by_rule" });
    await expect(
      removeMember(contextOf(db(), cast.steward), { areaId, userId: cast.outsider.userId }),
    ).rejects.toMatchObject({ code: "not_found" });
  });
});
