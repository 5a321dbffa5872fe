import { commandContext } from "@/lib/commands/context";
import { createAnchor } from "@/lib/commands/create-anchor";
import { createdAnswer } from "@/lib/http/created";
import { route } from "@/lib/http/route";
import { listAnchors } from "@/lib/queries/list-anchors";
import { createAnchorInput } from "@/lib/schemas/anchor";
import { anchorListQuery, filterOf } from "@/lib/schemas/query";

export const GET = route({ query: anchorListQuery }, async ({ actor, query }) => {
  const { limit, cursor, ...filter } = query;
  return { body: await listAnchors(actor, filterOf(filter), { limit, cursor }) };
});

export const POST = route(
  { body: createAnchorInput, signedIn: true, limit: "write-person" },
  async ({ body, ...from }) =>
    createdAnswer("/api/v1/anchors", await createAnchor(commandContext(from), body)),
);
