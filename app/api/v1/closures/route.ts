import { commandContext } from "@/lib/commands/context";
import { writeClosure } from "@/lib/commands/stewarding/write-closure";
import { createdAnswer } from "@/lib/http/created";
import { route } from "@/lib/http/route";
import { listClosures } from "@/lib/queries/notices";
import { closureInput } from "@/lib/schemas/steward";

export const GET = route({}, async ({ actor }) => ({
  body: { items: await listClosures(actor), next: null },
}));

export const POST = route(
  { body: closureInput, signedIn: true, limit: "write-person" },
  async ({ body, ...from }) =>
    createdAnswer("/api/v1/closures", await writeClosure(commandContext(from), body)),
);
