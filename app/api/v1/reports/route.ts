import { route } from "@/lib/http/route";
import { listReports } from "@/lib/queries/reports";
import { reportListQuery } from "@/lib/schemas/query";

export const GET = route({ query: reportListQuery }, async ({ actor, query }) => {
  const { limit, state, area, mine } = query;
  const filter = { ...(state && { state }), ...(area && { areaSlug: area }), mine: mine === "1" };
  return { body: { items: await listReports(actor, filter, limit), next: null } };
});
