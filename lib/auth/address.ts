import "server-only";

/**
 * The address a request came from, for rate limits. Behind the TLS proxy that an installation puts in front,
 * the last entry of `x-forwarded-for` is the one the proxy itself wrote.
 */
export function addressOf(headers: Headers | Record<string, unknown> | undefined): string {
  const forwarded =
    headers instanceof Headers ? headers.get("x-forwarded-for") : headers?.["x-forwarded-for"];
  if (typeof forwarded !== "string" || forwarded === "") return "local";
  return forwarded.split(",").at(-1)?.trim() ?? "local";
}
