import { createDocument } from "zod-openapi";
import { readPaths } from "@/lib/schemas/openapi/reads";
import type { Paths } from "@/lib/schemas/openapi/parts";
import { writePaths } from "@/lib/schemas/openapi/writes";

/** The API as OpenAPI 3.1, made from the schemas that parse the requests. */
export function openApiDocument(serverUrl: string) {
  return createDocument({
    openapi: "3.1.0",
    info: {
      title: "Byssus",
      version: "1",
      description:
        "The register of fixed anchors and bolts. Units stand in the field names; null means not known. A verdict informs competent people and certifies nothing.",
    },
    servers: [{ url: `${serverUrl}/api/v1` }],
    components: {
      securitySchemes: {
        session: { type: "apiKey", in: "cookie", name: "next-auth.session-token" },
        token: { type: "http", scheme: "bearer" },
      },
    },
    paths: merged(readPaths, writePaths),
  });
}

/** Reads and writes of one path side by side. */
function merged(one: Paths, other: Paths): Paths {
  const paths = new Set([...Object.keys(one), ...Object.keys(other)]);
  return Object.fromEntries([...paths].toSorted().map((path) => [path, { ...one[path], ...other[path] }]));
}
