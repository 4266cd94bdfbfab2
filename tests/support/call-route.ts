import { NextRequest } from "next/server";

export type Handler = (request: NextRequest, context: { params: Promise<Record<string, string>> }) => Promise<Response>;

export type CallOptions = {
  params?: Record<string, string>;
  query?: Record<string, string>;
  /** Sent as JSON, unless it is a form or a text. */
  body?: unknown;
  method?: string;
  headers?: Record<string, string>;
};

export type Called = { status: number; body: unknown; headers: Headers };

/** Calls a route handler as Next would, and reads the answer. */
export async function callRoute(handler: Handler, options: CallOptions = {}): Promise<Called> {
  const { params = {}, query = {}, body, headers = {} } = options;
  const url = new URL("http://localhost:3000/api/test");
  for (const [name, value] of Object.entries(query)) url.searchParams.set(name, value);
  const isRaw = body instanceof FormData || typeof body === "string";
  const request = new NextRequest(url, {
    method: options.method ?? (body === undefined ? "GET" : "PUT"),
    headers: {
      host: "localhost:3000",
      ...(!isRaw && body !== undefined && { "content-type": "application/json" }),
      ...headers,
    },
    ...(body !== undefined && { body: isRaw ? body : JSON.stringify(body) }),
  });
  const response = await handler(request, { params: Promise.resolve(params) });
  const isJson = response.headers.get("content-type")?.includes("json");
  return {
    status: response.status,
    body: isJson ? await response.json() : new Uint8Array(await response.arrayBuffer()),
    headers: response.headers,
  };
}
