import { route } from "@/lib/http/route";
import { listBatchWarnings } from "@/lib/queries/notices";

export const GET = route({}, async ({ actor }) => ({
  body: { items: await listBatchWarnings(actor), next: null },
}));
