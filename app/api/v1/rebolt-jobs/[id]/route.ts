import { versionTag } from "@/lib/http/request";
import { route } from "@/lib/http/route";
import { getJob } from "@/lib/queries/rebolt-queue";
import { idParam } from "@/lib/schemas/query";

export const GET = route({ params: idParam, signedIn: true }, async ({ actor, params }) => {
  const job = await getJob(actor, params.id);
  return { body: job, headers: { etag: versionTag(job.version) } };
});
