import "server-only";
import type { AppError } from "@/lib/shared/errors";
import { type ErrorCode } from "@/lib/shared/errors";

/** HTTP status of each way to refuse. */
export const STATUS: Record<ErrorCode, number> = {
  invalid_input: 422,
  not_signed_in: 401,
  forbidden: 403,
  not_found: 404,
  conflict: 409,
  stale_version: 412,
  too_large: 413,
  refused_by_rule: 409,
  rate_limited: 429,
  unavailable: 503,
};

const STATUS_BY_NAME: Readonly<Record<string, number>> = STATUS;

const TITLE: Record<ErrorCode, string> = {
  invalid_input: "The input has problems",
  not_signed_in: "Not signed in",
  forbidden: "Not allowed",
  not_found: "Not found",
  conflict: "Conflict",
  stale_version: "Somebody saved before you",
  too_large: "Too large",
  refused_by_rule: "Refused by a rule",
  rate_limited: "Too many requests",
  unavailable: "Not available now",
};

/** An RFC 9457 problem document. `type` is a relative reference into the API page. */
export function problemResponse(error: AppError, status = STATUS[error.code]): Response {
  const body = {
    type: `/api-docs#${error.code}`,
    title: TITLE[error.code],
    status,
    code: error.code,
    detail: error.message,
    ...(error.problems.length > 0 ? { errors: error.problems } : {}),
    ...(error.current ? { current: error.current } : {}),
  };
  const headers = new Headers({ "content-type": "application/problem+json", "cache-control": "no-store" });
  if (error.retryAfterS !== undefined) headers.set("retry-after", String(error.retryAfterS));
  if (error.code === "not_signed_in") headers.set("www-authenticate", "Bearer");
  return new Response(JSON.stringify(body), { status, headers });
}

/** A refusal that has no error code of its own: malformed JSON, a missing precondition, the wrong media type. */
export function plainProblem(status: number, title: string, detail: string): Response {
  const code = status >= 500 ? "unavailable" : "invalid_input";
  return new Response(JSON.stringify({ type: "about:blank", title, status, code, detail }), {
    status,
    headers: { "content-type": "application/problem+json", "cache-control": "no-store" },
  });
}

/** Status and title of every code, for the readable page. */
export const ERROR_WORDS: Readonly<Record<string, { status: number; title: string }>> = Object.fromEntries(
  Object.entries(TITLE).map(([code, title]) => [code, { status: STATUS_BY_NAME[code] ?? 500, title }]),
);
