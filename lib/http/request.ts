import "server-only";
import { AppError } from "@/lib/shared/errors";

/** Largest JSON body taken, bytes. */
const MAX_JSON_BYTES = 1_000_000;
const UNSAFE = new Set(["POST", "PUT", "PATCH", "DELETE"]);

/** The request itself is not well formed: nothing a field error could say. */
export class MalformedRequest extends Error {
  constructor(
    readonly status: number,
    readonly title: string,
    message: string,
  ) {
    super(message);
    this.name = "MalformedRequest";
  }
}

/**
 * A browser sends the session cookie along with any request, so a write from another site's page is refused.
 * Programs send a bearer token and no cookie: they pass.
 */
export function refuseForeignOrigin(request: Request): void {
  if (!UNSAFE.has(request.method) || request.headers.has("authorization")) return;
  const site = request.headers.get("sec-fetch-site");
  const origin = request.headers.get("origin");
  const foreignSite = site !== null && site !== "same-origin" && site !== "none";
  const foreignOrigin = origin !== null && hostOf(origin) !== request.headers.get("host");
  if (foreignSite || foreignOrigin) {
    throw new AppError("forbidden", "This request came from another site's page.");
  }
}

/** The host an `Origin` names; null for "null", which sandboxed pages send, and for anything that is no origin. */
function hostOf(origin: string): string | null {
  return URL.canParse(origin) ? new URL(origin).host : null;
}

/** @throws MalformedRequest 400 when it is not JSON, 415 when it does not say so; AppError `too_large`. */
export async function readJson(request: Request): Promise<unknown> {
  const type = request.headers.get("content-type") ?? "";
  if (!/^application\/([\w.-]+\+)?json\b/.test(type)) {
    throw new MalformedRequest(
      415,
      "Unsupported media type",
      "Send JSON with content-type application/json.",
    );
  }
  const bytes = await readAtMost(request, MAX_JSON_BYTES, "The body is larger than 1 MB.");
  const text = new TextDecoder().decode(bytes);
  try {
    return JSON.parse(text);
  } catch {
    throw new MalformedRequest(400, "Malformed JSON", "The body is not valid JSON.");
  }
}

/** A form with one file in it. @throws MalformedRequest 400 or 415; AppError `too_large` beyond `maxBytes`. */
export async function readUpload(
  request: Request,
  maxBytes: number,
): Promise<{ fields: Record<string, string>; file: Uint8Array | null }> {
  const type = request.headers.get("content-type") ?? "";
  if (!type.startsWith("multipart/form-data")) {
    throw new MalformedRequest(415, "Unsupported media type", "Send multipart/form-data with a file.");
  }
  // Room for the form around the file.
  const bytes = await readAtMost(
    request,
    maxBytes + 100_000,
    "The photo is larger than 20 MB. Send a smaller one.",
  );
  const form = await new Response(bytes, { headers: { "content-type": type } }).formData().catch(() => {
    throw new MalformedRequest(400, "Malformed form", "The body is not a valid form.");
  });
  const fields: Record<string, string> = {};
  let file: Uint8Array | null = null;
  for (const [name, value] of form) {
    if (typeof value === "string") fields[name] = value;
    else if (name === "file") file = new Uint8Array(await value.arrayBuffer());
  }
  return { fields, file };
}

/** The version the sender last saw. @throws MalformedRequest 428 without `If-Match`. */
export function versionWanted(request: Request): number {
  const header = request.headers.get("if-match");
  const version = /^(?:W\/)?"(\d+)(?:\.[\w-]+)?"$/.exec(header ?? "")?.[1];
  if (!version) {
    throw new MalformedRequest(
      428,
      "Precondition required",
      'Send If-Match with the version you last read, for example If-Match: "3".',
    );
  }
  return Number(version);
}

/** ETag of a record's version, the one `If-Match` takes back. */
export function versionTag(version: number): string {
  return `"${version}"`;
}

/** Reads a body and stops as soon as it is too large, whatever its length header says. */
async function readAtMost(
  request: Request,
  maxBytes: number,
  refusal: string,
): Promise<Uint8Array<ArrayBuffer>> {
  const tooLarge = () => new AppError("too_large", refusal);
  if (Number(request.headers.get("content-length") ?? 0) > maxBytes) throw tooLarge();
  const reader = request.body?.getReader();
  const chunks: Uint8Array[] = [];
  let length = 0;
  for (let next = await reader?.read(); next && !next.done; next = await reader?.read()) {
    length += next.value.byteLength;
    if (length > maxBytes) {
      await reader?.cancel();
      throw tooLarge();
    }
    chunks.push(next.value);
  }
  const bytes = new Uint8Array(length);
  let at = 0;
  for (const chunk of chunks) {
    bytes.set(chunk, at);
    at += chunk.byteLength;
  }
  return bytes;
}
