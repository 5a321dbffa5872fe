import fc from "fast-check";
import { sql } from "drizzle-orm";
import { v7 } from "uuid";
import { beforeAll, describe, expect, it, vi } from "vitest";
import { PATCH as patchAnchor } from "@/app/api/v1/anchors/[id]/route";
import { POST as postAnchor } from "@/app/api/v1/anchors/route";
import { POST as postWarning } from "@/app/api/v1/batch-warnings/route";
import { PATCH as patchBolt } from "@/app/api/v1/bolts/[id]/route";
import { POST as postBolt } from "@/app/api/v1/bolts/route";
import { POST as postClosure } from "@/app/api/v1/closures/route";
import { PATCH as patchJob } from "@/app/api/v1/rebolt-jobs/[id]/route";
import { POST as postJob } from "@/app/api/v1/rebolt-jobs/route";
import { POST as postPhoto } from "@/app/api/v1/reports/[id]/photos/route";
import { PATCH as patchReport } from "@/app/api/v1/reports/[id]/route";
import { POST as postReport } from "@/app/api/v1/reports/route";
import { POST as postSpan } from "@/app/api/v1/spans/route";
import { createApiToken } from "@/lib/commands/account/api-tokens";
import { type Handler, sendJson, type SendOptions } from "@/tests/support/api";
import { accountDatabase } from "@/tests/support/account-database";
import { installOf, reportOf } from "@/tests/support/inputs";
import { addArea, addCast, contextOf } from "@/tests/support/people";
import { addRegister, type Register } from "@/tests/support/register";

/** Fixed, so that a failure can be repeated. */
const SEED = 20261;
vi.useFakeTimers({ now: new Date("2026-06-01T12:00:00Z"), toFake: ["Date"] });
const db = accountDatabase("api_writes");

let token = "";
let r: Register;

beforeAll(async () => {
  const areaId = await addArea(db());
  const cast = await addCast(db(), areaId);
  r = await addRegister(db(), { areaId, ...cast });
  const made = await createApiToken(contextOf(db(), cast.steward, new Date()), {
    id: v7(),
    name: "tests",
    scopes: ["read", "report", "write"],
    expiresInDays: null,
  });
  token = made.token;
});

const send = (handler: Handler, body: unknown, more: Omit<SendOptions, "token"> = {}) =>
  sendJson(handler, body, { token, ...more });

/** Right bodies, each the starting point of wrong ones. */
const doors: readonly {
  name: string;
  handler: Handler;
  right: () => Record<string, unknown>;
  id?: () => string;
}[] = [
  {
    name: "POST /anchors",
    handler: postAnchor,
    right: () => ({
      id: v7(),
      siteId: r.siteId,
      label: "North",
      uses: ["belay"],
      point: { lon: -9.5, lat: 52.1 },
      placements: [{ id: v7(), xMm: 0, yMm: 0 }],
      fittings: [{ id: v7(), kind: "ring", diameterMm: 12 }],
    }),
  },
  {
    name: "PATCH /anchors/{id}",
    handler: patchAnchor,
    id: () => r.anchor.id,
    right: () => ({ label: "South", elevationM: 20, washing: "rain" }),
  },
  {
    name: "POST /spans",
    handler: postSpan,
    right: () => ({ id: v7(), anchorAId: r.anchor.id, anchorBId: r.other.id, name: "The gap" }),
  },
  { name: "POST /bolts", handler: postBolt, right: () => installOf(r) },
  {
    name: "PATCH /bolts/{id}",
    handler: patchBolt,
    id: () => r.anchor.boltIds[2] ?? "",
    right: () => ({ batch: "A-1", embedmentMm: 90 }),
  },
  { name: "POST /reports", handler: postReport, right: () => reportOf(r, {}) },
  {
    name: "PATCH /reports/{id}",
    handler: patchReport,
    id: () => r.reportId,
    right: () => ({ answer: "handled", how: "Tightened it" }),
  },
  {
    name: "POST /rebolt-jobs",
    handler: postJob,
    right: () => ({ id: v7(), anchorId: r.other.id, placementIds: r.other.placementIds, title: "Old rods" }),
  },
  {
    name: "PATCH /rebolt-jobs/{id}",
    handler: patchJob,
    id: () => r.jobId,
    right: () => ({ action: "move", points: 4, reason: "Busy week" }),
  },
  {
    name: "POST /batch-warnings",
    handler: postWarning,
    right: () => ({
      id: v7(),
      areaId: r.areaId,
      title: "Eyes",
      body: "Look",
      says: "inspect",
      boltTypeId: r.typeId,
    }),
  },
  {
    name: "POST /closures",
    handler: postClosure,
    right: () => ({ id: v7(), areaId: r.areaId, reason: "Nesting", startsOn: "2026-06-01" }),
  },
];

/** Everything the register holds but counters, sign-in notes and sequences, as one digest a table. */
async function stateOfRegister(): Promise<Record<string, string>> {
  const tables = await db().execute<{ name: string }>(sql`
    select table_name as name from information_schema.tables
    where table_schema = 'public' and table_type = 'BASE TABLE'
      and table_name not in ('spatial_ref_sys', 'rate_limits', 'api_tokens')`);
  const state: Record<string, string> = {};
  for (const { name } of tables) {
    const [row] = await db().execute<{ digest: string }>(
      sql`select count(*) || ':' || coalesce(md5(string_agg(t::text, '|' order by t::text)), '') as digest from ${sql.identifier(name)} t`,
    );
    state[name] = row?.digest ?? "";
  }
  return state;
}

/** What no field of the register takes. */
const wrongValue = fc.oneof(
  fc.constantFrom<unknown>(-1e9, 1e300, "", " ", [[]], { a: 1 }, true, "\u0000", "a\u0007b"),
  fc.string({ minLength: 5000, maxLength: 5001 }),
  fc.double({ min: 1e7, max: 1e200, noNaN: true }),
);

describe("a wrong body", () => {
  it.each(doors)(
    "sent to $name is refused with a problem document and changes nothing",
    async ({ handler, right, id }) => {
      const before = await stateOfRegister();
      const wrongBody = fc.oneof(
        fc
          .jsonValue()
          .filter((value) => typeof value !== "object" || value === null || Object.keys(value).length < 1),
        // A right body with one field made wrong, or an unknown field beside the right ones.
        fc.tuple(fc.nat(), wrongValue).map(([pick, value]) => {
          const body = right();
          const keys = Object.keys(body);
          return { ...body, [keys[pick % keys.length] ?? "id"]: value };
        }),
        fc.string({ minLength: 3, maxLength: 12 }).map((key) => ({ ...right(), [`x-${key}`]: 1 })),
      );
      await fc.assert(
        fc.asyncProperty(wrongBody, async (body) => {
          const answer = await send(handler, body, { id: id?.(), ifMatch: '"1"' });
          expect(answer.status, JSON.stringify(body).slice(0, 300)).toBeGreaterThanOrEqual(400);
          expect(answer.status).toBeLessThan(500);
          expect(answer.type).toContain("application/problem+json");
          expect(answer.body).toMatchObject({
            status: answer.status,
            title: expect.any(String),
            code: expect.any(String),
          });
          if (answer.status === 422) expect(answer.body.errors.length).toBeGreaterThan(0);
        }),
        { seed: SEED, numRuns: 40 },
      );
      expect(await stateOfRegister()).toEqual(before);
    },
  );

  it("that is not JSON, says nothing of JSON, cannot be kept or is too large is refused", async () => {
    const before = await stateOfRegister();
    expect(await send(postReport, "{not json")).toMatchObject({ status: 400 });
    expect(await send(postReport, "{}", { headers: { "content-type": "text/plain" } })).toMatchObject({
      status: 415,
    });
    expect(await send(postReport, reportOf(r, { note: "a\u0000b" }))).toMatchObject({ status: 422 });
    expect(await send(postReport, JSON.stringify({ note: "x".repeat(1_100_000) }))).toMatchObject({
      status: 413,
    });
    expect(await stateOfRegister()).toEqual(before);
  });
});

describe("a write on an existing record", () => {
  it("wants If-Match, and a stale one is told what is stored", async () => {
    expect(await send(patchBolt, { batch: "Z" }, { id: r.anchor.boltIds[1] })).toMatchObject({ status: 428 });
    expect(await send(patchBolt, { batch: "Z" }, { id: r.anchor.boltIds[1], ifMatch: '"9"' })).toMatchObject({
      status: 412,
      body: { code: "stale_version", current: { version: 1, batch: null } },
    });
    const done = await send(patchBolt, { batch: "Z" }, { id: r.anchor.boltIds[1], ifMatch: '"1"' });
    expect(done).toMatchObject({ status: 200, body: { version: 2 } });
    expect(done.headers.get("etag")).toBe('"2"');
  });

  it("that is absent or whose id cannot be one is not found", async () => {
    for (const id of [v7(), "nothing"]) {
      expect(await send(patchBolt, { batch: "Z" }, { id, ifMatch: '"1"' })).toMatchObject({ status: 404 });
    }
  });
});

describe("a create", () => {
  it("is answered 201 the first time and 200 with the same body after", async () => {
    const body = reportOf(r, { kind: "deformation", measured: { bendAngleDeg: 5 } });
    const [once, twice] = [await send(postReport, body), await send(postReport, body)];
    expect([once.status, twice.status]).toEqual([201, 200]);
    expect(twice.body).toEqual(once.body);
    expect(once.headers.get("location")).toBe(`/api/v1/reports/${once.body.id}`);
    expect(await send(postReport, { ...body, note: "changed" })).toMatchObject({ status: 409 });
  });

  it("from another site's page is refused", async () => {
    const request = new Request("https://register.example/api/v1/reports", {
      method: "POST",
      headers: {
        "content-type": "application/json",
        origin: "https://elsewhere.example",
        host: "register.example",
      },
      body: JSON.stringify(reportOf(r, {})),
    });
    const response = await postReport(request, { params: Promise.resolve({}) });
    expect(response.status).toBe(403);
  });
});

describe("a photo sent to the API", () => {
  const form = (parts: Record<string, string | Blob>) => {
    const data = new FormData();
    for (const [name, value] of Object.entries(parts)) data.set(name, value);
    const request = new Request("https://register.example/api/v1/reports/x/photos", {
      method: "POST",
      headers: { authorization: `Bearer ${token}` },
      body: data,
    });
    return postPhoto(request, { params: Promise.resolve({ id: r.reportId }) });
  };

  it("is refused without a file, without an id, or when it is none", async () => {
    const before = await stateOfRegister();
    expect((await form({ id: v7() })).status).toBe(422);
    expect((await form({ file: new Blob(["abc"]) })).status).toBe(422);
    expect((await form({ id: v7(), file: new Blob(["not a picture"]) })).status).toBe(422);
    expect((await send(postPhoto, {}, { id: r.reportId })).status).toBe(415);
    expect(await stateOfRegister()).toEqual(before);
  });
});
