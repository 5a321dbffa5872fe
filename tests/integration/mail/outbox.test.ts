import { eq, sql } from "drizzle-orm";
import { v7 } from "uuid";
import { beforeEach, describe, expect, it } from "vitest";
import { inTransaction } from "@/db/client";
import { type NewMail, queueMails } from "@/db/repositories/outbox";
import { listSinkMails, insertSinkMail } from "@/db/repositories/sink-mails";
import { outbox } from "@/db/schema";
import { drainOutbox } from "@/lib/commands/drain-outbox";
import { smtpDeliver } from "@/lib/mail/transport";
import { startSink } from "@/lib/mail/sink";
import { listFailedMails } from "@/lib/queries/notices";
import { accountDatabase } from "@/tests/support/account-database";
import { addArea, addCast, later, NOON } from "@/tests/support/people";

const db = accountDatabase("mail_outbox");

beforeEach(() => db().delete(outbox));

function mail(more: Partial<NewMail> = {}): NewMail {
  const dedupeKey = v7();
  return {
    toEmail: "follower@people.example",
    subject: "Out of use: GC-04, Gannet Cleft",
    body: "Do not tie in to it.",
    kind: "out_of_use",
    areaId: null,
    dedupeKey,
    ...more,
  };
}

const queue = (...mails: NewMail[]) => inTransaction(db(), (tx) => queueMails(tx, mails, NOON));
const atNoon = () => NOON;
const refuse = () => Promise.reject(new Error("451 try later"));

async function states() {
  const rows = await db().select().from(outbox).orderBy(outbox.id);
  return rows.map(({ state, attempts }) => ({ state, attempts }));
}

function signal() {
  let give = () => {};
  const given = new Promise<void>((resolve) => (give = resolve));
  return { given, give };
}

describe("mail in the outbox", () => {
  it("is there exactly when the change that causes it is", async () => {
    await expect(
      inTransaction(db(), async (tx) => {
        await queueMails(tx, [mail()], NOON);
        throw new Error("the change failed");
      }),
    ).rejects.toThrow("the change failed");
    expect(await states()).toEqual([]);
    await queue(mail());
    expect(await states()).toEqual([{ state: "queued", attempts: 0 }]);
  });

  it("is not lost when the process ends between commit and sending, nor in the middle of sending", async () => {
    await queue(mail());
    // The process that committed is gone. Another takes the mail and loses its connection in the middle.
    const cutOff = async () => {
      await db().execute(
        sql`select pg_terminate_backend(pid) from pg_stat_activity
            where datname = current_database() and state = 'idle in transaction'`,
      );
    };
    await expect(drainOutbox(db(), cutOff, atNoon)).rejects.toThrow();
    expect(await states()).toEqual([{ state: "queued", attempts: 0 }]);

    const sent: string[] = [];
    await drainOutbox(db(), async ({ subject }) => void sent.push(subject), atNoon);
    expect(sent).toEqual(["Out of use: GC-04, Gannet Cleft"]);
    expect(await states()).toEqual([{ state: "sent", attempts: 1 }]);
  });

  it("is sent once by two drains that run at the same time", async () => {
    await queue(...Array.from({ length: 12 }, () => mail()));
    const sent: string[] = [];
    // Nobody hands over a mail before both are busy with one, so each of them sends at least one.
    const bothBusy = signal();
    let busy = 0;
    const together = async ({ id }: { id: string }) => {
      busy += 1;
      if (busy === 2) bothBusy.give();
      await bothBusy.given;
      sent.push(id);
    };
    const [one, two] = await Promise.all([
      drainOutbox(db(), together, atNoon),
      drainOutbox(db(), together, atNoon),
    ]);
    expect(one.sent + two.sent).toBe(12);
    expect(Math.min(one.sent, two.sent)).toBeGreaterThan(0);
    expect(new Set(sent).size).toBe(12);
    expect(sent).toHaveLength(12);
  });

  it("is passed over while another drain is busy with it", async () => {
    await queue(mail({ toEmail: "slow@people.example" }), mail({ toEmail: "quick@people.example" }));
    const begun = signal();
    const released = signal();
    const sent: string[] = [];
    const one = drainOutbox(
      db(),
      async ({ toEmail }) => {
        begun.give();
        await released.given;
        sent.push(toEmail);
      },
      atNoon,
    );
    await begun.given;
    const other = await drainOutbox(db(), async ({ toEmail }) => void sent.push(toEmail), atNoon);
    expect(other).toEqual({ sent: 1, failed: 0 });
    expect(sent).toEqual(["quick@people.example"]);
    released.give();
    expect(await one).toEqual({ sent: 1, failed: 0 });
  });

  it("with the same cause and person is queued once", async () => {
    await queue(mail({ dedupeKey: "report:1:follower" }));
    await queue(mail({ dedupeKey: "report:1:follower" }), mail({ dedupeKey: "report:1:steward" }));
    expect(await states()).toHaveLength(2);
  });

  it("that was refused waits before it is tried again, longer each time", async () => {
    await queue(mail());
    expect(await drainOutbox(db(), refuse, atNoon)).toEqual({ sent: 0, failed: 1 });
    expect(await drainOutbox(db(), refuse, () => later(0.9))).toEqual({ sent: 0, failed: 0 });
    expect(await drainOutbox(db(), refuse, () => later(1))).toEqual({ sent: 0, failed: 1 });
    expect(await drainOutbox(db(), refuse, () => later(5.9))).toEqual({ sent: 0, failed: 0 });
    expect(
      await drainOutbox(
        db(),
        async () => undefined,
        () => later(6),
      ),
    ).toEqual({ sent: 1, failed: 0 });
    expect(await states()).toEqual([{ state: "sent", attempts: 3 }]);
  });

  it("does not hold up the mail behind it", async () => {
    await queue(mail({ toEmail: "broken@people.example" }), mail());
    const drained = await drainOutbox(
      db(),
      async ({ toEmail }) => {
        if (toEmail.startsWith("broken")) throw new Error("550 no such mailbox");
      },
      atNoon,
    );
    expect(drained).toEqual({ sent: 1, failed: 1 });
  });

  it("that is given up stays visible to the stewards of its area and to nobody else", async () => {
    const areaId = await addArea(db());
    const cast = await addCast(db(), areaId);
    await queue(mail({ areaId }));
    let at = NOON;
    for (let tries = 0; tries < 8; tries += 1) {
      expect(await listFailedMails(cast.steward)).toEqual([]);
      await drainOutbox(db(), refuse, () => at);
      at = later(24 * 60, at);
    }
    expect(await states()).toEqual([{ state: "given_up", attempts: 8 }]);
    expect(await drainOutbox(db(), refuse, () => at)).toEqual({ sent: 0, failed: 0 });

    const expected = [expect.objectContaining({ attempts: 8, lastError: "451 try later" })];
    expect(await listFailedMails(cast.steward)).toEqual(expected);
    expect(await listFailedMails(cast.admin)).toEqual(expected);
    for (const actor of [cast.visitor, cast.outsider, cast.rigger, cast.bolter]) {
      expect(await listFailedMails(actor)).toEqual([]);
    }
  });

  it("keeps no secret link once it is sent", async () => {
    await queue(mail({ kind: "sign_in", body: "https://register.example/sign-in/link?secret=abc" }));
    await drainOutbox(db(), async () => undefined, atNoon);
    const [row] = await db().select().from(outbox);
    expect(row).toMatchObject({ state: "sent", body: expect.not.stringContaining("secret=abc") });
  });

  it("goes over SMTP into the local sink as it was written", async () => {
    const sink = await startSink(0, (caught) => insertSinkMail(db(), { ...caught, receivedAt: NOON }));
    try {
      const body = "Stift verbogen — 70°, Ø 8 mm.\n\nhttps://register.example/anchors/gc-04\n";
      const written = mail({ subject: "Außer Betrieb: GC-04", body });
      await queue(written);
      const deliver = smtpDeliver(`smtp://127.0.0.1:${sink.port}`, "Byssus <byssus@register.example>");
      expect(await drainOutbox(db(), deliver, atNoon)).toEqual({ sent: 1, failed: 0 });
      const [caught] = await listSinkMails(db());
      expect(caught).toMatchObject({
        toAddress: "follower@people.example",
        subject: written.subject,
        body: expect.stringContaining(body.trim()),
      });
    } finally {
      await sink.stop();
    }
  });

  it("is not lost when the mail server is away", async () => {
    await queue(mail());
    const sink = await startSink(0, async () => undefined);
    await sink.stop();
    const deliver = smtpDeliver(`smtp://127.0.0.1:${sink.port}`, "byssus@register.example");
    expect(await drainOutbox(db(), deliver, atNoon)).toEqual({ sent: 0, failed: 1 });
    expect(await db().$count(outbox, eq(outbox.state, "queued"))).toBe(1);
  });
});
