import { describe, expect, it } from "vitest";
import { type Action, ACTIONS, can, roleIn } from "@/lib/policy/can";
import type { Actor, Person } from "@/lib/shared/actor";

const AREA = "area-here";
const OTHER = "area-elsewhere";

function person(roles: Person["roles"], isAdmin = false): Person {
  return { kind: "person", userId: "u", name: "U", email: "u@demo.byssus.example", isAdmin, roles };
}

const actors: Record<string, Actor> = {
  visitor: { kind: "visitor" },
  outsider: person({ [OTHER]: "steward" }),
  rigger: person({ [AREA]: "rigger" }),
  bolter: person({ [AREA]: "bolter" }),
  steward: person({ [AREA]: "steward" }),
  admin: person({}, true),
};

/** Written by hand from the product's table of roles, not read from the code. */
const EXPECTED: Record<Action, readonly string[]> = {
  "report.file": ["outsider", "rigger", "bolter", "steward", "admin"],
  "watch.set": ["outsider", "rigger", "bolter", "steward", "admin"],
  "photo.add": ["outsider", "rigger", "bolter", "steward", "admin"],
  "report.view-private": ["rigger", "bolter", "steward", "admin"],
  "export.read": ["rigger", "bolter", "steward", "admin"],
  "load-check.create": ["rigger", "bolter", "steward", "admin"],
  "anchor.create": ["bolter", "steward", "admin"],
  "anchor.edit": ["bolter", "steward", "admin"],
  "anchor.move": ["bolter", "steward", "admin"],
  "placement.create": ["bolter", "steward", "admin"],
  "span.create": ["bolter", "steward", "admin"],
  "span.edit": ["bolter", "steward", "admin"],
  "bolt.install": ["bolter", "steward", "admin"],
  "bolt.edit": ["bolter", "steward", "admin"],
  "pull-test.record": ["bolter", "steward", "admin"],
  "job.complete": ["bolter", "steward", "admin"],
  "queue.view": ["bolter", "steward", "admin"],
  "record.strike": ["steward", "admin"],
  "report.handle": ["steward", "admin"],
  "condition.decide": ["steward", "admin"],
  "service.return": ["steward", "admin"],
  "job.open": ["steward", "admin"],
  "job.decide": ["steward", "admin"],
  "job.assign": ["steward", "admin"],
  "warning.write": ["steward", "admin"],
  "closure.write": ["steward", "admin"],
  "policy.write": ["steward", "admin"],
  "site.edit": ["steward", "admin"],
  "people.manage": ["steward", "admin"],
  "mail.view-failed": ["steward", "admin"],
  "area.create": ["admin"],
  "catalogue.write": ["admin"],
};

describe("rights by role", () => {
  it("covers every action there is", () => {
    expect(Object.keys(EXPECTED).toSorted()).toEqual([...ACTIONS].toSorted());
    expect(ACTIONS.length * Object.keys(actors).length).toBe(192);
  });

  for (const action of ACTIONS) {
    for (const [name, actor] of Object.entries(actors)) {
      const allowed = EXPECTED[action].includes(name);
      it(`${name} ${allowed ? "may" : "may not"} ${action}`, () => {
        expect(can(actor, action, { areaId: AREA })).toBe(allowed);
      });
    }
  }

  it("gives a bolter only the jobs assigned to them, a steward any", () => {
    const mine = { areaId: AREA, assignedTo: ["u"] };
    const theirs = { areaId: AREA, assignedTo: ["somebody-else"] };
    expect(can(person({ [AREA]: "bolter" }), "job.complete", mine)).toBe(true);
    expect(can(person({ [AREA]: "bolter" }), "job.complete", theirs)).toBe(false);
    expect(can(person({ [AREA]: "steward" }), "job.complete", theirs)).toBe(true);
  });

  it("never lets a token do more than its scopes, even an administrator's", () => {
    const reader: Person = { ...person({}, true), tokenScopes: ["read"] };
    expect(can(reader, "export.read", { areaId: AREA })).toBe(true);
    expect(can(reader, "report.file", { areaId: AREA })).toBe(false);
    expect(can(reader, "bolt.install", { areaId: AREA })).toBe(false);
    const reporter: Person = { ...person({ [AREA]: "steward" }), tokenScopes: ["report"] };
    expect(can(reporter, "report.file", { areaId: AREA })).toBe(true);
    expect(can(reporter, "report.handle", { areaId: AREA })).toBe(false);
  });

  it("refuses role-bound actions where no area is named", () => {
    expect(can(person({ [AREA]: "steward" }), "anchor.edit", { areaId: null })).toBe(false);
  });

  it("counts an administrator as a steward everywhere and a visitor as nothing", () => {
    expect(roleIn(person({}, true), AREA)).toBe("steward");
    expect(roleIn({ kind: "visitor" }, AREA)).toBeNull();
    expect(roleIn(person({ [OTHER]: "rigger" }), AREA)).toBeNull();
  });
});
