/** Answers that depend on who asks are never kept by a cache. */
const HEADERS = { "Cache-Control": "no-store" };

export function ok<Body>(body: Body): Response {
  return Response.json(body, { headers: HEADERS });
}

export function created<Body>(body: Body, location: string): Response {
  return Response.json(body, { status: 201, headers: { ...HEADERS, Location: location } });
}

/**
 * A picture for one person's eyes. No validator, no date and no name travel with it: an entity tag or a modification
 * time would be the same for two showings of one case. The browser may keep it for the sitting.
 */
export function picture(body: Uint8Array<ArrayBuffer>, contentType = "image/jpeg"): Response {
  return new Response(body, {
    headers: {
      "Content-Type": contentType,
      "Content-Length": String(body.byteLength),
      "Content-Disposition": "inline",
      "Cache-Control": "private, max-age=1800",
    },
  });
}
