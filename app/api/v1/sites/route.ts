import { route } from "@/lib/http/route";
import { listSites } from "@/lib/queries/list-sites";
import { areaQuery } from "@/lib/schemas/query";

export const GET = route({ query: areaQuery }, async ({ actor, query }) => ({
  body: { items: await listSites(actor, query.area), next: null },
}));
