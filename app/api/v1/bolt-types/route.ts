import { route } from "@/lib/http/route";
import { listBoltTypes } from "@/lib/queries/bolt-types";

export const GET = route({}, async ({ actor }) => ({
  body: { items: await listBoltTypes(actor), next: null },
}));
