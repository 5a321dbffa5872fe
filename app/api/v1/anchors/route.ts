import { route } from "@/lib/http/route";
import { listAnchors } from "@/lib/queries/list-anchors";
import { anchorListQuery, filterOf } from "@/lib/schemas/query";

export const GET = route({ query: anchorListQuery }, async ({ actor, query }) => {
  const { limit, cursor, ...filter } = query;
  return { body: await listAnchors(actor, filterOf(filter), { limit, cursor }) };
});
