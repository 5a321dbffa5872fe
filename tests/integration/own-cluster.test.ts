import { readFileSync } from "node:fs";
import postgres from "postgres";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { serverAddress } from "@/tests/support/fresh-database";

const sql = postgres(serverAddress(), { max: 1 });
afterAll(() => sql.end());

async function setting(name: string): Promise<string> {
  const [row] = await sql<{ value: string }[]>`select current_setting(${name}) as value`;
  return row?.value ?? "";
}

describe("the database cluster that the commands make", () => {
  let serverPid = 0;
  beforeAll(async () => {
    const [row] = await sql<{ pid: number }[]>`select pg_backend_pid() as pid`;
    serverPid = row?.pid ?? 0;
  });

  it("listens on the loopback address only, and on no socket", async () => {
    expect(await setting("listen_addresses")).toBe("127.0.0.1");
    expect(readFileSync("/proc/net/unix", "utf8")).not.toContain(`.s.PGSQL.${new URL(serverAddress()).port}`);
  });

  it("does not run as root", () => {
    const status = readFileSync(`/proc/${serverPid}/status`, "utf8");
    const user = /^Uid:\s+(\d+)/m.exec(status)?.[1];
    expect(Number(user)).toBeGreaterThan(0);
  });

  it("asks for a password, kept as a salted proof, and refuses a wrong one", async () => {
    expect(await setting("password_encryption")).toBe("scram-sha-256");
    const wrong = new URL(serverAddress());
    wrong.password = "wrong";
    const stranger = postgres(wrong.href, { max: 1 });
    await expect(stranger`select 1`).rejects.toMatchObject({ code: "28P01" });
    await stranger.end();
  });

  it("gives the application no superuser's rights, and PostGIS all the same", async () => {
    expect(await setting("is_superuser")).toBe("off");
    // The distance of one degree along the equator, 111.319 km (WGS 84, NGA.STND.0036).
    const [row] = await sql<{ km: number }[]>`
      select st_distance('POINT(0 0)'::geography, 'POINT(1 0)'::geography) / 1000 as km`;
    expect(row?.km).toBeCloseTo((6378.137 * Math.PI) / 180, 3);
  });
});
