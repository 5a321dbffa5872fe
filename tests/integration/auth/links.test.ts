import { describe, expect, it } from "vitest";
import { spendOneTimeToken } from "@/db/repositories/people";
import { oneTimeTokens } from "@/db/schema";
import { hashSecret } from "@/lib/auth/secrets";
import { signInWithLink } from "@/lib/auth/sign-in";
import { enterDemo } from "@/lib/commands/account/enter-demo";
import { requestPasswordReset, requestSignInLink } from "@/lib/commands/account/request-sign-in-link";
import { accountDatabase } from "@/tests/support/account-database";
import { mailsTo, secretMailed } from "@/tests/support/outbox";
import { addPerson, contextOf, later, NOON } from "@/tests/support/people";

const db = accountDatabase("auth_links");
const ADDRESS = "198.51.100.7";

describe("a mailed sign-in link", () => {
  it("signs in once", async () => {
    const person = await addPerson(db());
    const now = new Date();
    await requestSignInLink(contextOf(db(), undefined, now), { email: person.email });
    const secret = await secretMailed(db(), person.email, "sign_in");
    expect(await signInWithLink(secret, ADDRESS)).toEqual({ id: person.userId, sessionEpoch: 1 });
    expect(await signInWithLink(secret, ADDRESS)).toBeNull();
  });

  it("is spent by one of two that come at the same moment", async () => {
    const person = await addPerson(db());
    await requestSignInLink(contextOf(db(), undefined, new Date()), { email: person.email });
    const secret = await secretMailed(db(), person.email, "sign_in");
    const both = await Promise.all([signInWithLink(secret, ADDRESS), signInWithLink(secret, ADDRESS)]);
    expect(both.filter((signedIn) => signedIn !== null)).toHaveLength(1);
  });

  it("works for 20 minutes and not longer", async () => {
    const person = await addPerson(db());
    await requestSignInLink(contextOf(db()), { email: person.email });
    const hash = hashSecret(await secretMailed(db(), person.email, "sign_in"));
    expect(await spendOneTimeToken(db(), hash, "sign_in", later(20))).toBeNull();
    expect(await spendOneTimeToken(db(), hash, "sign_in", later(19.9))).toMatchObject({
      userId: person.userId,
    });
  });

  it("is not taken for another purpose", async () => {
    const person = await addPerson(db());
    await requestPasswordReset(contextOf(db(), undefined, new Date()), { email: person.email });
    const secret = await secretMailed(db(), person.email, "reset_password");
    expect(await signInWithLink(secret, ADDRESS)).toBeNull();
  });

  it("is not told from the answer whether an address has an account", async () => {
    const person = await addPerson(db());
    const closed = await addPerson(db(), { disabledAt: NOON });
    const answers = [];
    for (const email of [person.email, closed.email, "stranger@people.example"]) {
      answers.push(await requestSignInLink(contextOf(db()), { email }));
      answers.push(await requestPasswordReset(contextOf(db()), { email }));
    }
    expect(new Set(answers)).toEqual(new Set([undefined]));
    expect(await mailsTo(db(), person.email)).toHaveLength(2);
    expect(await mailsTo(db(), closed.email)).toHaveLength(0);
    expect(await mailsTo(db(), "stranger@people.example")).toHaveLength(0);
  });

  it("does not let in a person whose account was closed after it was mailed", async () => {
    const closed = await addPerson(db(), { disabledAt: NOON });
    const secret = "s".repeat(43);
    await db()
      .insert(oneTimeTokens)
      .values({
        id: closed.userId,
        purpose: "sign_in",
        tokenHash: hashSecret(secret),
        userId: closed.userId,
        expiresAt: later(20, new Date()),
      });
    expect(await signInWithLink(secret, ADDRESS)).toBeNull();
  });

  it("stores no secret, only its hash", async () => {
    const person = await addPerson(db());
    await requestSignInLink(contextOf(db()), { email: person.email });
    const secret = await secretMailed(db(), person.email, "sign_in");
    const stored = JSON.stringify(await db().select().from(oneTimeTokens));
    expect(stored).not.toContain(secret);
    expect(stored).toContain(hashSecret(secret));
  });

  it("does not open a demo account where there is no demo", async () => {
    const person = await addPerson(db());
    await expect(enterDemo(contextOf(db()), { email: person.email })).rejects.toMatchObject({
      code: "not_found",
    });
  });
});
