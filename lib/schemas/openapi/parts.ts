import { z } from "zod";
import type { ZodOpenApiOperationObject, ZodOpenApiPathsObject } from "zod-openapi";

/** RFC 9457, with our `code` and, for invalid input, one entry a field. */
export const problem = z
  .object({
    type: z.string(),
    title: z.string(),
    status: z.number(),
    code: z.enum([
      "invalid_input",
      "not_signed_in",
      "forbidden",
      "not_found",
      "conflict",
      "stale_version",
      "too_large",
      "refused_by_rule",
      "rate_limited",
      "unavailable",
    ]),
    detail: z.string(),
    errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
    /** The stored version, when a stale save was refused. */
    current: z.record(z.string(), z.unknown()).optional(),
  })
  .meta({ id: "Problem" });

const REASONS = {
  "304": "Not changed since the ETag sent",
  "400": "Malformed JSON",
  "401": "Not signed in",
  "403": "May not",
  "404": "Absent or hidden",
  "409": "Conflict, or refused by a rule of the register",
  "412": "Stale If-Match: somebody saved before",
  "413": "Too large",
  "415": "Wrong media type",
  "422": "Invalid input",
  "428": "If-Match is missing",
  "429": "Too many requests; see Retry-After",
} as const;

type Status = keyof typeof REASONS;

function problems(statuses: readonly Status[]): ZodOpenApiOperationObject["responses"] {
  const responses: ZodOpenApiOperationObject["responses"] = {};
  for (const status of statuses) {
    const description = REASONS[status];
    responses[status] =
      status === "304"
        ? { description }
        : { description, content: { "application/problem+json": { schema: problem } } };
  }
  return responses;
}

interface Read {
  summary: string;
  answer: z.ZodType;
  params?: z.ZodObject;
  query?: z.ZodObject;
  tagged?: boolean;
  signedIn?: boolean;
}

/** A GET with its refusals. */
export function read({ summary, answer, params, query, tagged, signedIn }: Read): ZodOpenApiOperationObject {
  const refusals: Status[] = [];
  if (tagged) refusals.push("304");
  if (signedIn) refusals.push("401", "403");
  if (params) refusals.push("404");
  if (query) refusals.push("422");
  return {
    summary,
    requestParams: { ...(params && { path: params }), ...(query && { query }) },
    responses: {
      "200": { description: "Found", content: { "application/json": { schema: answer } } },
      ...problems(refusals),
    },
    ...(signedIn ? { security: [{ session: [] }, { token: [] }] } : {}),
  };
}

interface Write {
  summary: string;
  body: z.ZodType;
  answer: z.ZodType;
  params?: z.ZodObject;
  /** The write is on an existing record. */
  onExisting?: boolean;
  /** Nothing is stored. */
  computesOnly?: boolean;
  mediaType?: string;
}

const ifMatch = z.object({
  "If-Match": z.string().meta({ description: 'The ETag last read, for example "3"' }),
});

/** A POST or PATCH with its refusals. */
export function write({
  summary,
  body,
  answer,
  params,
  onExisting,
  computesOnly,
  mediaType,
}: Write): ZodOpenApiOperationObject {
  const stored: Status[] = computesOnly ? [] : ["401", "403", "404", "409"];
  const existing: Status[] = onExisting ? ["412", "428"] : [];
  const created = !onExisting && !computesOnly;
  const content = { "application/json": { schema: answer } };
  return {
    summary,
    requestParams: { ...(params && { path: params }), ...(onExisting && { header: ifMatch }) },
    requestBody: { required: true, content: { [mediaType ?? "application/json"]: { schema: body } } },
    responses: {
      ...(created ? { "201": { description: "Stored", content } } : {}),
      "200": { description: created ? "Sent before: the first answer again" : "Done", content },
      ...problems(["400", "413", "415", "422", "429", ...stored, ...existing]),
    },
    ...(computesOnly ? {} : { security: [{ session: [] }, { token: [] }] }),
  };
}

export type Paths = ZodOpenApiPathsObject;
