import { commandContext } from "@/lib/commands/context";
import { updateBolt } from "@/lib/commands/update-bolt";
import { changedAnswer } from "@/lib/http/created";
import { versionTag } from "@/lib/http/request";
import { route } from "@/lib/http/route";
import { getBolt } from "@/lib/queries/get-bolt";
import { boltPatch } from "@/lib/schemas/bolt";
import { idParam } from "@/lib/schemas/query";

export const GET = route({ params: idParam }, async ({ actor, params }) => {
  const found = await getBolt(actor, params.id);
  return { body: found, headers: { etag: versionTag(found.bolt.version) } };
});

export const PATCH = route(
  { params: idParam, body: boltPatch, wantsVersion: true, signedIn: true, limit: "write-person" },
  async ({ params, body, version, ...from }) =>
    changedAnswer(await updateBolt(commandContext(from), { id: params.id, version, change: body })),
);
