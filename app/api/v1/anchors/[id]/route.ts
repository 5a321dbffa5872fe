import { commandContext } from "@/lib/commands/context";
import { moveAnchor } from "@/lib/commands/move-anchor";
import { updateAnchor } from "@/lib/commands/update-anchor";
import { changedAnswer } from "@/lib/http/created";
import { versionTag } from "@/lib/http/request";
import { route } from "@/lib/http/route";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";
import { anchorPatch } from "@/lib/schemas/anchor";
import { idParam } from "@/lib/schemas/query";

export const GET = route({ params: idParam }, async ({ actor, params }) => {
  const sheet = await getAnchorSheet(actor, { id: params.id });
  return { body: sheet, headers: { etag: versionTag(sheet.version) } };
});

export const PATCH = route(
  { params: idParam, body: anchorPatch, wantsVersion: true, signedIn: true, limit: "write-person" },
  async ({ params, body: { move, ...change }, version, ...from }) => {
    const ctx = commandContext(from);
    const ref = { id: params.id, version };
    return changedAnswer(
      move ? await moveAnchor(ctx, { ...ref, move }) : await updateAnchor(ctx, { ...ref, change }),
    );
  },
);
