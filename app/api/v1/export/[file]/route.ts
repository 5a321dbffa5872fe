import { route } from "@/lib/http/route";
import { exportAnchors } from "@/lib/queries/export-anchors";
import { anchorFilter, filterOf } from "@/lib/schemas/query";
import { exportParam } from "@/lib/schemas/export";

export const GET = route(
  { params: exportParam, query: anchorFilter, signedIn: true },
  async ({ actor, params, query, now }) => {
    const { text, contentType } = await exportAnchors(actor, params.file, filterOf(query), now);
    return new Response(text, {
      headers: {
        "content-type": contentType,
        "content-disposition": `attachment; filename="${params.file}"`,
        "cache-control": "private, no-store",
      },
    });
  },
);
