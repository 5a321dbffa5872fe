import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { events, users } from "@/db/schema";
import { loadPerson } from "@/lib/auth/get-actor";
import { hashPassword, passwordFits } from "@/lib/auth/password";
import { signInWithLink } from "@/lib/auth/sign-in";
import { requestPasswordReset, requestSignInLink } from "@/lib/commands/account/request-sign-in-link";
import { changePassword, resetPassword } from "@/lib/commands/account/set-password";
import { signOutEverywhere } from "@/lib/commands/account/sign-out-everywhere";
import { accountDatabase } from "@/tests/support/account-database";
import { mailsTo, secretMailed } from "@/tests/support/outbox";
import { addPerson, contextOf, later } from "@/tests/support/people";

const db = accountDatabase("auth_password");
const ADDRESS = "198.51.100.8";

async function storedHash(userId: string): Promise<string | null> {
  const [row] = await db().select({ hash: users.passwordHash }).from(users).where(eq(users.id, userId));
  return row?.hash ?? null;
}

describe("setting a new password with a mailed link", () => {
  it("takes the new password, refuses the old one and ends every session", async () => {
    const person = await addPerson(db(), { passwordHash: await hashPassword("the old password") });
    const now = new Date();
    await requestPasswordReset(contextOf(db(), undefined, now), { email: person.email });
    const secret = await secretMailed(db(), person.email, "reset_password");
    expect(await loadPerson(db(), person.userId, { epoch: 1 })).not.toBeNull();

    const { signInSecret } = await resetPassword(contextOf(db(), undefined, now), {
      secret,
      password: "the new password",
    });

    const hash = await storedHash(person.userId);
    expect(await passwordFits(hash, "the new password")).toBe(true);
    expect(await passwordFits(hash, "the old password")).toBe(false);
    expect(await loadPerson(db(), person.userId, { epoch: 1 })).toBeNull();
    expect(await signInWithLink(signInSecret, ADDRESS)).toEqual({ id: person.userId, sessionEpoch: 2 });
    expect((await mailsTo(db(), person.email)).map((mail) => mail.kind)).toContain("password_changed");
  });

  it("works once and for an hour", async () => {
    const person = await addPerson(db());
    await requestPasswordReset(contextOf(db()), { email: person.email });
    const secret = await secretMailed(db(), person.email, "reset_password");
    const input = { secret, password: "the new password" };
    const gone = { code: "not_found" };
    await expect(resetPassword(contextOf(db(), undefined, later(60)), input)).rejects.toMatchObject(gone);
    await resetPassword(contextOf(db(), undefined, later(59)), input);
    await expect(resetPassword(contextOf(db(), undefined, later(59)), input)).rejects.toMatchObject(gone);
  });

  it("makes every other mailed link of the person worthless", async () => {
    const person = await addPerson(db());
    const now = new Date();
    await requestSignInLink(contextOf(db(), undefined, now), { email: person.email });
    await requestPasswordReset(contextOf(db(), undefined, now), { email: person.email });
    const signIn = await secretMailed(db(), person.email, "sign_in");
    const secret = await secretMailed(db(), person.email, "reset_password");
    await resetPassword(contextOf(db(), undefined, now), { secret, password: "the new password" });
    expect(await signInWithLink(signIn, ADDRESS)).toBeNull();
  });
});

describe("changing the password", () => {
  it("wants the current one; a wrong one changes nothing", async () => {
    const person = await addPerson(db(), { passwordHash: await hashPassword("the old password") });
    const before = await storedHash(person.userId);
    await expect(
      changePassword(contextOf(db(), person), { current: "a guess at it", password: "the new password" }),
    ).rejects.toMatchObject({ code: "invalid_input", problems: [{ path: "current" }] });
    expect(await storedHash(person.userId)).toBe(before);
    expect(await loadPerson(db(), person.userId, { epoch: 1 })).not.toBeNull();

    await changePassword(contextOf(db(), person), {
      current: "the old password",
      password: "the new password",
    });
    expect(await passwordFits(await storedHash(person.userId), "the new password")).toBe(true);
    expect(await loadPerson(db(), person.userId, { epoch: 1 })).toBeNull();
  });

  it("sets the first one of a person who signs in by link", async () => {
    const person = await addPerson(db());
    await changePassword(contextOf(db(), person), { current: "", password: "the first password" });
    expect(await passwordFits(await storedHash(person.userId), "the first password")).toBe(true);
  });

  it("is refused to visitors and to programs with a token", async () => {
    const person = await addPerson(db());
    const input = { current: "", password: "the new password" };
    await expect(changePassword(contextOf(db()), input)).rejects.toMatchObject({ code: "not_signed_in" });
    const program = { ...person, tokenScopes: ["read", "report", "write"] as const };
    await expect(changePassword(contextOf(db(), program), input)).rejects.toMatchObject({
      code: "forbidden",
    });
    expect(await storedHash(person.userId)).toBeNull();
  });
});

describe("signing out everywhere", () => {
  it("ends the sessions made before and leaves those made afterwards", async () => {
    const person = await addPerson(db());
    await signOutEverywhere(contextOf(db(), person));
    expect(await loadPerson(db(), person.userId, { epoch: 1 })).toBeNull();
    expect(await loadPerson(db(), person.userId, { epoch: 2 })).toMatchObject({ userId: person.userId });
    const trail = await db().select().from(events).where(eq(events.subjectId, person.userId));
    expect(trail.map((event) => event.kind)).toEqual(["sessions.ended"]);
  });

  it("is refused to visitors and to programs with a token", async () => {
    const person = await addPerson(db());
    await expect(signOutEverywhere(contextOf(db()))).rejects.toMatchObject({ code: "not_signed_in" });
    const program = { ...person, tokenScopes: ["write"] as const };
    await expect(signOutEverywhere(contextOf(db(), program))).rejects.toMatchObject({ code: "forbidden" });
    expect(await loadPerson(db(), person.userId, { epoch: 1 })).not.toBeNull();
  });
});
