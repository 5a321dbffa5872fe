import { publicUrl } from "@/lib/config/env";
import { route } from "@/lib/http/route";
import { openApiDocument } from "@/lib/schemas/openapi/document";

export const GET = route({ anybody: true }, () =>
  Promise.resolve({
    body: openApiDocument(publicUrl()),
    headers: { "cache-control": "public, max-age=300" },
  }),
);
