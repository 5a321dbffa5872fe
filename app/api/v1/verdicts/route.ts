import { whatIf } from "@/lib/domain/finding/what-if";
import { DEFAULT_POLICY } from "@/lib/domain/policy";
import { route } from "@/lib/http/route";
import { whatIfInput } from "@/lib/schemas/verdict";

/** A what-if names no area: the built-in policy answers. Nothing is stored. */
export const POST = route({ body: whatIfInput, limit: "verdict-address" }, ({ body, now }) =>
  Promise.resolve({
    body: whatIf({ ...body, onDate: body.onDate ?? now.toISOString().slice(0, 10) }, DEFAULT_POLICY),
  }),
);
