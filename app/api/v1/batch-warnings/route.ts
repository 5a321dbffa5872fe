import { commandContext } from "@/lib/commands/context";
import { publishBatchWarning } from "@/lib/commands/stewarding/publish-batch-warning";
import { createdAnswer } from "@/lib/http/created";
import { route } from "@/lib/http/route";
import { listBatchWarnings } from "@/lib/queries/notices";
import { batchWarningInput } from "@/lib/schemas/steward";

export const GET = route({}, async ({ actor }) => ({
  body: { items: await listBatchWarnings(actor), next: null },
}));

export const POST = route(
  { body: batchWarningInput, signedIn: true, limit: "write-person" },
  async ({ body, ...from }) =>
    createdAnswer("/api/v1/batch-warnings", await publishBatchWarning(commandContext(from), body)),
);
