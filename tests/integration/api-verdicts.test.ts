import fc from "fast-check";
import { v7 } from "uuid";
import { beforeAll, describe, expect, it } from "vitest";
import { POST as postVerdict } from "@/app/api/v1/verdicts/route";
import { createApiToken } from "@/lib/commands/account/api-tokens";
import { FORMS, USES } from "@/lib/domain/vocabulary";
import { accountDatabase } from "@/tests/support/account-database";
import { sendJson } from "@/tests/support/api";
import { addPerson, contextOf } from "@/tests/support/people";

/** Fixed, so that a failure can be repeated. */
const SEED = 20261;
const db = accountDatabase("api_verdicts");

let token = "";
beforeAll(async () => {
  const person = await addPerson(db());
  const input = { id: v7(), name: "tests", scopes: ["read" as const], expiresInDays: null };
  token = (await createApiToken(contextOf(db(), person, new Date()), input)).token;
});

const send = (handler: typeof postVerdict, body: unknown) => sendJson(handler, body, { token });

describe("POST /verdicts", () => {
  const example = () => ({
    use: "highline",
    bolt: {
      form: "glued_bent_rod",
      metal: "1.4401",
      rodDiameterMm: 8,
      leverMm: 20,
      ratedRadialKn: 25,
      ratedAxialKn: 15,
      bendOnsetKn: null,
      bendOnsetBasis: "unknown",
      method: "epoxy",
      embedmentMm: 100,
      holeDiameterMm: 16,
      installedOn: "2019-05-04",
      standard: "EN 959:2007",
      batch: null,
    },
    place: {
      seaDistanceM: 80,
      coast: "other",
      washing: "none",
      so2: "low",
      saltedRoadDistanceM: null,
      warmDry: false,
    },
    rock: { ucsMpa: 90 },
    demand: { workingKn: 6, peakKn: 12, angleFromAxisDeg: 90 },
    onDate: "2026-06-01",
  });

  it("answers the worked example of the API's description", async () => {
    const { status, body } = await send(postVerdict, example());
    expect(status).toBe(200);
    // F1 -15 within 0.25 km of the sea, F2 0, F3 -7 without washing: CRF -22, CRC V (EN 1993-1-4, annex A).
    expect(body).toMatchObject({
      verdict: "do_not_use",
      placeClass: { f1: -15, f2: 0, f3: -7, crf: -22, crc: "V" },
      caution: expect.any(String),
    });
    expect(body.findings.map((finding: { code: string }) => finding.code)).toContain(
      "metal.stress-corrosion",
    );
  });

  it("takes nothing but the use and the form", async () => {
    const { status, body } = await send(postVerdict, { use: "belay", bolt: { form: "sleeve_hanger" } });
    expect([status, body.verdict]).toEqual([200, "not_enough_known"]);
  });

  it("refuses negative numbers, unknown words and dates that do not exist", async () => {
    const { bolt, place, demand } = example();
    for (const wrong of [
      { ...example(), use: "slackline" },
      { ...example(), bolt: { ...bolt, form: "nail" } },
      { ...example(), bolt: { ...bolt, embedmentMm: -1 } },
      { ...example(), bolt: { ...bolt, metal: "steel" } },
      { ...example(), place: { ...place, washing: "sometimes" } },
      { ...example(), place: { ...place, seaDistanceM: "80" } },
      { ...example(), demand: { ...demand, peakKn: -12 } },
      { ...example(), onDate: "2026-02-30" },
    ]) {
      expect(await send(postVerdict, wrong)).toMatchObject({ status: 422, type: "application/problem+json" });
    }
  });

  it("never fails, whatever numbers it is given", async () => {
    const maybe = (max: number) => fc.option(fc.double({ min: 0, max, noNaN: true }), { nil: null });
    const word = (...words: string[]) => fc.option(fc.constantFrom(...words), { nil: null });
    const any = fc.record({
      use: fc.constantFrom(...USES),
      bolt: fc.record({
        form: fc.constantFrom(...FORMS),
        metal: word("1.4301", "1.4404", "1.4462", "1.9999", "ti-2", "zinc-plated", "hot-dip-galvanised"),
        hangerMetal: word("1.4301", "zinc-plated", "ti-1"),
        rodCount: fc.option(fc.integer({ min: 1, max: 10 }), { nil: null }),
        rodDiameterMm: maybe(50),
        leverMm: maybe(500),
        shankDiameterMm: maybe(50),
        ratedRadialKn: maybe(100),
        ratedAxialKn: maybe(100),
        bendOnsetKn: maybe(100),
        bendOnsetAxialKn: maybe(100),
        bendOnsetBasis: word("tested", "maker", "estimate", "unknown"),
        method: word("mechanical", "epoxy", "polyester", "mechanical_and_glue"),
        embedmentMm: maybe(1000),
        holeDiameterMm: maybe(100),
        eyeRadiusMm: maybe(50),
        coatingThicknessUm: maybe(500),
        installedOn: word("1987-01-01", "2026-06-01", "2030-01-01"),
      }),
      place: fc.option(
        fc.record({
          seaDistanceM: maybe(1e6),
          washing: word("rain", "cleaned", "none"),
          warmDry: fc.option(fc.boolean(), { nil: null }),
        }),
        { nil: null },
      ),
      rock: fc.option(fc.record({ ucsMpa: maybe(400) }), { nil: null }),
      demand: fc.option(
        fc.record({ workingKn: maybe(100), peakKn: maybe(100), angleFromAxisDeg: maybe(180) }),
        { nil: null },
      ),
    });
    await fc.assert(
      fc.asyncProperty(any, async (body) => {
        const answer = await send(postVerdict, body);
        expect(answer.status, JSON.stringify(body)).toBe(200);
      }),
      { seed: SEED, numRuns: 300 },
    );
  });
});
