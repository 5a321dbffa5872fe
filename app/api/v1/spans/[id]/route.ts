import { versionTag } from "@/lib/http/request";
import { route } from "@/lib/http/route";
import { getSpan } from "@/lib/queries/spans";
import { idParam } from "@/lib/schemas/query";

export const GET = route({ params: idParam }, async ({ actor, params }) => {
  const span = await getSpan(actor, params.id);
  return { body: span, headers: { etag: versionTag(span.version) } };
});
