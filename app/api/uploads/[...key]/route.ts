import { z } from "zod";
import { commandContext } from "@/lib/commands/context";
import { readPhoto } from "@/lib/commands/read-photo";
import { route } from "@/lib/http/route";

const params = z.object({ key: z.array(z.string().max(80)).min(1).max(3) });

export const GET = route({ params }, async ({ params, ...from }) => {
  const bytes = await readPhoto(commandContext(from), params.key.join("/"));
  return new Response(new Uint8Array(bytes), {
    headers: {
      "content-type": "image/webp",
      "cache-control": "private, max-age=3600",
      "x-content-type-options": "nosniff",
      "content-security-policy": "default-src 'none'",
    },
  });
});
