import { eq } from "drizzle-orm";
import { v7 } from "uuid";
import { describe, expect, it } from "vitest";
import { rolesOf } from "@/db/repositories/people";
import { invitations, memberships, users } from "@/db/schema";
import { hashSecret } from "@/lib/auth/secrets";
import { signInWithLink } from "@/lib/auth/sign-in";
import { acceptInvitation } from "@/lib/commands/account/accept-invitation";
import { inviteMember } from "@/lib/commands/account/invite-member";
import { revokeInvitation } from "@/lib/commands/account/revoke-invitation";
import { getInvitation } from "@/lib/queries/account/get-invitation";
import { listPeople } from "@/lib/queries/account/list-people";
import type { Role } from "@/lib/shared/actor";
import { accountDatabase } from "@/tests/support/account-database";
import { mailsTo, secretMailed } from "@/tests/support/outbox";
import { addArea, addCast, addPerson, contextOf, later, NOON } from "@/tests/support/people";

const db = accountDatabase("auth_invitations");
const DAY_MIN = 24 * 60;

const someEmail = () => `${v7()}@people.example`;

/** An invitation sent by a steward of a new area. */
async function invited(role: Role = "bolter", email = someEmail()) {
  const areaId = await addArea(db());
  const steward = await addPerson(db(), { roles: { [areaId]: "steward" } });
  const id = v7();
  await inviteMember(contextOf(db(), steward), { id, areaId, email, role });
  return { areaId, steward, id, email, secret: await secretMailed(db(), email, "invitation") };
}

async function userIdOf(email: string): Promise<string> {
  const [row] = await db().select({ id: users.id }).from(users).where(eq(users.email, email));
  return row?.id ?? "nobody";
}

describe("inviting somebody to an area", () => {
  it("is for its stewards and for administrators, and refused to everybody else", async () => {
    const areaId = await addArea(db());
    const cast = await addCast(db(), areaId);
    const outcome = async (actor: (typeof cast)[keyof typeof cast]) =>
      inviteMember(contextOf(db(), actor), { id: v7(), areaId, email: someEmail(), role: "rigger" }).then(
        () => "invited",
        (error: { code: string }) => error.code,
      );
    expect({
      visitor: await outcome(cast.visitor),
      outsider: await outcome(cast.outsider),
      rigger: await outcome(cast.rigger),
      bolter: await outcome(cast.bolter),
      steward: await outcome(cast.steward),
      admin: await outcome(cast.admin),
    }).toEqual({
      visitor: "not_signed_in",
      outsider: "forbidden",
      rigger: "forbidden",
      bolter: "forbidden",
      steward: "invited",
      admin: "invited",
    });
    expect(await db().$count(invitations, eq(invitations.areaId, areaId))).toBe(2);
  });

  it("does not tell outsiders that an area for members exists", async () => {
    const areaId = await addArea(db(), "members");
    const { outsider } = await addCast(db(), areaId);
    const ask = (area: string) =>
      inviteMember(contextOf(db(), outsider), { id: v7(), areaId: area, email: someEmail(), role: "rigger" });
    await expect(ask(areaId)).rejects.toMatchObject({ code: "not_found" });
    await expect(ask(v7())).rejects.toMatchObject({ code: "not_found" });
  });

  it("sent twice is one invitation and one mail; the same id for somebody else is a conflict", async () => {
    const areaId = await addArea(db());
    const steward = await addPerson(db(), { roles: { [areaId]: "steward" } });
    const input = { id: v7(), areaId, email: someEmail(), role: "bolter" as const };
    await inviteMember(contextOf(db(), steward), input);
    await inviteMember(contextOf(db(), steward, later(1)), input);
    expect(await mailsTo(db(), input.email)).toHaveLength(1);
    await expect(inviteMember(contextOf(db(), steward), { ...input, role: "steward" })).rejects.toMatchObject(
      { code: "conflict" },
    );
  });

  it("replaces an open invitation of the same address: the earlier link stops working", async () => {
    const { areaId, steward, email, secret } = await invited("rigger");
    await inviteMember(contextOf(db(), steward, later(5)), { id: v7(), areaId, email, role: "bolter" });
    await expect(
      acceptInvitation(contextOf(db(), undefined, later(6)), { secret, name: "Somebody" }),
    ).rejects.toMatchObject({ code: "not_found" });
  });

  it("is refused for somebody who is a member already", async () => {
    const areaId = await addArea(db());
    const { steward, rigger } = await addCast(db(), areaId);
    await expect(
      inviteMember(contextOf(db(), steward), { id: v7(), areaId, email: rigger.email, role: "bolter" }),
    ).rejects.toMatchObject({ code: "invalid_input", problems: [{ path: "email" }] });
  });

  it("is seen by the stewards of the area and nobody else", async () => {
    const { areaId, steward, email } = await invited();
    const rigger = await addPerson(db(), { roles: { [areaId]: "rigger" } });
    const [seen] = await listPeople(steward, NOON);
    expect(seen?.invitations.map((row) => row.email)).toEqual([email]);
    expect(await listPeople(rigger, NOON)).toEqual([]);
  });
});

describe("accepting an invitation", () => {
  it("makes an account with the role it was for", async () => {
    const { areaId, email, secret } = await invited("bolter");
    await acceptInvitation(contextOf(db(), undefined, later(60)), {
      secret,
      name: "New Bolter",
      password: "three calm words",
    });
    const userId = await userIdOf(email);
    expect(await rolesOf(db(), userId)).toEqual({ [areaId]: "bolter" });
    const [user] = await db().select().from(users).where(eq(users.id, userId));
    expect(user).toMatchObject({ name: "New Bolter", isAdmin: false, emailVerifiedAt: later(60) });
  });

  it("hands over a secret that signs this device in", async () => {
    const { steward, areaId } = await invited();
    const email = someEmail();
    const now = new Date();
    await inviteMember(contextOf(db(), steward, now), { id: v7(), areaId, email, role: "rigger" });
    const secret = await secretMailed(db(), email, "invitation");
    const { signInSecret } = await acceptInvitation(contextOf(db(), undefined, now), { secret, name: "New" });
    expect(await signInWithLink(signInSecret, "198.51.100.9")).toMatchObject({ id: await userIdOf(email) });
  });

  it("joins with the account there is, and leaves its name and password alone", async () => {
    const person = await addPerson(db(), { passwordHash: "unchanged" });
    const { areaId, secret } = await invited("steward", person.email);
    await acceptInvitation(contextOf(db()), { secret, name: "Somebody else", password: "another password" });
    expect(await rolesOf(db(), person.userId)).toEqual({ [areaId]: "steward" });
    const [user] = await db().select().from(users).where(eq(users.id, person.userId));
    expect(user).toMatchObject({ name: person.name, passwordHash: "unchanged" });
  });

  it("works once", async () => {
    const { secret } = await invited();
    await acceptInvitation(contextOf(db()), { secret, name: "First" });
    await expect(acceptInvitation(contextOf(db()), { secret, name: "Second" })).rejects.toMatchObject({
      code: "not_found",
    });
  });

  it("works for fourteen days and not longer", async () => {
    const { secret } = await invited();
    const accept = (at: Date) => acceptInvitation(contextOf(db(), undefined, at), { secret, name: "Late" });
    await expect(accept(later(14 * DAY_MIN))).rejects.toMatchObject({ code: "not_found" });
    await expect(accept(later(14 * DAY_MIN - 1))).resolves.toBeDefined();
  });

  it("asks a new person for a name, and the link still works afterwards", async () => {
    const { secret } = await invited();
    await expect(acceptInvitation(contextOf(db()), { secret, name: "" })).rejects.toMatchObject({
      code: "invalid_input",
      problems: [{ path: "name" }],
    });
    await expect(acceptInvitation(contextOf(db()), { secret, name: "Now with one" })).resolves.toBeDefined();
  });

  it("never lowers a role that is held already", async () => {
    const { areaId, steward } = await invited("rigger");
    const other = await addPerson(db());
    await inviteMember(contextOf(db(), steward), { id: v7(), areaId, email: other.email, role: "rigger" });
    const secret = await secretMailed(db(), other.email, "invitation");
    // Members cannot be invited, so the higher role came while the invitation was open.
    await db().insert(memberships).values({ userId: other.userId, areaId, role: "steward" });
    await acceptInvitation(contextOf(db()), { secret });
    expect(await rolesOf(db(), other.userId)).toEqual({ [areaId]: "steward" });
  });

  it("shows what it offers without using it up", async () => {
    const { email, secret } = await invited("rigger");
    const look = () => getInvitation(hashSecret(secret), later(1));
    expect(await look()).toMatchObject({ email, role: "rigger", hasAccount: false });
    expect(await look()).not.toBeNull();
    expect(await getInvitation(hashSecret(`${secret}x`), later(1))).toBeNull();
  });
});

describe("taking an invitation back", () => {
  it("makes its link worthless", async () => {
    const { id, steward, secret } = await invited();
    await revokeInvitation(contextOf(db(), steward), { id });
    await expect(acceptInvitation(contextOf(db()), { secret, name: "Too late" })).rejects.toMatchObject({
      code: "not_found",
    });
    expect(await getInvitation(hashSecret(secret), NOON)).toBeNull();
  });

  it("is refused to everybody but stewards and administrators", async () => {
    const { id, areaId } = await invited();
    const { visitor, outsider, rigger, bolter, admin } = await addCast(db(), areaId);
    for (const actor of [outsider, rigger, bolter]) {
      await expect(revokeInvitation(contextOf(db(), actor), { id })).rejects.toMatchObject({
        code: "forbidden",
      });
    }
    await expect(revokeInvitation(contextOf(db(), visitor), { id })).rejects.toMatchObject({
      code: "not_signed_in",
    });
    await revokeInvitation(contextOf(db(), admin), { id });
  });
});
