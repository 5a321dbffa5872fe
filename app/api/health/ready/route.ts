import { route } from "@/lib/http/route";
import { readiness } from "@/lib/queries/readiness";

export const GET = route({ anybody: true }, async () => {
  const state = await readiness();
  return { status: state.ready ? 200 : 503, body: state };
});
