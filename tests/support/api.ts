/** A route handler as next calls it. */
export type Handler = (
  request: Request,
  context: { params: Promise<Record<string, string | string[]> | undefined> },
) => Promise<Response>;

export interface SendOptions {
  token: string;
  /** The `[id]` in the path. */
  id?: string;
  ifMatch?: string;
  headers?: Record<string, string>;
}

/** Sends JSON (a string goes as it is) to a handler and reads the answer. */
export async function sendJson(
  handler: Handler,
  body: unknown,
  { token, id, ifMatch, headers = {} }: SendOptions,
) {
  const request = new Request("https://register.example/api/v1/x", {
    method: "POST",
    headers: {
      authorization: `Bearer ${token}`,
      "content-type": "application/json",
      ...(ifMatch ? { "if-match": ifMatch } : {}),
      ...headers,
    },
    body: typeof body === "string" ? body : JSON.stringify(body),
  });
  const response = await handler(request, {
    params: Promise.resolve<Record<string, string>>(id ? { id } : {}),
  });
  const type = response.headers.get("content-type") ?? "";
  const text = await response.text();
  return { status: response.status, type, headers: response.headers, body: JSON.parse(text || "null") };
}
