import { route } from "@/lib/http/route";
import { getBoltType, typeMatrix } from "@/lib/queries/bolt-types";
import { idParam, matrixQuery } from "@/lib/schemas/query";

export const GET = route({ params: idParam, query: matrixQuery }, async ({ actor, params, query, now }) => ({
  body: typeMatrix(await getBoltType(actor, params.id), query.onDate ?? now.toISOString().slice(0, 10)),
}));
