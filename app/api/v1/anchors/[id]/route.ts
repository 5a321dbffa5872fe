import { versionTag } from "@/lib/http/request";
import { route } from "@/lib/http/route";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";
import { idParam } from "@/lib/schemas/query";

export const GET = route({ params: idParam }, async ({ actor, params }) => {
  const sheet = await getAnchorSheet(actor, { id: params.id });
  return { body: sheet, headers: { etag: versionTag(sheet.version) } };
});
