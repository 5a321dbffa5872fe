import { versionTag } from "@/lib/http/request";
import { route } from "@/lib/http/route";
import { getArea } from "@/lib/queries/list-areas";
import { slugParam } from "@/lib/schemas/query";

export const GET = route({ params: slugParam }, async ({ actor, params }) => {
  const area = await getArea(actor, params.slug);
  return { body: area, headers: { etag: versionTag(area.version) } };
});
