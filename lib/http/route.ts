import "server-only";
import { createHash, randomUUID } from "node:crypto";
import { z } from "zod";
import { addressOf } from "@/lib/auth/address";
import { actorFromRequest } from "@/lib/auth/get-actor";
import { type AllowanceName, limitRate } from "@/lib/auth/rate-limit";
import { now } from "@/lib/config/clock";
import { log } from "@/lib/config/log";
import { parseOrRefuse } from "@/lib/http/parse";
import { plainProblem, problemResponse } from "@/lib/http/problem";
import { MalformedRequest, readJson, refuseForeignOrigin, versionWanted } from "@/lib/http/request";
import { type Actor, VISITOR } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

const nothing = z.object({});

/** What a handler is given: everything parsed, nothing raw but the request itself. */
export interface RouteInput<P, Q, B> {
  actor: Actor;
  now: Date;
  requestId: string;
  params: P;
  query: Q;
  body: B;
  /** The version in `If-Match`; 0 when the call does not want one, which no record has. */
  version: number;
  request: Request;
}

/** What a handler answers; `null` body with 204. */
export interface RouteAnswer {
  status?: number;
  body: unknown;
  headers?: Record<string, string>;
}

interface RouteSpec<P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType> {
  params?: P;
  query?: Q;
  /** Present: the request must carry JSON that fits. */
  body?: B;
  /** The write is on an existing record and wants `If-Match` with its version. */
  wantsVersion?: boolean;
  /** Signed-in people only. */
  signedIn?: boolean;
  /** Does not even ask who it is: answers while the database is down. */
  anybody?: boolean;
  limit?: AllowanceName;
}

// Next resolves it to undefined where the path has no parameters.
type Context = { params: Promise<Record<string, string | string[]> | undefined> };

/**
 * The one way to build a route handler: actor, rate limit, zod, one query or command, problem+json.
 * Unexpected errors are logged with the request id and answered without detail.
 */
export function route<
  P extends z.ZodType = typeof nothing,
  Q extends z.ZodType = typeof nothing,
  B extends z.ZodType = typeof nothing,
>(
  spec: RouteSpec<P, Q, B>,
  handle: (input: RouteInput<z.output<P>, z.output<Q>, z.output<B>>) => Promise<RouteAnswer | Response>,
): (request: Request, context: Context) => Promise<Response> {
  return async (request, context) => {
    const requestId = randomUUID();
    try {
      refuseForeignOrigin(request);
      const actor = spec.anybody ? VISITOR : await actorFromRequest(request);
      if (spec.signedIn && actor.kind === "visitor") throw new AppError("not_signed_in", "Sign in first.");
      if (spec.limit)
        await limitRate(spec.limit, actor.kind === "person" ? actor.userId : addressOf(request.headers));
      const params = parsePath(spec.params, (await context.params) ?? {});
      const query = parseOrRefuse(
        spec.query ?? nothing,
        Object.fromEntries(new URL(request.url).searchParams),
      );
      const version = spec.wantsVersion ? versionWanted(request) : 0;
      const body = parseOrRefuse(spec.body ?? nothing, spec.body ? await readJson(request) : {});
      // The schemas above give exactly these types; the fallback `nothing` gives the generic's default.
      const answer = await handle({
        actor,
        now: now(),
        requestId,
        params: params as z.output<P>,
        query: query as z.output<Q>,
        body: body as z.output<B>,
        version,
        request,
      });
      return answer instanceof Response ? answer : jsonResponse(answer, request);
    } catch (error) {
      return refusal(error, requestId);
    }
  };
}

/** An id in the path that cannot be one is simply absent. */
function parsePath(schema: z.ZodType | undefined, params: Record<string, string | string[]>): unknown {
  const result = (schema ?? nothing).safeParse(params);
  if (!result.success) throw new AppError("not_found", "There is nothing here, or it is not shown to you.");
  return result.data;
}

function jsonResponse({ status = 200, body, headers = {} }: RouteAnswer, request: Request): Response {
  const sent = new Headers({ "cache-control": "private, no-cache", ...headers });
  if (body === null) return new Response(null, { status: 204, headers: sent });
  const text = JSON.stringify(body);
  const tag = sent.get("etag");
  if (tag !== null && request.method === "GET") {
    const etag = contentTag(tag, text);
    sent.set("etag", etag);
    if (request.headers.get("if-none-match") === etag)
      return new Response(null, { status: 304, headers: sent });
  }
  if (!sent.has("content-type")) sent.set("content-type", "application/json");
  return new Response(text, { status, headers: sent });
}

/** Verdicts and conditions change without a new version of the record: the tag names both. */
function contentTag(versionTag: string, text: string): string {
  const digest = createHash("sha256").update(text).digest("base64url").slice(0, 12);
  return versionTag.replace(/"$/, `.${digest}"`);
}

function refusal(error: unknown, requestId: string): Response {
  if (error instanceof MalformedRequest) return plainProblem(error.status, error.title, error.message);
  if (error instanceof AppError) return problemResponse(error);
  log().error({ err: error, requestId }, "unexpected error in a route");
  return plainProblem(
    500,
    "Unexpected error",
    `Something went wrong here. Quote ${requestId} when you report it.`,
  );
}
