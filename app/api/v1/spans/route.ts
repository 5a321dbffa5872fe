import { commandContext } from "@/lib/commands/context";
import { createSpan } from "@/lib/commands/create-span";
import { createdAnswer } from "@/lib/http/created";
import { route } from "@/lib/http/route";
import { listSpans } from "@/lib/queries/spans";
import { createSpanInput } from "@/lib/schemas/anchor";
import { areaQuery } from "@/lib/schemas/query";

export const GET = route({ query: areaQuery }, async ({ actor, query }) => ({
  body: { items: await listSpans(actor, query.area), next: null },
}));

export const POST = route(
  { body: createSpanInput, signedIn: true, limit: "write-person" },
  async ({ body, ...from }) => createdAnswer("/api/v1/spans", await createSpan(commandContext(from), body)),
);
