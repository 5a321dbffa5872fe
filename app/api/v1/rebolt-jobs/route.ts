import { route } from "@/lib/http/route";
import { getReboltQueue } from "@/lib/queries/rebolt-queue";
import { queueQuery } from "@/lib/schemas/query";

export const GET = route({ query: queueQuery, signedIn: true }, async ({ actor, query }) => {
  const { area, state, mine } = query;
  const filter = { ...(area && { areaId: area }), ...(state && { states: [state] }), mine: mine === "1" };
  return { body: { items: await getReboltQueue(actor, filter), next: null } };
});
