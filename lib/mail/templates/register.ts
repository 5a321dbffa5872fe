import "server-only";
import { compose, pageUrl } from "@/lib/mail/compose";
import type { Mail } from "@/lib/mail/mail";

/**
 * Mails about anchors. They name the anchor and its site and nothing it could be found by: no point, no sea
 * distance, no elevation, no bearing, no length. `sheetPath` is the path of the anchor's page.
 */
interface AboutAnchor {
  anchorLabel: string;
  siteName: string;
  sheetPath: string;
}

export function outOfUseMail(about: AboutAnchor & { reason: string }): Mail {
  return compose({
    kind: "out_of_use",
    subject: `Out of use: ${about.anchorLabel}, ${about.siteName}`,
    text: [
      `${about.anchorLabel} at ${about.siteName} is out of use. Do not tie in to it.`,
      `Why: ${about.reason}`,
      "The sheet shows what is known and what has to happen before it comes back:",
    ],
    link: pageUrl(about.sheetPath),
    aboutAnchor: true,
  });
}

export function backInServiceMail(about: AboutAnchor & { by: string; reason: string }): Mail {
  return compose({
    kind: "back_in_service",
    subject: `Back in service: ${about.anchorLabel}, ${about.siteName}`,
    text: [
      `${about.by} put ${about.anchorLabel} at ${about.siteName} back in service.`,
      `Why: ${about.reason}`,
      "Read the hand checks and the open reasons on the sheet:",
    ],
    link: pageUrl(about.sheetPath),
    aboutAnchor: true,
  });
}

/** `anchorLabel` and `sheetPath` are absent when nothing is registered at the place yet. */
export function reportFiledMail(report: {
  kindLabel: string;
  anchorLabel: string | null;
  siteName: string | null;
  by: string;
  reportPath: string;
}): Mail {
  const where = [report.anchorLabel ?? "a place not in the register", report.siteName]
    .filter((part) => part !== null)
    .join(", ");
  return compose({
    kind: "report_filed",
    subject: `Report: ${report.kindLabel}, ${where}`,
    text: [`${report.by} reported “${report.kindLabel}” at ${where}.`, "Read it and answer it here:"],
    link: pageUrl(report.reportPath),
    aboutAnchor: true,
  });
}

/** To the person who filed the report: what became of it. */
export function reportAnsweredMail(report: {
  kindLabel: string;
  where: string;
  by: string;
  answer: string;
  reportPath: string;
}): Mail {
  return compose({
    kind: "report_answered",
    subject: `Your report was answered: ${report.kindLabel}, ${report.where}`,
    text: [`${report.by} answered your report: ${report.answer}`, "Thank you for writing down what you saw."],
    link: pageUrl(report.reportPath),
    aboutAnchor: true,
  });
}

export function jobAssignedMail(
  job: Omit<AboutAnchor, "sheetPath"> & { jobPath: string; dueOn: string | null },
): Mail {
  const due = job.dueOn ? ` It is due on ${job.dueOn}.` : "";
  return compose({
    kind: "job_assigned",
    subject: `Rebolt job for you: ${job.anchorLabel}, ${job.siteName}`,
    text: [
      `You were given the rebolt job at ${job.anchorLabel}, ${job.siteName}.${due}`,
      "What to do and what to bring:",
    ],
    link: pageUrl(job.jobPath),
    aboutAnchor: true,
  });
}

export function warningPublishedMail(warning: {
  title: string;
  reason: string;
  anchorCount: number;
  warningPath: string;
}): Mail {
  const anchors = warning.anchorCount === 1 ? "1 anchor" : `${warning.anchorCount} anchors`;
  return compose({
    kind: "warning_published",
    subject: `Batch warning: ${warning.title}`,
    text: [
      `A batch warning was published: ${warning.title}.`,
      `Why: ${warning.reason}`,
      `It matches bolts at ${anchors} you look after or follow. They are listed here:`,
    ],
    link: pageUrl(warning.warningPath),
    aboutAnchor: true,
  });
}
