import { sql } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { hashPassword } from "@/lib/auth/password";
import { signInWithPassword } from "@/lib/auth/sign-in";
import { accountDatabase } from "@/tests/support/account-database";
import { addPerson, NOON } from "@/tests/support/people";

const db = accountDatabase("auth_sign_in");
const PASSWORD = "three calm words";

/** Every test comes from an address of its own, so that they do not use up each other's tries. */
let addresses = 0;
const someAddress = () => `198.51.100.${(addresses += 1)}`;

describe("signing in with a password", () => {
  it("lets in the right password, whatever the case of the address, and no other", async () => {
    const person = await addPerson(db(), { passwordHash: await hashPassword(PASSWORD) });
    const address = someAddress();
    expect(await signInWithPassword(person.email.toUpperCase(), PASSWORD, address)).toEqual({
      id: person.userId,
      sessionEpoch: 1,
    });
    expect(await signInWithPassword(person.email, `${PASSWORD} `, address)).toBeNull();
    expect(await signInWithPassword(person.email, "", address)).toBeNull();
  });

  it("answers an unknown address, a person without a password and a closed account like a wrong password", async () => {
    const linkOnly = await addPerson(db());
    const closed = await addPerson(db(), { passwordHash: await hashPassword(PASSWORD), disabledAt: NOON });
    const address = someAddress();
    expect(await signInWithPassword("nobody@people.example", PASSWORD, address)).toBeNull();
    expect(await signInWithPassword(linkOnly.email, "nobody has this password", address)).toBeNull();
    expect(await signInWithPassword(closed.email, PASSWORD, address)).toBeNull();
  });

  it("stores argon2id with OWASP's first choice of parameters", async () => {
    // OWASP Password Storage Cheat Sheet: Argon2id, m=19456 (19 MiB), t=2, p=1.
    expect(await hashPassword(PASSWORD)).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });

  it("stops guessing at one person after ten tries, even with the right password, and says how long", async () => {
    const person = await addPerson(db(), { passwordHash: await hashPassword(PASSWORD) });
    for (let tries = 0; tries < 10; tries += 1) {
      expect(await signInWithPassword(person.email, "wrong", someAddress())).toBeNull();
    }
    const refusal = signInWithPassword(person.email, PASSWORD, someAddress());
    await expect(refusal).rejects.toMatchObject({
      code: "rate_limited",
      message: expect.stringMatching(/^Too many tries\. Wait \d+ (seconds|minutes) and try again\.$/),
    });
    const [row] = await db().execute<{ points: number }>(
      sql`select points from rate_limits where key = ${`sign-in-person:${person.email}`}`,
    );
    expect(row?.points).toBe(11);
  });

  it("lets in again when the time is over", async () => {
    const person = await addPerson(db(), { passwordHash: await hashPassword(PASSWORD) });
    for (let tries = 0; tries < 10; tries += 1)
      await signInWithPassword(person.email, "wrong", someAddress());
    await db().execute(
      sql`update rate_limits set expire = now() - interval '1 second' where key = ${`sign-in-person:${person.email}`}`,
    );
    expect(await signInWithPassword(person.email, PASSWORD, someAddress())).not.toBeNull();
  });
});
