import { route } from "@/lib/http/route";
import { listClosures } from "@/lib/queries/notices";

export const GET = route({}, async ({ actor }) => ({
  body: { items: await listClosures(actor), next: null },
}));
