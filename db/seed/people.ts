import { hash } from "@node-rs/argon2";
import type { memberships, users } from "@/db/schema";
import type { Ids } from "@/db/seed/ids";

/** Printed on the demo's sign-in page; a real installation has no such accounts. */
const DEMO_PASSWORD = "tarrow-demo-2026";

const DEMO_PEOPLE = ["admin", "steward", "bolter", "rigger", "visitor"] as const;
export type DemoPerson = (typeof DEMO_PEOPLE)[number];
export type PersonIds = Readonly<Record<DemoPerson, string>>;

/** The register opened for Tarrow on this day; what is older was taken in then. */
export const REGISTER_OPENED = new Date("2016-04-09T08:00:00Z");

const NAMES: PersonIds = {
  admin: "Tarrow administrator",
  steward: "Tarrow steward",
  bolter: "Tarrow bolter",
  rigger: "Tarrow rigger",
  visitor: "Tarrow visitor",
};

export function personName(person: DemoPerson): string {
  return NAMES[person];
}

export function personIds(ids: Ids): PersonIds {
  return {
    admin: ids.at(REGISTER_OPENED),
    steward: ids.at(REGISTER_OPENED),
    bolter: ids.at(REGISTER_OPENED),
    rigger: ids.at(REGISTER_OPENED),
    visitor: ids.at(REGISTER_OPENED),
  };
}

/** One account a role, all with the same known password (argon2id). */
export async function demoUsers(people: PersonIds): Promise<(typeof users.$inferInsert)[]> {
  return Promise.all(
    DEMO_PEOPLE.map(async (person) => ({
      id: people[person],
      email: `${person}@demo.byssus.example`,
      name: NAMES[person],
      passwordHash: await hash(DEMO_PASSWORD, { memoryCost: 19_456, timeCost: 2, parallelism: 1 }),
      emailVerifiedAt: REGISTER_OPENED,
      isAdmin: person === "admin",
      isDemo: true,
      createdAt: REGISTER_OPENED,
      updatedAt: REGISTER_OPENED,
    })),
  );
}

/** Steward, bolter and rigger of Tarrow; the skerry is the steward's alone. The visitor belongs nowhere. */
export function demoMemberships(
  people: PersonIds,
  areas: { tarrow: string; skerry: string },
): (typeof memberships.$inferInsert)[] {
  const row = (person: "steward" | "bolter" | "rigger", areaId: string) => ({
    userId: people[person],
    areaId,
    role: person,
    createdAt: REGISTER_OPENED,
    updatedAt: REGISTER_OPENED,
    createdBy: people.admin,
  });
  return [
    row("steward", areas.tarrow),
    row("bolter", areas.tarrow),
    row("rigger", areas.tarrow),
    row("steward", areas.skerry),
  ];
}
