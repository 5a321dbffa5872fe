import { commandContext } from "@/lib/commands/context";
import { fileReport } from "@/lib/commands/file-report";
import { createdAnswer } from "@/lib/http/created";
import { route } from "@/lib/http/route";
import { listReports } from "@/lib/queries/reports";
import { reportListQuery } from "@/lib/schemas/query";
import { fileReportInput } from "@/lib/schemas/report";

export const GET = route({ query: reportListQuery }, async ({ actor, query }) => {
  const { limit, state, area, mine } = query;
  const filter = { ...(state && { state }), ...(area && { areaSlug: area }), mine: mine === "1" };
  return { body: { items: await listReports(actor, filter, limit), next: null } };
});

export const POST = route({ body: fileReportInput, limit: "report-person" }, async ({ body, ...from }) =>
  createdAnswer("/api/v1/reports", await fileReport(commandContext(from), body)),
);
