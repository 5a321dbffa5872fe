import { v7 } from "uuid";
import { describe, expect, it } from "vitest";
import { apiTokens } from "@/db/schema";
import { actorFromRequest } from "@/lib/auth/get-actor";
import { hashSecret } from "@/lib/auth/secrets";
import { createApiToken, revokeApiToken } from "@/lib/commands/account/api-tokens";
import { can } from "@/lib/policy/can";
import { getSettings } from "@/lib/queries/account/get-settings";
import type { Person, TokenScope } from "@/lib/shared/actor";
import { accountDatabase } from "@/tests/support/account-database";
import { addArea, addPerson, contextOf, later } from "@/tests/support/people";

const db = accountDatabase("auth_tokens");

function ask(token: string) {
  return actorFromRequest(
    new Request("https://register.example/api/v1/anchors", { headers: { authorization: `Bearer ${token}` } }),
  );
}

async function tokenOf(
  person: Person,
  scopes: TokenScope[],
  expiresInDays: number | null = null,
  at = new Date(),
) {
  const id = v7();
  const made = await createApiToken(contextOf(db(), person, at), {
    id,
    name: "export",
    scopes,
    expiresInDays,
  });
  return { id, ...made };
}

describe("an API token", () => {
  it("carries the rights it was made with, and never more than the person's own", async () => {
    const areaId = await addArea(db());
    const bolter = await addPerson(db(), { roles: { [areaId]: "bolter" } });
    const rights = async (scopes: TokenScope[]) => {
      const actor = await ask((await tokenOf(bolter, scopes)).token);
      return (["export.read", "report.file", "bolt.install", "people.manage"] as const).map((action) =>
        can(actor, action, { areaId }),
      );
    };
    expect(await rights(["read"])).toEqual([true, false, false, false]);
    expect(await rights(["report"])).toEqual([false, true, false, false]);
    expect(await rights(["write"])).toEqual([false, false, true, false]);
    expect(await rights(["read", "report", "write"])).toEqual([true, true, true, false]);
  });

  it("is stored as a hash and shows when it last worked", async () => {
    const person = await addPerson(db());
    const { token } = await tokenOf(person, ["read"]);
    const rows = await db().select().from(apiTokens);
    expect(JSON.stringify(rows)).not.toContain(token);
    expect(rows.map((row) => row.tokenHash)).toContain(hashSecret(token));
    expect((await getSettings(person)).tokens).toMatchObject([{ lastUsedAt: null, hint: token.slice(0, 6) }]);
    await ask(token);
    expect((await getSettings(person)).tokens).toMatchObject([{ lastUsedAt: expect.any(String) }]);
  });

  it("is refused when it is unknown, malformed, expired or revoked", async () => {
    const person = await addPerson(db());
    const refused = { code: "not_signed_in" };
    await expect(ask("x".repeat(43))).rejects.toMatchObject(refused);
    await expect(ask("short")).rejects.toMatchObject(refused);
    const expired = await tokenOf(person, ["read"], 30, later(-31 * 24 * 60, new Date()));
    await expect(ask(expired.token)).rejects.toMatchObject(refused);
    const revoked = await tokenOf(person, ["read"]);
    await expect(ask(revoked.token)).resolves.toMatchObject({ userId: person.userId });
    await revokeApiToken(contextOf(db(), person), { id: revoked.id });
    await expect(ask(revoked.token)).rejects.toMatchObject(refused);
  });

  it("of a closed account is refused", async () => {
    const closed = await addPerson(db(), { disabledAt: new Date() });
    const { token } = await tokenOf(closed, ["read"]);
    await expect(ask(token)).rejects.toMatchObject({ code: "not_signed_in" });
  });

  it("cannot be revoked by somebody else, nor make another token", async () => {
    const [person, other] = [await addPerson(db()), await addPerson(db())];
    const { id, token } = await tokenOf(person, ["read", "report", "write"]);
    await expect(revokeApiToken(contextOf(db(), other), { id })).rejects.toMatchObject({ code: "not_found" });
    const program = await ask(token);
    await expect(
      createApiToken(contextOf(db(), program), {
        id: v7(),
        name: "more",
        scopes: ["write"],
        expiresInDays: null,
      }),
    ).rejects.toMatchObject({ code: "forbidden" });
    await expect(revokeApiToken(contextOf(db(), program), { id })).rejects.toMatchObject({
      code: "forbidden",
    });
    await expect(
      createApiToken(contextOf(db()), { id: v7(), name: "more", scopes: ["read"], expiresInDays: null }),
    ).rejects.toMatchObject({ code: "not_signed_in" });
  });

  it("pressed for twice is one token", async () => {
    const person = await addPerson(db());
    const input = { id: v7(), name: "export", scopes: ["read" as const], expiresInDays: null };
    await createApiToken(contextOf(db(), person), input);
    await expect(createApiToken(contextOf(db(), person), input)).rejects.toMatchObject({ code: "conflict" });
    expect((await getSettings(person)).tokens).toHaveLength(1);
  });
});
