import { commandContext } from "@/lib/commands/context";
import { openReboltJob } from "@/lib/commands/open-rebolt-job";
import { createdAnswer } from "@/lib/http/created";
import { route } from "@/lib/http/route";
import { getReboltQueue } from "@/lib/queries/rebolt-queue";
import { queueQuery } from "@/lib/schemas/query";
import { openReboltJobInput } from "@/lib/schemas/rebolt";

export const GET = route({ query: queueQuery, signedIn: true }, async ({ actor, query }) => {
  const { area, state, mine } = query;
  const filter = { ...(area && { areaId: area }), ...(state && { states: [state] }), mine: mine === "1" };
  return { body: { items: await getReboltQueue(actor, filter), next: null } };
});

export const POST = route(
  { body: openReboltJobInput, signedIn: true, limit: "write-person" },
  async ({ body, ...from }) =>
    createdAnswer("/api/v1/rebolt-jobs", await openReboltJob(commandContext(from), body)),
);
