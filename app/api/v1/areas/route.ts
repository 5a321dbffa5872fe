import { route } from "@/lib/http/route";
import { listAreas } from "@/lib/queries/list-areas";

export const GET = route({}, async ({ actor }) => ({ body: { items: await listAreas(actor), next: null } }));
