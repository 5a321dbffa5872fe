import { route } from "@/lib/http/route";
import { getSite } from "@/lib/queries/get-site";
import { idParam } from "@/lib/schemas/query";

export const GET = route({ params: idParam }, async ({ actor, params }) => ({
  body: await getSite(actor, { id: params.id }),
}));
