import { eq, sql } from "drizzle-orm";
import { v7 } from "uuid";
import { describe, expect, it } from "vitest";
import { anchors, bolts, events, outbox, placements, reboltJobs, reports, watches } from "@/db/schema";
import { fileReport } from "@/lib/commands/file-report";
import { handleReport } from "@/lib/commands/handle-report";
import { logInstall } from "@/lib/commands/log-install";
import { recordHandCheck } from "@/lib/commands/record-hand-check";
import { returnToService } from "@/lib/commands/return-to-service";
import { strikeRecord } from "@/lib/commands/strike-record";
import { logInstallInput } from "@/lib/schemas/bolt";
import { fileReportInput, handCheckInput } from "@/lib/schemas/report";
import { accountDatabase } from "@/tests/support/account-database";
import { first, installOf, reportOf } from "@/tests/support/inputs";
import { addArea, addCast, addPerson, contextOf, later, NOON } from "@/tests/support/people";
import { addPhotoRow, addRegister } from "@/tests/support/register";

const db = accountDatabase("command_reports");

async function scene() {
  const areaId = await addArea(db());
  const cast = await addCast(db(), areaId);
  return { areaId, cast, r: await addRegister(db(), { areaId, ...cast }) };
}

type Scene = Awaited<ReturnType<typeof scene>>;

const bend = (r: Scene["r"], more: Record<string, unknown> = {}) =>
  fileReportInput.parse(
    reportOf(r, { kind: "deformation", depth: "handled", measured: { bendAngleDeg: 70 }, ...more }),
  );

async function anchorOf({ r }: Scene) {
  const [row] = await db().select().from(anchors).where(eq(anchors.id, r.anchor.id));
  if (!row) throw new Error("no anchor");
  return row;
}

const conditions = async ({ r }: Scene) =>
  (
    await db()
      .select({ number: placements.number, condition: bolts.condition })
      .from(bolts)
      .innerJoin(placements, eq(placements.id, bolts.placementId))
      .where(eq(placements.anchorId, r.anchor.id))
      .orderBy(placements.number, bolts.createdAt)
  ).map((row) => row.condition);

describe("a report of a permanent bend", () => {
  it("takes bolt and anchor out of use, opens an entry and writes to stewards and followers at once", async () => {
    const s = await scene();
    const follower = await addPerson(db());
    await db().insert(watches).values({ id: v7(), userId: follower.userId, anchorId: s.r.anchor.id });
    const input = bend(s.r);
    const filed = await fileReport(contextOf(db(), s.cast.rigger), input);

    expect(filed).toMatchObject({ tookOutOfUse: true, replayed: false });
    expect(await anchorOf(s)).toMatchObject({ condition: "out_of_use", outOfUseSince: input.observedAt });
    expect(await conditions(s)).toEqual(["out_of_use", "check_first", "check_first"]);
    // The anchor had an entry already: it is joined, not doubled.
    const jobs = await db().select().from(reboltJobs).where(eq(reboltJobs.anchorId, s.r.anchor.id));
    expect(jobs.map((job) => job.id)).toEqual([s.r.jobId]);
    expect(jobs[0]?.priorityParts.find((part) => part.key === "grade")?.points).toBe(20);
    const mails = await db()
      .select()
      .from(outbox)
      .where(sql`${outbox.dedupeKey} like ${`out-of-use:${filed.id}:%`}`);
    expect(mails.map((mail) => mail.toEmail).toSorted()).toEqual(
      [follower.email, s.cast.steward.email].toSorted(),
    );
    expect(mails.map((mail) => mail.body).join()).not.toMatch(/52\.1|4321|41 m/);
  });

  it("opens an entry of its own at an anchor that has none", async () => {
    const s = await scene();
    const { other } = s.r;
    const input = bend(s.r, { anchorId: other.id, placementId: first(other.placementIds) });
    await fileReport(contextOf(db(), s.cast.rigger), input);
    const [job] = await db().select().from(reboltJobs).where(eq(reboltJobs.anchorId, other.id));
    expect(job).toMatchObject({ state: "proposed", openedByReportId: input.id });
    expect(job?.priority).toBeGreaterThan(20);
  });

  it("changes nothing at all when a mail cannot be queued", async () => {
    const s = await scene();
    await db().execute(sql`
      create function refuse_mail() returns trigger language plpgsql as $$
      begin raise exception 'no room'; end $$`);
    await db().execute(
      sql`create trigger refuse_mail before insert on outbox for each row execute function refuse_mail()`,
    );
    const before = await anchorOf(s);
    const input = bend(s.r);
    await expect(fileReport(contextOf(db(), s.cast.rigger), input)).rejects.toThrow();
    await db().execute(sql`drop trigger refuse_mail on outbox`);
    await db().execute(sql`drop function refuse_mail`);

    expect(await anchorOf(s)).toEqual(before);
    expect(await db().select().from(reports).where(eq(reports.id, input.id))).toEqual([]);
    expect(await db().select().from(events).where(eq(events.subjectId, input.id))).toEqual([]);
    expect(await conditions(s)).not.toContain("out_of_use");
    await expect(fileReport(contextOf(db(), s.cast.rigger), input)).resolves.toMatchObject({
      replayed: false,
    });
  });

  it("through a tag without an account asks for a look first, until a steward confirms it", async () => {
    const s = await scene();
    const { code } = await anchorOf(s);
    const input = bend(s.r, { tagCode: code });
    const filed = await fileReport(contextOf(db()), input);
    expect(filed).toMatchObject({ tookOutOfUse: false, confirmed: false });
    expect(await anchorOf(s)).toMatchObject({ condition: "check_first" });
    await handleReport(contextOf(db(), s.cast.steward), {
      id: input.id,
      version: 1,
      answer: { answer: "confirmed", how: "Seen myself" },
    });
    expect(await anchorOf(s)).toMatchObject({ condition: "out_of_use" });
    const wrongTag = bend(s.r, { tagCode: "XX-99" });
    await expect(fileReport(contextOf(db()), wrongTag)).rejects.toMatchObject({ code: "not_signed_in" });
  });

  it("holds no more once it is found wrong", async () => {
    const s = await scene();
    const input = bend(s.r);
    await fileReport(contextOf(db(), s.cast.rigger), input);
    await strikeRecord(contextOf(db(), s.cast.steward), {
      subject: "report",
      id: input.id,
      reason: "Another anchor was meant",
    });
    expect(await anchorOf(s)).toMatchObject({ condition: "check_first", outOfUseSince: null });
  });
});

describe("the same report", () => {
  it("sent twice, also at the same moment, is one report and one set of mails", async () => {
    const s = await scene();
    const input = bend(s.r);
    const ctx = contextOf(db(), s.cast.rigger);
    const answers = await Promise.all([fileReport(ctx, input), fileReport(ctx, input)]);
    answers.push(await fileReport(ctx, input));
    expect(answers.map((answer) => answer.replayed).filter(Boolean)).toHaveLength(2);
    expect(new Set(answers.map(({ id, tookOutOfUse }) => `${id} ${tookOutOfUse}`)).size).toBe(1);
    expect(await db().$count(reports, eq(reports.id, input.id))).toBe(1);
    expect(await db().$count(outbox, sql`${outbox.dedupeKey} like ${`out-of-use:${input.id}:%`}`)).toBe(1);
  });

  it("with other content is a conflict", async () => {
    const s = await scene();
    const input = bend(s.r);
    await fileReport(contextOf(db(), s.cast.rigger), input);
    await expect(
      fileReport(contextOf(db(), s.cast.rigger), { ...input, note: "something else" }),
    ).rejects.toMatchObject({ code: "conflict" });
  });
});

describe("a report where nothing is registered", () => {
  it("is kept with its point and told to the stewards of the site near it", async () => {
    const s = await scene();
    const input = fileReportInput.parse({
      id: v7(),
      point: { lon: -9.501, lat: 52.1005 },
      kind: "not_in_register",
      observedAt: later(-5).toISOString(),
    });
    await fileReport(contextOf(db(), s.cast.outsider), input);
    const [row] = await db().select().from(reports).where(eq(reports.id, input.id));
    expect(row).toMatchObject({ anchorId: null, point: input.point, tookOutOfUse: false });
    expect(row?.siteId).not.toBeNull();
  });

  it("is refused without a place", async () => {
    const s = await scene();
    const input = fileReportInput.parse({ id: v7(), kind: "other", observedAt: later(-5).toISOString() });
    await expect(fileReport(contextOf(db(), s.cast.rigger), input)).rejects.toMatchObject({
      code: "invalid_input",
      problems: [{ path: "anchorId" }],
    });
  });
});

describe("putting an anchor back", () => {
  const check = (s: Scene, index: number, who: Scene["cast"]["rigger"]) => {
    const input = handCheckInput.parse({
      id: v7(),
      anchorId: s.r.anchor.id,
      placementId: s.r.anchor.placementIds[index],
      observedAt: NOON.toISOString(),
    });
    return recordHandCheck(contextOf(db(), who), input).then(() => input.id);
  };
  const back = (s: Scene) =>
    returnToService(contextOf(db(), s.cast.steward), { anchorId: s.r.anchor.id, reason: "All looked at" });

  it("is refused, naming each bolt not checked, each check without a photo; then works", async () => {
    const s = await scene();
    await fileReport(contextOf(db(), s.cast.rigger), bend(s.r));
    await logInstall(contextOf(db(), s.cast.bolter), logInstallInput.parse(installOf(s.r)));
    // The new glue cures; the two neighbours carried the same event.
    await expect(back(s)).rejects.toMatchObject({
      code: "refused_by_rule",
      problems: [{ path: "placements.2" }, { path: "placements.3" }],
    });
    const checks = [await check(s, 1, s.cast.bolter), await check(s, 2, s.cast.bolter)];
    expect(await anchorOf(s)).toMatchObject({ condition: "out_of_use" });
    await expect(back(s)).rejects.toMatchObject({
      problems: [
        { message: expect.stringContaining("no photo") },
        { message: expect.stringContaining("no photo") },
      ],
    });
    for (const reportId of checks) await addPhotoRow(db(), { reportId, anchorId: s.r.anchor.id });
    const done = await back(s);
    expect(done.condition).toBe("check_first");
    expect(await anchorOf(s)).toMatchObject({ outOfUseSince: null });
  });

  it("does not count the check of somebody who is no member of the area", async () => {
    const s = await scene();
    await fileReport(contextOf(db(), s.cast.rigger), bend(s.r));
    const reportId = await check(s, 1, s.cast.outsider);
    await addPhotoRow(db(), { reportId, anchorId: s.r.anchor.id });
    await expect(back(s)).rejects.toMatchObject({
      problems: [
        { path: "placements.2", message: expect.stringContaining("not checked") },
        { path: "placements.3" },
      ],
    });
  });

  it("is refused for an anchor that no event took out of use", async () => {
    const s = await scene();
    await expect(back(s)).rejects.toMatchObject({ code: "refused_by_rule" });
  });
});

describe("logging an install", () => {
  it("takes the former bolt out, keeps the chain, answers its reports and waits for the glue", async () => {
    const s = await scene();
    const input = logInstallInput.parse(installOf(s.r));
    const done = await logInstall(contextOf(db(), s.cast.bolter), input);
    // Colder of 21 and 12 °C falls in the row from 5 °C: 1440 min after 10:00.
    expect(done).toMatchObject({
      usableFrom: "2026-06-02T10:00:00.000Z",
      replacedBoltId: first(s.r.anchor.boltIds),
    });
    const [former] = await db()
      .select()
      .from(bolts)
      .where(eq(bolts.id, first(s.r.anchor.boltIds)));
    expect(former).toMatchObject({ condition: "removed", removedOn: "2026-06-01" });
    const [fresh] = await db().select().from(bolts).where(eq(bolts.id, input.id));
    expect(fresh).toMatchObject({ condition: "out_of_use", replacesBoltId: former?.id });
    const [report] = await db().select().from(reports).where(eq(reports.id, s.r.reportId));
    expect(report?.state).toBe("handled");
    await expect(logInstall(contextOf(db(), s.cast.bolter), input)).resolves.toMatchObject({
      replayed: true,
    });
  });

  it("is refused below the first row of the cure table, and with a type set another way", async () => {
    const s = await scene();
    const tryWith = (more: Record<string, unknown>) =>
      logInstall(contextOf(db(), s.cast.bolter), logInstallInput.parse(installOf(s.r, more)));
    await expect(tryWith({ rockTempC: 4 })).rejects.toMatchObject({ code: "refused_by_rule" });
    await expect(tryWith({ method: "mechanical", adhesiveId: null })).rejects.toMatchObject({
      code: "invalid_input",
    });
    await expect(tryWith({ installedOn: "2026-06-02", installedAt: undefined })).rejects.toMatchObject({
      problems: [{ path: "installedOn" }],
    });
    expect(await db().$count(bolts, eq(bolts.placementId, first(s.r.anchor.placementIds)))).toBe(1);
  });
});
