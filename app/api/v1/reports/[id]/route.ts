import { commandContext } from "@/lib/commands/context";
import { handleReport } from "@/lib/commands/handle-report";
import { changedAnswer } from "@/lib/http/created";
import { versionTag } from "@/lib/http/request";
import { route } from "@/lib/http/route";
import { getReport } from "@/lib/queries/reports";
import { idParam } from "@/lib/schemas/query";
import { handleReportInput } from "@/lib/schemas/report";

export const GET = route({ params: idParam }, async ({ actor, params }) => {
  const report = await getReport(actor, params.id);
  return { body: report, headers: { etag: versionTag(report.version) } };
});

export const PATCH = route(
  { params: idParam, body: handleReportInput, wantsVersion: true, signedIn: true, limit: "write-person" },
  async ({ params, body, version, ...from }) =>
    changedAnswer(await handleReport(commandContext(from), { id: params.id, version, answer: body })),
);
