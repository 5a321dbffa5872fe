import { mkdtempSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { beforeAll, describe, expect, it, vi } from "vitest";
import { AppError, type ErrorCode } from "@/lib/shared/errors";
import { accountDatabase } from "@/tests/support/account-database";
import { COMMANDS, type Needs } from "@/tests/support/commands";
import { addArea, addCast, contextOf } from "@/tests/support/people";
import { addRegister } from "@/tests/support/register";

vi.stubEnv("BYSSUS_DATA_DIR", mkdtempSync(path.join(tmpdir(), "byssus-rights-")));
const db = accountDatabase("command_rights");

const CAST = ["visitor", "outsider", "rigger", "bolter", "steward", "admin"] as const;
type Who = (typeof CAST)[number];

/** Who is let in, by what the command needs. Everybody else is refused. */
const LETS_IN: Readonly<Record<Needs, readonly Who[]>> = {
  person: ["outsider", "rigger", "bolter", "steward", "admin"],
  "writer-or-member": ["rigger", "bolter", "steward", "admin"],
  bolter: ["bolter", "steward", "admin"],
  "bolter-own": ["bolter", "steward", "admin"],
  steward: ["steward", "admin"],
  admin: ["admin"],
};

/** Entries of the queue do not exist for those outside their area. */
const HIDDEN_OUTSIDE = new Set(["decideJob", "assignJob", "moveJob", "completeJob"]);

function expected(name: string, needs: Needs, who: Who): "done" | ErrorCode {
  if (LETS_IN[needs].includes(who)) return "done";
  if (who === "visitor") return "not_signed_in";
  return who === "outsider" && HIDDEN_OUTSIDE.has(name) ? "not_found" : "forbidden";
}

async function outcome(work: () => Promise<unknown>): Promise<string> {
  try {
    await work();
    return "done";
  } catch (error) {
    if (error instanceof AppError) return error.code;
    throw error;
  }
}

/** A fresh register with its people. */
async function scene(visibility: "public" | "members" = "public") {
  const areaId = await addArea(db(), visibility);
  const cast = await addCast(db(), areaId);
  return { cast, register: await addRegister(db(), { areaId, ...cast }, visibility) };
}

describe("every role against every command", () => {
  const matrix = COMMANDS.flatMap((command) => CAST.map((who) => ({ ...command, who })));

  it("is a matrix of 30 commands and 6 kinds of people", () => {
    expect(new Set(COMMANDS.map((command) => command.name)).size).toBe(30);
    expect(matrix).toHaveLength(180);
  });

  const refused = matrix.filter(({ name, needs, who }) => expected(name, needs, who) !== "done");
  const allowed = matrix.filter(({ name, needs, who }) => expected(name, needs, who) === "done");
  let untouched: Awaited<ReturnType<typeof scene>>;
  beforeAll(async () => {
    untouched = await scene();
  });

  it.each(refused)("$who may not: $name", async ({ name, needs, run, who }) => {
    const { cast, register } = untouched;
    const got = await outcome(() => run(contextOf(db(), cast[who]), register));
    expect(got).toBe(expected(name, needs, who));
  });

  it.each(allowed)("$who may: $name", async ({ run, who }) => {
    const { cast, register } = await scene();
    expect(await outcome(() => run(contextOf(db(), cast[who]), register))).toBe("done");
  });
});

describe("a bolter", () => {
  it("cannot close a job that is given to somebody else", async () => {
    const areaId = await addArea(db());
    const cast = await addCast(db(), areaId);
    const other = await addCast(db(), areaId);
    const register = await addRegister(db(), { areaId, bolter: other.bolter, steward: cast.steward });
    const complete = COMMANDS.find((command) => command.name === "completeJob");
    expect(await outcome(async () => complete?.run(contextOf(db(), cast.bolter), register))).toBe(
      "forbidden",
    );
  });
});

describe("a hidden site", () => {
  const onSite = COMMANDS.filter(({ name }) => !["createArea"].includes(name));

  let hidden: Awaited<ReturnType<typeof scene>>;
  beforeAll(async () => {
    hidden = await scene("members");
  });

  it("is asked with 29 commands", () => {
    expect(onSite).toHaveLength(29);
  });

  it.each(onSite)("does not exist for an outsider who tries $name", async ({ run }) => {
    const { cast, register } = hidden;
    expect(await outcome(() => run(contextOf(db(), cast.outsider), register))).toBe("not_found");
    expect(await outcome(() => run(contextOf(db(), cast.visitor), register))).toMatch(
      /^(not_found|not_signed_in)$/,
    );
  });
});
