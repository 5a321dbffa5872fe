import { route } from "@/lib/http/route";
import { mapFeatures } from "@/lib/queries/map-features";
import { anchorFilter, filterOf } from "@/lib/schemas/query";

export const GET = route({ query: anchorFilter }, async ({ actor, query }) => ({
  body: await mapFeatures(actor, filterOf(query)),
}));
