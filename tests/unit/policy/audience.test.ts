import { describe, expect, it } from "vitest";
import { audience, isMember, PUBLIC_AUDIENCE, roundedPoint } from "@/lib/policy/audience";
import type { Person } from "@/lib/shared/actor";

const base: Person = {
  kind: "person",
  userId: "u",
  name: "U",
  email: "u@x.example",
  isAdmin: false,
  roles: {},
};

describe("audience", () => {
  it("shows a signed-in person without membership no more than a visitor", () => {
    expect(audience(base)).toEqual(PUBLIC_AUDIENCE);
    expect(audience({ kind: "visitor" })).toEqual(PUBLIC_AUDIENCE);
  });

  it("makes members of the same areas share one key whatever the order or role", () => {
    const one = audience({ ...base, roles: { b: "rigger", a: "steward" } });
    const two = audience({ ...base, roles: { a: "rigger", b: "bolter" } });
    expect(one.key).toBe(two.key);
    expect(one.key).not.toBe(PUBLIC_AUDIENCE.key);
    expect(isMember(one, "a")).toBe(true);
    expect(isMember(one, "c")).toBe(false);
  });

  it("lets an administrator see everything", () => {
    expect(isMember(audience({ ...base, isAdmin: true }), "any")).toBe(true);
  });

  it("moves a rounded point by at most half a hundredth of a degree, about half a kilometre", () => {
    const r = roundedPoint({ lon: -34.20456, lat: 46.90444 });
    expect(r).toEqual({ lon: -34.2, lat: 46.9 });
  });
});
