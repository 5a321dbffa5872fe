import { beforeAll, describe, expect, it, vi } from "vitest";
import { CAUTION } from "@/lib/mail/compose";
import { carriesSecret, type Mail, MAIL_KINDS } from "@/lib/mail/mail";
import * as account from "@/lib/mail/templates/account";
import * as register from "@/lib/mail/templates/register";

beforeAll(() => {
  vi.stubEnv("DATABASE_URL", "postgres://nowhere.invalid/none");
  vi.stubEnv("NEXTAUTH_SECRET", "only-for-tests-only-for-tests-only-for-tests");
  vi.stubEnv("BYSSUS_URL", "https://register.example");
});

const about = { anchorLabel: "GC-04", siteName: "Gannet Cleft", sheetPath: "/anchors/gc-04" };
const SECRET = "s3cret-s3cret-s3cret-s3cret-s3cret-s3cret-s";

/** One mail of every kind. */
function everyMail(): Mail[] {
  return [
    account.signInMail({ secret: SECRET, minutes: 20 }),
    account.resetPasswordMail({ secret: SECRET, minutes: 60 }),
    account.passwordChangedMail(),
    account.invitationMail({ secret: SECRET, areaName: "Tarrow", role: "bolter", invitedBy: "A", days: 14 }),
    account.roleChangedMail({ areaName: "Tarrow", role: "steward" }),
    account.membershipEndedMail({ areaName: "Tarrow" }),
    register.outOfUseMail({ ...about, reason: "Bolt 2 is bent by 70°." }),
    register.backInServiceMail({ ...about, by: "A steward", reason: "New bolt, neighbours checked." }),
    register.reportFiledMail({
      kindLabel: "deformation",
      anchorLabel: "GC-04",
      siteName: "Gannet Cleft",
      by: "A rigger",
      reportPath: "/reports/1",
    }),
    register.reportAnsweredMail({
      kindLabel: "deformation",
      where: "GC-04",
      by: "A steward",
      answer: "Replaced.",
      reportPath: "/reports/1",
    }),
    register.jobAssignedMail({
      anchorLabel: "GC-04",
      siteName: "Gannet Cleft",
      jobPath: "/queue/1",
      dueOn: "2026-07-01",
    }),
    register.warningPublishedMail({
      title: "Glue batch 41-B",
      reason: "Soft when pulled.",
      anchorCount: 1,
      warningPath: "/batch-warnings/1",
    }),
  ];
}

describe("mails", () => {
  it("exist for every kind there is", () => {
    expect(
      everyMail()
        .map((mail) => mail.kind)
        .toSorted(),
    ).toEqual([...MAIL_KINDS].toSorted());
  });

  it("carry the caution when they are about an anchor, and only then", () => {
    const withCaution = everyMail().filter((mail) => mail.body.includes(CAUTION));
    expect(withCaution.map((mail) => mail.kind).toSorted()).toEqual([
      "back_in_service",
      "job_assigned",
      "out_of_use",
      "report_answered",
      "report_filed",
      "warning_published",
    ]);
  });

  it("call nothing safe", () => {
    for (const mail of everyMail()) expect(`${mail.subject} ${mail.body}`).not.toMatch(/\bsafe\b|\bOK\b/i);
  });

  it("lead to this installation, with the whole link on a line of its own", () => {
    for (const mail of everyMail()) {
      expect(mail.body).toMatch(/^https:\/\/register\.example\/\S*$/m);
      expect(mail.body.match(/https?:\/\/(?!register\.example)/)).toBeNull();
    }
  });

  it("are known to carry a secret exactly when they do", () => {
    for (const mail of everyMail()) expect(carriesSecret(mail.kind)).toBe(mail.body.includes(SECRET));
  });

  it("keep line breaks that people typed out of the subject", () => {
    const mail = register.outOfUseMail({
      ...about,
      anchorLabel: "GC-04\r\nBcc: all@people.example",
      reason: "x",
    });
    expect(mail.subject).toBe("Out of use: GC-04 Bcc: all@people.example, Gannet Cleft");
  });

  it("say where a report was made when nothing is registered there", () => {
    const mail = register.reportFiledMail({
      kindLabel: "not in the register",
      anchorLabel: null,
      siteName: null,
      by: "A rigger",
      reportPath: "/reports/2",
    });
    expect(mail.subject).toBe("Report: not in the register, a place not in the register");
  });

  it("count one anchor as one", () => {
    const warning = { title: "t", reason: "r", warningPath: "/w" };
    expect(register.warningPublishedMail({ ...warning, anchorCount: 1 }).body).toContain("at 1 anchor you");
    expect(register.warningPublishedMail({ ...warning, anchorCount: 2 }).body).toContain("at 2 anchors you");
  });
});
