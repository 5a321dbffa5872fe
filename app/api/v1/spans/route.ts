import { route } from "@/lib/http/route";
import { listSpans } from "@/lib/queries/spans";
import { areaQuery } from "@/lib/schemas/query";

export const GET = route({ query: areaQuery }, async ({ actor, query }) => ({
  body: { items: await listSpans(actor, query.area), next: null },
}));
