import { v7 } from "uuid";
import { describe, expect, it } from "vitest";
import { findUserByEmail, insertOneTimeToken } from "@/db/repositories/people";
import { issueFirstRunLink } from "@/lib/auth/first-run";
import { hashSecret } from "@/lib/auth/secrets";
import { makeFirstAdministrator } from "@/lib/commands/account/make-first-administrator";
import { accountDatabase } from "@/tests/support/account-database";
import { addPerson, contextOf, later, NOON } from "@/tests/support/people";

const db = accountDatabase("auth_first_run");

const input = (secret: string, email: string) => ({
  secret,
  name: "Admin",
  email,
  password: "three calm words",
});

function secretOf(link: string | null): string {
  expect(link).toMatch(/^https:\/\/register\.example\/first-run\/[\w-]{43}$/);
  return link?.split("/").at(-1) ?? "";
}

describe("the first administrator", () => {
  it("is made by the link printed last, once; then no more links are printed", async () => {
    const earlier = secretOf(await issueFirstRunLink(db(), NOON));
    const secret = secretOf(await issueFirstRunLink(db(), later(1)));
    const gone = { code: "not_found" };

    await expect(
      makeFirstAdministrator(contextOf(db(), undefined, later(2)), input(earlier, "a@people.example")),
    ).rejects.toMatchObject(gone);
    await expect(
      makeFirstAdministrator(
        contextOf(db(), undefined, later(8 * 24 * 60)),
        input(secret, "b@people.example"),
      ),
    ).rejects.toMatchObject(gone);
    await expect(
      makeFirstAdministrator(contextOf(db()), input("s".repeat(43), "c@people.example")),
    ).rejects.toMatchObject(gone);

    const race = await Promise.allSettled([
      makeFirstAdministrator(contextOf(db(), undefined, later(3)), input(secret, "d@people.example")),
      makeFirstAdministrator(contextOf(db(), undefined, later(3)), input(secret, "e@people.example")),
    ]);
    expect(race.map(({ status }) => status).toSorted()).toEqual(["fulfilled", "rejected"]);
    const made = [
      await findUserByEmail(db(), "d@people.example"),
      await findUserByEmail(db(), "e@people.example"),
    ];
    expect(made.filter((user) => user?.isAdmin)).toHaveLength(1);
    expect(await issueFirstRunLink(db(), later(4))).toBeNull();
  });

  it("is not made by a link that is still live when there is an administrator by another way", async () => {
    await addPerson(db(), { isAdmin: true });
    const secret = "f".repeat(43);
    await insertOneTimeToken(db(), {
      id: v7(),
      purpose: "first_run",
      tokenHash: hashSecret(secret),
      expiresAt: later(60),
    });
    await expect(
      makeFirstAdministrator(contextOf(db()), input(secret, "f@people.example")),
    ).rejects.toMatchObject({ code: "not_found" });
    expect(await findUserByEmail(db(), "f@people.example")).toBeNull();
  });
});
