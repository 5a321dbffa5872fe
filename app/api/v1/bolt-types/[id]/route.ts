import { route } from "@/lib/http/route";
import { getBoltType } from "@/lib/queries/bolt-types";
import { idParam } from "@/lib/schemas/query";

export const GET = route({ params: idParam }, async ({ actor, params }) => ({
  body: await getBoltType(actor, params.id),
}));
