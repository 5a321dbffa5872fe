import { versionTag } from "@/lib/http/request";
import { route } from "@/lib/http/route";
import { getBolt } from "@/lib/queries/get-bolt";
import { idParam } from "@/lib/schemas/query";

export const GET = route({ params: idParam }, async ({ actor, params }) => {
  const found = await getBolt(actor, params.id);
  return { body: found, headers: { etag: versionTag(found.bolt.version) } };
});
