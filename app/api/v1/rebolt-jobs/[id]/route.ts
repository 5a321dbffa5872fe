import { commandContext } from "@/lib/commands/context";
import { changeJob } from "@/lib/commands/rebolt/change-job";
import { changedAnswer } from "@/lib/http/created";
import { versionTag } from "@/lib/http/request";
import { route } from "@/lib/http/route";
import { getJob } from "@/lib/queries/rebolt-queue";
import { idParam } from "@/lib/schemas/query";
import { jobAction } from "@/lib/schemas/rebolt";

export const GET = route({ params: idParam, signedIn: true }, async ({ actor, params }) => {
  const job = await getJob(actor, params.id);
  return { body: job, headers: { etag: versionTag(job.version) } };
});

export const PATCH = route(
  { params: idParam, body: jobAction, wantsVersion: true, signedIn: true, limit: "write-person" },
  async ({ params, body, version, ...from }) =>
    changedAnswer(await changeJob(commandContext(from), { id: params.id, version }, body)),
);
