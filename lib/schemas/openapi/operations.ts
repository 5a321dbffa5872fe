import { openApiDocument } from "@/lib/schemas/openapi/document";

/** One call of the API, as the readable page shows it. */
export interface Operation {
  method: string;
  path: string;
  summary: string;
  signedIn: boolean;
  parameters: string[];
  answers: string[];
}

const METHODS = ["get", "post", "patch"] as const;

/** Every call, from the same document machines read. */
export function operationsOf(serverUrl: string): Operation[] {
  const { paths = {} } = openApiDocument(serverUrl);
  return Object.entries(paths).flatMap(([path, item]) =>
    METHODS.flatMap((method) => {
      const operation = item?.[method];
      if (!operation) return [];
      const parameters = (operation.parameters ?? []).flatMap((one) => ("name" in one ? [one.name] : []));
      return [
        {
          method: method.toUpperCase(),
          path: `/api/v1${path}`,
          summary: operation.summary ?? "",
          signedIn: (operation.security ?? []).length > 0,
          parameters,
          answers: Object.keys(operation.responses ?? {}),
        },
      ];
    }),
  );
}
